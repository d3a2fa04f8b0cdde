import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { HistoryScreen } from "@/components/measure/history-screen";

export const metadata: Metadata = { title: "History of a figure" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="History of a figure" />}>
      <HistoryScreen />
    </Suspense>
  );
}
