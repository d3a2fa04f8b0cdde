import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { ChangeClientScreen } from "@/components/clients/change-client-screen";

export const metadata: Metadata = { title: "Change the client" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Change the client" />}>
      <ChangeClientScreen />
    </Suspense>
  );
}
