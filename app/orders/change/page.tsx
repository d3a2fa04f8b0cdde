import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { ChangeOrderScreen } from "@/components/orders/change-order-screen";

export const metadata: Metadata = { title: "Change the order" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Change the order" />}>
      <ChangeOrderScreen />
    </Suspense>
  );
}
