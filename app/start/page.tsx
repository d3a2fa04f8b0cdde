"use client";
import { useRouter } from "next/navigation";
import { Screen } from "@/components/ui/screen";
import { Button } from "@/components/ui/button";
import { make } from "@/lib/journal/change";
import { useKeep } from "@/components/store/use-book";
export default function Start() {
  const r = useRouter();
  const { keep } = useKeep();
  return (
    <Screen title="Start">
      <Button onClick={async () => { await keep([make("workshops", { name: "W", unit: "in", fineness: 8, currency: "EUR", country: "MT", address: "", phone: "", demo: false })]); r.push("/"); }}>Begin</Button>
    </Screen>
  );
}
