"use client";

import { useState } from "react";
import { useView } from "@/components/store/use-book";
import { Button } from "@/components/ui/button";
import { RowButton, Rows } from "@/components/ui/card";
import { Sheet } from "@/components/ui/dialog";
import { Field, TextInput } from "@/components/ui/field";
import { type Wearer } from "@/lib/records/types";
import { clientListQuery } from "@/lib/store/queries/clients";

export interface WhoseSleeveProps {
  wearerId: string | null;
  /** The wearer's row, null while it is not known. */
  whose: Wearer | null;
  onChoose(wearerId: string | null): void;
}

/** Whose sleeve it is; one drafted from bare figures can be given to a wearer at any time. */
export function WhoseSleeve({ onChoose, wearerId, whose }: WhoseSleeveProps) {
  const [open, setOpen] = useState(false);
  const choose = (id: string | null) => {
    onChoose(id);
    setOpen(false);
  };
  return (
    <div className="grid gap-1.5">
      <p className="font-semibold">Whose sleeve</p>
      <div className="flex flex-wrap items-center justify-between gap-2">
        <p>{wearerId === null ? "Nobody’s yet" : (whose?.name ?? "A wearer")}</p>
        <Sheet
          open={open}
          onOpenChange={setOpen}
          title="Whose sleeve is it?"
          trigger={<Button>{wearerId === null ? "Choose a wearer" : "Change"}</Button>}
        >
          <ChooseWearer onChoose={choose} />
          {wearerId !== null && (
            <Button variant="quiet" onClick={() => choose(null)}>
              Nobody’s for now
            </Button>
          )}
        </Sheet>
      </div>
    </div>
  );
}

const shownAtMost = 30;

function ChooseWearer({ onChoose }: { onChoose(id: string): void }) {
  const [find, setFind] = useState("");
  const { state, view } = useView(clientListQuery, { find, limit: shownAtMost });
  const people = view.items.flatMap(({ client, wearers }) => wearers.map((wearer) => ({ client, wearer })));
  return (
    <>
      <Field label="Find by name or number">
        <TextInput type="search" value={find} onChange={(event) => setFind(event.target.value)} />
      </Field>
      {people.length === 0 ? (
        <p className="text-soft">
          {state === "opening"
            ? "Opening the book…"
            : find
              ? "Nobody by that name."
              : "There are no wearers in the book yet."}
        </p>
      ) : (
        <Rows className="max-h-[50dvh] overflow-y-auto rounded border-2 border-edge">
          {people.map(({ client, wearer }) => (
            <RowButton
              key={wearer.id}
              title={wearer.name}
              sub={wearer.name === client.name ? undefined : client.name}
              onPress={() => onChoose(wearer.id)}
            />
          ))}
        </Rows>
      )}
      {view.more && <p className="text-soft">More are in the book: type a name to find them.</p>}
    </>
  );
}
