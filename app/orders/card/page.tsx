import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { OrderCardScreen } from "@/components/orders/order-card-screen";

export const metadata: Metadata = { title: "Order" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Order" />}>
      <OrderCardScreen />
    </Suspense>
  );
}
