import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { ReceiptScreen } from "@/components/money/receipt-screen";

export const metadata: Metadata = { title: "Receipt" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Receipt" />}>
      <ReceiptScreen />
    </Suspense>
  );
}
