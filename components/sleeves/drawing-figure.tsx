import { formatLength } from "@/lib/lengths/format-length";
import { type Fineness, type Unit } from "@/lib/records/types";

export interface DrawingFigureProps {
  mm: number;
  unit: Unit;
  fineness: Fineness;
}

/** A length on a drawing, without its unit: the drawing says that once. For eyes only; the text beside it is read out. */
export function DrawingFigure({ mm, unit, fineness }: DrawingFigureProps) {
  const { denominator, negative, numerator, whole } = formatLength(mm, unit, fineness);
  return (
    <span aria-hidden="true" className="figures inline-flex items-baseline">
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
    </span>
  );
}
