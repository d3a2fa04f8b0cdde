import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { WearerCardScreen } from "@/components/wearers/wearer-card-screen";

export const metadata: Metadata = { title: "Wearer" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Wearer" />}>
      <WearerCardScreen />
    </Suspense>
  );
}
