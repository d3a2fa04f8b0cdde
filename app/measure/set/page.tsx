import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { SetScreen } from "@/components/measure/set-screen";

export const metadata: Metadata = { title: "Measurement set" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Measurement set" />}>
      <SetScreen />
    </Suspense>
  );
}
