import { Fragment } from "react";
import { cx } from "@/components/ui/cx";
import { formatLength } from "@/lib/lengths/format-length";
import { type Phrase as PhraseParts } from "@/lib/lengths/phrase";
import { speakLength } from "@/lib/lengths/speak-length";
import { type Fineness, type Unit } from "@/lib/records/types";

export type LengthProps = {
  /** In millimetres; the minus of a difference is shown and said. */
  mm: number;
  unit: Unit;
  /** Eighths or sixteenths of an inch. Default 8. */
  fineness?: Fineness;
  /** In a sentence, as the figure of a card, or read at arm's length. Default "text". */
  size?: "text" | "card" | "giant";
  className?: string;
};

const sizes = { text: "", card: "text-figure font-bold", giant: "text-giant font-bold" } as const;

/** A length as a stacked fraction with tabular figures; a screen reader hears "six and a quarter inches". */
export function Length({ mm, unit, fineness = 8, size = "text", className }: LengthProps) {
  const { negative, whole, numerator, denominator } = formatLength(mm, unit, fineness);
  return (
    <span className={cx("figures whitespace-nowrap", sizes[size], className)}>
      <span aria-hidden="true" className="length-row">
        {negative && <span>−</span>}
        {(whole > 0 || numerator === 0 || unit === "cm") && <span>{whole}</span>}
        {numerator > 0 &&
          (unit === "cm" ? (
            <span>.{numerator}</span>
          ) : (
            <span className="stacked-fraction">
              <span>{numerator}</span>
              <span>{denominator}</span>
            </span>
          ))}
        <span className="length-unit">{unit}</span>
      </span>
      <span className="sr-only">{speakLength(mm, unit, fineness)}</span>
    </span>
  );
}

export type PhraseProps = {
  /** Words with lengths in millimetres among them. */
  parts: PhraseParts;
  unit: Unit;
  fineness?: Fineness;
};

/** A sentence with its lengths in the workshop's unit. */
export function Phrase({ parts, unit, fineness }: PhraseProps) {
  return (
    <>
      {parts.map((part, i) => (
        <Fragment key={i}>
          {typeof part === "string" ? part : <Length mm={part.mm} unit={unit} fineness={fineness} />}
        </Fragment>
      ))}
    </>
  );
}
