"use client";

import { useMemo, useState } from "react";
import { useSearchParams } from "next/navigation";
import { useView, useWorkshop } from "@/components/store/use-book";
import { ButtonLink } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Choice } from "@/components/ui/field";
import { Length } from "@/components/ui/fraction";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";
import { type Fineness, type Unit } from "@/lib/records/types";
import { comparedIds, type ComparedRow, comparedRows } from "@/lib/sleeves/compare";
import { boxOf, outlineOf, unionOf } from "@/lib/sleeves/drawing-paths";
import { fitView, toScreen } from "@/lib/sleeves/drawing-view";
import { type GoodSleeve, styleFromRecord, type StyledSleeve } from "@/lib/sleeves/make-style-from-record";
import { styleName } from "@/lib/sleeves/style-names";
import { sleevesQuery } from "@/lib/store/queries/sleeves";
import { backToSleeves } from "@/components/frame/not-shown";
import { SleeveThumb } from "./sleeve-thumb";
import { useSize } from "./use-size";
import "./sleeves.css";

/** How each sleeve's line is told from the others: by its pattern and its letter, never by colour. */
const looks = [
  { letter: "A", dash: undefined, width: 3 },
  { letter: "B", dash: "9 6", width: 2.5 },
  { letter: "C", dash: "2 5", width: 3 },
  { letter: "D", dash: "12 4 2 4", width: 2 },
] as const;

type Lay = "crown" | "cap";

/** Sleeves laid over each other on one centre line, and their figures side by side. */
export function CompareScreen() {
  const asked = useSearchParams().get("ids");
  const ids = useMemo(() => comparedIds(asked), [asked]);
  return <Compare key={asked} ids={ids} />;
}

function Compare({ ids }: { ids: string[] }) {
  const { state, view } = useView(sleevesQuery, { ids });
  const workshop = useWorkshop();
  const [lay, setLay] = useState<Lay>("crown");
  const live = view.filter(({ sleeve }) => sleeve.removedAt === null);
  const made = useMemo(
    () =>
      view
        .filter(({ sleeve }) => sleeve.removedAt === null)
        .map(({ sleeve }) => ({ record: sleeve.ask, made: styleFromRecord(sleeve) })),
    [view],
  );
  const rows = useMemo(() => comparedRows(made), [made]);
  const styled = live.some(({ sleeve }) => sleeve.style !== "plain");
  const unit = workshop?.unit ?? "in";
  const fineness: Fineness = live.some(({ sleeve }) => sleeve.fineness === 16) ? 16 : 8;

  if (live.length < 2)
    return (
      <Screen title="Compare sleeves" back={backToSleeves}>
        {state === "opening" ? (
          <Progress label="Opening the book" />
        ) : (
          <Notice
            tone="look"
            title="There are no two sleeves here to compare."
            action={<ButtonLink href="/sleeves">Choose two to four</ButtonLink>}
          />
        )}
      </Screen>
    );
  const drawn = made.flatMap(({ made: one }, i) => (one?.ok ? [{ made: one, look: looks[i]! }] : []));
  return (
    <Screen title="Compare sleeves" back={backToSleeves} wide>
      <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-6 lg:grid-cols-2">
        <Card aria-labelledby="laid-title">
          <CardHead
            id="laid-title"
            title="Laid on one centre line"
            sub={styled && "Of a sleeve with a style, the plain one that it is made from."}
          />
          <ul className="mb-3 grid gap-1">
            {live.map(({ sleeve, wearer }, i) => (
              <li key={sleeve.id} className="flex items-center gap-3">
                <Sample look={looks[i]!} />
                <span className="min-w-0 flex-1 wrap-anywhere">
                  <span className="font-bold">{looks[i]!.letter}</span> {sleeve.name}
                  {wearer && !sleeve.name.includes(wearer.name) && `, ${wearer.name}`}
                  <span className="block text-sm text-soft">{styleName(sleeve.style)}</span>
                  {!made[i]?.made?.ok && "Cannot be drawn"}
                </span>
                <Pieces of={made[i]?.made} />
              </li>
            ))}
          </ul>
          <Choice
            bare
            label="Laid together at"
            name="lay"
            options={[
              { value: "crown", label: "Crowns together" },
              { value: "cap", label: "Cap lines together" },
            ]}
            value={lay}
            onChange={(event) => setLay(event.target.value as Lay)}
          />
          <Overlaid drawn={drawn} lay={lay} />
        </Card>
        <Card aria-labelledby="figures-title">
          <CardHead
            id="figures-title"
            title="Figures side by side"
            sub="Below each figure, how much more or less than A."
          />
          <FiguresTable
            rows={rows}
            letters={live.map((_, i) => looks[i]!.letter)}
            unit={unit}
            fineness={fineness}
          />
        </Card>
      </div>
    </Screen>
  );
}

type Look = (typeof looks)[number];

function Pieces({ of }: { of: StyledSleeve | null | undefined }) {
  return of?.ok && of.style !== "plain" ? <SleeveThumb pieces={of.pieces} /> : null;
}

function Sample({ look }: { look: Look }) {
  return (
    <svg aria-hidden="true" viewBox="0 0 48 12" className="h-3 w-12 shrink-0">
      <path d="M1 6H47" stroke="var(--ink)" strokeWidth={look.width} strokeDasharray={look.dash} />
    </svg>
  );
}

interface OverlaidProps {
  drawn: { made: GoodSleeve; look: Look }[];
  lay: Lay;
}

const room = { top: 16, right: 28, bottom: 30, left: 16 };

function Overlaid({ drawn, lay }: OverlaidProps) {
  const [ref, size] = useSize<HTMLDivElement>();
  const shift = (made: OverlaidProps["drawn"][number]["made"]) =>
    lay === "cap" ? -made.figures.capDepth : 0;
  const boxes = drawn.map(({ made }) => {
    const box = boxOf(made.draft);
    return { ...box, y: box.y + shift(made) };
  });
  const view = size && boxes.length > 0 ? fitView(unionOf(boxes), size, room) : null;
  return (
    <div ref={ref} className="marking-paper mt-3 h-[26rem] border-2 border-edge">
      {size && view && (
        <svg
          width={size.width}
          height={size.height}
          role="img"
          aria-label={`The outlines of ${drawn.map(({ look }) => look.letter).join(", ")} over each other. The figures are in the table.`}
        >
          <path d={`M${view.x} 0V${size.height}`} className="line-guide" strokeDasharray="4 4" />
          {drawn.map(({ look, made }) => (
            <g
              key={look.letter}
              transform={`translate(${view.x} ${view.y + shift(made) * view.scale}) scale(${view.scale})`}
            >
              <path
                d={outlineOf(made.draft.piece)}
                fill="none"
                stroke="var(--ink)"
                strokeWidth={look.width}
                strokeDasharray={look.dash}
                vectorEffect="non-scaling-stroke"
              />
            </g>
          ))}
          {drawn.map(({ look, made }, i) => {
            const { draft, figures } = made;
            const hem = draft.points.hemBack!;
            const { x, y } = toScreen(view, { x: hem.x, y: figures.length + shift(made) });
            return (
              <text
                key={look.letter}
                // Letters of hems that fall together stand beside each other.
                x={x - 14 - i * 22}
                y={y + 20}
                fill="var(--ink)"
                fontWeight="700"
                fontSize="18"
              >
                {look.letter}
              </text>
            );
          })}
        </svg>
      )}
    </div>
  );
}

interface FiguresTableProps {
  rows: ComparedRow[];
  letters: readonly string[];
  unit: Unit;
  fineness: Fineness;
}

function FiguresTable({ fineness, letters, rows, unit }: FiguresTableProps) {
  const units = { unit, fineness };
  return (
    <div role="region" aria-label="Table of figures" tabIndex={0} className="relative overflow-x-auto">
      <table className="w-full border-collapse">
        <thead>
          <tr>
            <th scope="col" className="py-1 pe-3 text-start font-normal text-soft">
              Figure
            </th>
            {letters.map((letter) => (
              <th key={letter} scope="col" className="px-2 py-1 text-end">
                {letter}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ differences, name, values }) => (
            <tr key={name} className="border-t border-line align-top">
              <th scope="row" className="py-2 pe-3 text-start font-semibold">
                {name}
              </th>
              {values.map((value, i) => {
                const difference = differences[i] ?? null;
                return (
                  <td key={letters[i]} className="px-2 py-2 text-end">
                    {value === null ? (
                      <span className="text-soft">none</span>
                    ) : (
                      <Length mm={value} {...units} className="text-lg font-bold" />
                    )}
                    {difference !== null && (
                      <span className="block text-sm text-soft">
                        <Difference mm={difference} {...units} />
                      </span>
                    )}
                  </td>
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function Difference({ fineness, mm, unit }: { mm: number; unit: Unit; fineness: Fineness }) {
  if (Math.abs(mm) < 0.5) return "the same";
  return (
    <>
      <Length mm={Math.abs(mm)} unit={unit} fineness={fineness} /> {mm > 0 ? "more" : "less"}
    </>
  );
}
