import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { NewClientScreen } from "@/components/clients/new-client-screen";

export const metadata: Metadata = { title: "New client" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="New client" />}>
      <NewClientScreen />
    </Suspense>
  );
}
