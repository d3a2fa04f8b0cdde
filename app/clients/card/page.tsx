import { type Metadata } from "next";
import { Suspense } from "react";
import { ScreenOpening } from "@/components/frame/not-shown";
import { ClientCardScreen } from "@/components/clients/client-card-screen";

export const metadata: Metadata = { title: "Client" };

export default function Page() {
  return (
    <Suspense fallback={<ScreenOpening title="Client" />}>
      <ClientCardScreen />
    </Suspense>
  );
}
