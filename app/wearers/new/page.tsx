import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { NewWearerScreen } from "@/components/wearers/new-wearer-screen";

export const metadata: Metadata = { title: "New wearer" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="New wearer" />}>
      <NewWearerScreen />
    </Suspense>
  );
}
