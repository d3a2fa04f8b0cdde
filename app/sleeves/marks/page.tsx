import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { MarksScreen } from "@/components/sleeves/marks-screen";

export const metadata: Metadata = { title: "Mark out" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Mark out" />}>
      <MarksScreen />
    </Suspense>
  );
}
