import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { MeasureScreen } from "@/components/measure/measure-screen";

export const metadata: Metadata = { title: "Measure" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Measure" />}>
      <MeasureScreen />
    </Suspense>
  );
}
