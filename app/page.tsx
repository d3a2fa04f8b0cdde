"use client";
import { useState } from "react";
import { Screen } from "@/components/ui/screen";
import { Button } from "@/components/ui/button";
import { make } from "@/lib/journal/change";
import { useKeep, useView, useWorkshop } from "@/components/store/use-book";
import { clientListQuery } from "@/lib/store/queries/clients";
export default function Today() {
  const w = useWorkshop();
  const [n, setN] = useState(0);
  const { keep, problem } = useKeep();
  const { view, state } = useView(clientListQuery, { find: "", limit: 20 });
  return (
    <Screen title={w?.name ?? "Today"}>
      <p id="state">{state}</p>
      <p>{problem?.message}</p>
      <Button onClick={async () => { setN(n + 1); await keep([make("clients", { name: `Client ${n}`, phone: "", phoneE164: null, email: "", address: "", note: "" })]); }}>Add</Button>
      <ul>{view.items.map((i) => <li key={i.client.id}>{i.client.name}</li>)}</ul>
    </Screen>
  );
}
