import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { FullSizeScreen } from "@/components/sleeves/full-size-screen";

export const metadata: Metadata = { title: "Full size" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Full size" />}>
      <FullSizeScreen />
    </Suspense>
  );
}
