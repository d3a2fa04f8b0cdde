import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { SumScreen } from "@/components/sums/sum-screen";

export const metadata: Metadata = { title: "Sewing sum" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Sewing sum" />}>
      <SumScreen />
    </Suspense>
  );
}
