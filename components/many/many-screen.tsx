"use client";

import { useMemo, useState } from "react";
import { useSearchParams } from "next/navigation";
import { ScreenOpening } from "@/components/frame/not-shown";
import { useWorkshop } from "@/components/store/use-book";
import { useDraft } from "@/components/store/use-draft";
import { askedWearers, emptyManyForm, type ManyForm, restoredManyForm } from "@/lib/many/many-form";
import { type Workshop } from "@/lib/records/types";
import { ManyEditor } from "./many-editor";

const TITLE = "One style for many";

/** One style over chosen wearers: a choir, a bridal party, a school play. The address may name whom to begin with. */
export function ManyScreen() {
  const asked = useSearchParams().get("ids");
  const workshop = useWorkshop();
  if (!workshop) return <ScreenOpening title={TITLE} />;
  return <Many key={asked} asked={asked} workshop={workshop} />;
}

function Many({ asked, workshop }: { asked: string | null; workshop: Workshop }) {
  const { fineness, unit } = workshop;
  const ids = useMemo(() => askedWearers(asked), [asked]);
  const draftKey = ids.length > 0 ? `many:${ids.join(",")}` : "many";
  const handle = useDraft<ManyForm>(draftKey);
  // What the form begins with must not move under the typing when the workshop's row changes.
  const [initial] = useState(() => emptyManyForm(unit, fineness, ids));
  const { draft } = handle;
  const begun = useMemo(
    () => (draft ? restoredManyForm(draft, unit, fineness) : null),
    [draft, unit, fineness],
  );
  if (draft === undefined) return <ScreenOpening title={TITLE} />;
  return <ManyEditor title={TITLE} workshopName={workshop.name} {...{ draftKey, initial, begun, handle }} />;
}
