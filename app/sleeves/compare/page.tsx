import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { CompareScreen } from "@/components/sleeves/compare-screen";

export const metadata: Metadata = { title: "Compare sleeves" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Compare sleeves" />}>
      <CompareScreen />
    </Suspense>
  );
}
