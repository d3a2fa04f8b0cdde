import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { ChangeWearerScreen } from "@/components/wearers/change-wearer-screen";

export const metadata: Metadata = { title: "Change the wearer" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Change the wearer" />}>
      <ChangeWearerScreen />
    </Suspense>
  );
}
