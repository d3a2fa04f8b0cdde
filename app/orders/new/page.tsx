import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { NewOrderScreen } from "@/components/orders/new-order-screen";

export const metadata: Metadata = { title: "New order" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="New order" />}>
      <NewOrderScreen />
    </Suspense>
  );
}
