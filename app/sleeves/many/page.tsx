import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { ManyScreen } from "@/components/many/many-screen";

export const metadata: Metadata = { title: "One style for many" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="One style for many" />}>
      <ManyScreen />
    </Suspense>
  );
}
