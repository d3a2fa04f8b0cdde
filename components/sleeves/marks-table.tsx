"use client";

import { type GuideMark, type Side } from "@/lib/drafting";
import { formatLength } from "@/lib/lengths/format-length";
import { type Fineness, type Unit } from "@/lib/records/types";
import { type MarkProblem, type MarkText, markTexts, shareText } from "@/lib/sleeves/guide-marks";
import { Button } from "@/components/ui/button";
import { FieldError, Select, TextInput } from "@/components/ui/field";
import { Notch } from "@/components/ui/notch";

const ordinals = ["first", "second", "third", "fourth", "fifth", "sixth"];

export interface MarksTableProps {
  side: Side;
  /** As set by hand; null where the rule's own stand. */
  texts: MarkText[] | null;
  /** The rule's own marks for this sleeve. */
  rule: readonly GuideMark[];
  problems: readonly MarkProblem[];
  /** What the engine says of a mark, by its index. */
  faults: ReadonlyMap<number, string>;
  unit: Unit;
  fineness: Fineness;
  onChange(side: Side, texts: MarkText[] | null): void;
}

/** The guide marks of one half, from the underarm up: how far up the guide line, and how far out or in. */
export function MarksTable({
  faults,
  fineness,
  onChange,
  problems,
  rule,
  side,
  texts,
  unit,
}: MarksTableProps) {
  const shown = texts ?? markTexts(rule);
  const name = side === "front" ? "Front" : "Back";
  const set = (index: number, patch: Partial<MarkText>) =>
    onChange(
      side,
      shown.map((mark, i) => (i === index ? { ...mark, ...patch } : mark)),
    );
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-2">
      <div className="relative overflow-x-auto">
        <table className="w-full border-collapse text-start">
          <caption className="mb-1 text-start font-semibold">
            <Notch count={side === "front" ? 1 : 2} label="" className="me-2 inline" />
            {name} marks{texts ? ", changed by hand" : ", as the rule has them"}
          </caption>
          <thead>
            <tr className="text-sm text-soft">
              <th scope="col" className="pe-2 text-start font-normal">
                Mark
              </th>
              <th scope="col" className="text-start font-normal">
                Up the line
              </th>
              <th scope="col" className="text-start font-normal" colSpan={2}>
                Out or in
              </th>
            </tr>
          </thead>
          <tbody>
            {shown.map((mark, index) => {
              const words = `${name}, ${ordinals[index] ?? index + 1} mark`;
              return (
                <tr key={index}>
                  <th scope="row" className="figures pe-2 text-start">
                    {index + 1}
                  </th>
                  <td className="w-24 py-1 pe-1">
                    <TextInput
                      figure
                      after="%"
                      aria-label={`${words}: hundredths up the guide line`}
                      aria-invalid={
                        problems.some((p) => p.index === index && p.cell === "share") || undefined
                      }
                      value={mark.shareTyped ?? shareText(mark.share)}
                      onChange={(event) => set(index, { shareTyped: event.target.value })}
                      className="px-2 pe-7"
                    />
                  </td>
                  <td className="py-1 pe-1">
                    <TextInput
                      figure
                      aria-label={`${words}: how far from the guide line`}
                      aria-invalid={problems.some((p) => p.index === index && p.cell === "out") || undefined}
                      value={mark.outTyped ?? formatLength(mark.out, unit, fineness).figure}
                      onChange={(event) => set(index, { outTyped: event.target.value })}
                      className="px-2"
                    />
                  </td>
                  <td className="w-24 py-1">
                    <Select
                      aria-label={`${words}: raised or hollowed`}
                      value={mark.raised ? "out" : "in"}
                      onChange={(event) => set(index, { raised: event.target.value === "out" })}
                      className="px-2"
                    >
                      <option value="out">out</option>
                      <option value="in">in</option>
                    </Select>
                  </td>
                </tr>
              );
            })}
          </tbody>
        </table>
      </div>
      {problems.map(({ cell, index, say }) => (
        <FieldError key={`${index}${cell}`}>
          {name} mark {index + 1}: {say}
        </FieldError>
      ))}
      {[...faults].map(([index, say]) => (
        <FieldError key={index}>{say}</FieldError>
      ))}
      {texts && (
        <Button variant="quiet" onClick={() => onChange(side, null)} className="justify-self-start">
          {name}: as the rule has it
        </Button>
      )}
    </div>
  );
}
