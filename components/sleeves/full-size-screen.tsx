"use client";

import { useCallback, useMemo } from "react";
import { backToSleeves, NotShown } from "@/components/frame/not-shown";
import { useIdParam } from "@/components/store/use-id-param";
import { useView, useWorkshop } from "@/components/store/use-book";
import { useToday } from "@/components/store/use-today";
import { ButtonLink } from "@/components/ui/button";
import { Phrase } from "@/components/ui/fraction";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { type Unit } from "@/lib/records/types";
import { fullSizeDocument, usualAllowance } from "@/lib/sleeves/full-size";
import { styleFromRecord } from "@/lib/sleeves/make-style-from-record";
import { sleevesQuery, type SleeveView } from "@/lib/store/queries/sleeves";
import { BinnedSleeve } from "./binned-sleeve";
import { FullSizeSheet } from "./full-size-sheet";

const TITLE = "Full size";
const NOT_HERE = "This sleeve is not in the book.";

/** The pieces of a kept sleeve, to print and cut. */
export function FullSizeScreen() {
  const id = useIdParam("id");
  const workshop = useWorkshop();
  if (!id) return <NotShown back={backToSleeves} title={TITLE} state="known" say={NOT_HERE} />;
  return <Found key={id} id={id} unit={workshop?.unit ?? "in"} workshopName={workshop?.name ?? ""} />;
}

interface Workplace {
  unit: Unit;
  workshopName: string;
}

function Found({ id, ...workplace }: Workplace & { id: string }) {
  const { state, view } = useView(sleevesQuery, { ids: [id] });
  const found = view[0];
  if (!found) return <NotShown back={backToSleeves} title={TITLE} state={state} say={NOT_HERE} />;
  if (found.sleeve.removedAt !== null) return <BinnedSleeve sleeve={found.sleeve} />;
  return <Pieces found={found} {...workplace} />;
}

function Pieces({ found: { sleeve, wearer }, unit, workshopName }: Workplace & { found: SleeveView }) {
  const { ask, fineness, name, style } = sleeve;
  const today = useToday();
  const made = useMemo(() => styleFromRecord({ ask, style }), [ask, style]);
  const good = made?.ok ? made : null;
  const wearerName = wearer?.name ?? "";
  const build = useCallback(
    (allowance: number | null) => {
      if (!good) throw new Error("There is no sleeve to print.");
      const words = { wearerName, author: workshopName, today };
      return fullSizeDocument({ sleeve: { name, fineness }, good, allowance, unit, ...words });
    },
    [good, name, fineness, unit, wearerName, workshopName, today],
  );
  const back = { href: `/sleeves/marks?id=${sleeve.id}`, label: "Mark out" };
  if (!good) {
    const problem = made && !made.ok ? made.problems[0] : undefined;
    return (
      <Screen title={TITLE} back={back}>
        <Notice
          tone="wrong"
          title={
            problem ? (
              <Phrase parts={[...problem.phrase]} unit={unit} fineness={fineness} />
            ) : (
              "A figure is missing, so there is nothing to print."
            )
          }
          action={<ButtonLink href={`/sleeves/draft?id=${sleeve.id}`}>Change the sleeve</ButtonLink>}
        >
          {problem && (
            <p>
              <Phrase parts={[...problem.remedy]} unit={unit} fineness={fineness} />
            </p>
          )}
        </Notice>
      </Screen>
    );
  }
  return (
    <Screen title={TITLE} sub={[name, wearerName].filter((words) => words !== "").join(", ")} back={back}>
      <FullSizeSheet
        build={build}
        name={name}
        unit={unit}
        fineness={fineness}
        usualAllowance={usualAllowance(unit)}
      />
    </Screen>
  );
}
