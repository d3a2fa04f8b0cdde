import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { SumsScreen } from "@/components/sums/sums-screen";

export const metadata: Metadata = { title: "Sewing sums" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Sewing sums" />}>
      <SumsScreen />
    </Suspense>
  );
}
