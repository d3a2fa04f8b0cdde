import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { SleeveDraftScreen } from "@/components/sleeves/sleeve-draft-screen";

export const metadata: Metadata = { title: "Draft a sleeve" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Draft a sleeve" />}>
      <SleeveDraftScreen />
    </Suspense>
  );
}
