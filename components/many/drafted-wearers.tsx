"use client";

import { memo, useState } from "react";
import { CircleCheck, OctagonX, TriangleAlert } from "lucide-react";
import { Length, Phrase } from "@/components/ui/fraction";
import { type DraftedWearer } from "@/lib/many/draft-many";
import { type Fineness, type Unit } from "@/lib/records/types";
import { countLine, sortedChecks } from "@/lib/sleeves/head-line";
import { failingSeams } from "@/lib/sleeves/make-style-from-record";

const signs = {
  good: { Sign: CircleCheck, colour: "text-moss", word: "Good" },
  look: { Sign: TriangleAlert, colour: "text-thread", word: "Look" },
  wrong: { Sign: OctagonX, colour: "text-pin", word: "Wrong" },
} as const;

interface Units {
  unit: Unit;
  fineness: Fineness;
}

interface DraftedProps extends Units {
  rows: readonly DraftedWearer[];
}

const headOf = ({ good }: DraftedWearer) => good.gathers.find(({ id }) => id === "head");

const figures: readonly (readonly [string, (row: DraftedWearer) => number])[] = [
  ["Length", ({ good }) => good.figures.length],
  ["Biceps line", ({ good }) => good.figures.biceps],
  ["Cap depth", ({ good }) => good.figures.capDepth],
  ["Hem round", ({ good }) => good.figures.hem],
];

/** On a phone: a card for each, whether it will do before anything else. */
export const DraftedCards = memo(function DraftedCards({ rows, ...units }: DraftedProps) {
  return (
    <ul className="grid gap-4 lg:hidden">
      {rows.map((row) => (
        <li key={row.wearer.id} className="grid gap-2 border-t-2 border-edge pt-3">
          <h3>
            <Verdict row={row} />
          </h3>
          <Says row={row} {...units} />
          <dl className="grid grid-cols-2 gap-x-4 gap-y-1">
            {figures.map(([name, read]) => (
              <div key={name} className="flex flex-wrap items-baseline justify-between gap-x-2">
                <dt className="text-sm text-soft">{name}</dt>
                <dd className="font-semibold">
                  <Length mm={read(row)} {...units} />
                </dd>
              </div>
            ))}
            {headOf(row) && (
              <div className="col-span-2 flex flex-wrap items-baseline justify-between gap-x-2">
                <dt className="text-sm text-soft">Head, full and pulled up</dt>
                <dd className="font-semibold">
                  <Head row={row} {...units} />
                </dd>
              </div>
            )}
          </dl>
          <AllChecks row={row} {...units} />
        </li>
      ))}
    </ul>
  );
});

/** On a wide screen: a table, a row for each. */
export const DraftedTable = memo(function DraftedTable({ rows, ...units }: DraftedProps) {
  const gathered = rows.some((row) => headOf(row));
  const head = "px-2 py-1 text-end text-sm font-normal text-soft";
  return (
    <table className="hidden w-full border-collapse lg:table">
      <thead>
        <tr>
          <th scope="col" className="py-1 pe-3 text-start text-sm font-normal text-soft">
            Wearer
          </th>
          {figures.map(([name]) => (
            <th key={name} scope="col" className={head}>
              {name}
            </th>
          ))}
          {gathered && (
            <th scope="col" className={head}>
              Head, full and pulled up
            </th>
          )}
          <th scope="col" className="w-1/2 py-1 ps-4 text-start text-sm font-normal text-soft">
            Checks
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.wearer.id} className="border-t border-line align-top">
            <th scope="row" className="py-2 pe-3 text-start">
              <Verdict row={row} />
            </th>
            {figures.map(([name, read]) => (
              <td key={name} className="px-2 py-2 text-end font-semibold">
                <Length mm={read(row)} {...units} />
              </td>
            ))}
            {gathered && (
              <td className="px-2 py-2 text-end font-semibold">
                <Head row={row} {...units} />
              </td>
            )}
            <td className="py-2 ps-4">
              <Says row={row} {...units} />
              <AllChecks row={row} {...units} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
});

function Verdict({ row: { verdict, wearer } }: { row: DraftedWearer }) {
  const { Sign, colour, word } = signs[verdict];
  return (
    <span className="flex items-start gap-2 font-bold">
      <Sign aria-hidden="true" className={`mt-[0.15em] size-[1.2em] shrink-0 ${colour}`} />
      <span className="min-w-0 wrap-anywhere">
        <span className={colour}>{word}: </span>
        {wearer.name}
      </span>
    </span>
  );
}

function Head({ row, ...units }: { row: DraftedWearer } & Units) {
  const head = headOf(row);
  if (!head) return <span className="font-normal text-soft">not gathered</span>;
  return (
    <>
      <Length mm={head.full} {...units} /> <span className="font-normal">into</span>{" "}
      <Length mm={head.pulledTo} {...units} />
    </>
  );
}

/** Whether it goes in, and each thing that is wrong or to look at. */
function Says({ row: { line, reasons }, ...units }: { row: DraftedWearer } & Units) {
  return (
    <>
      <p>
        <Phrase parts={line.phrase} {...units} />
      </p>
      {reasons.length > 0 && (
        <ul className="list-disc ps-5">
          {reasons.map((reason, i) => (
            <li key={i}>
              <Phrase parts={reason} {...units} />
            </li>
          ))}
        </ul>
      )}
    </>
  );
}

/** The walk and every check; made only when it is opened, for they are many. */
function AllChecks({ row: { good }, ...units }: { row: DraftedWearer } & Units) {
  const [open, setOpen] = useState(false);
  const failing = failingSeams(good).length;
  const walked = failing === 0 ? `all ${good.seams.length} seams meet` : `${failing} seams do not meet`;
  return (
    <details onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary className="min-h-target py-2 font-semibold">
        Checks: {countLine(good.checks)}
        {good.seams.length > 0 && `; ${walked}`}
      </summary>
      {open && (
        <ul className="grid gap-1 pb-2">
          {Object.values(sortedChecks(good.checks))
            .flat()
            .map((check) => (
              <li key={check.id}>
                <span className={`font-bold ${signs[check.verdict].colour}`}>
                  {signs[check.verdict].word}:{" "}
                </span>
                <Phrase parts={[...check.phrase]} {...units} />
              </li>
            ))}
          {good.seams.map((seam) => (
            <li key={seam.id}>
              <span className={`font-bold ${seam.agrees ? "text-moss" : "text-pin"}`}>
                {seam.agrees ? "Meets: " : "Does not meet: "}
              </span>
              <Phrase parts={[...seam.phrase]} {...units} />
            </li>
          ))}
        </ul>
      )}
    </details>
  );
}
