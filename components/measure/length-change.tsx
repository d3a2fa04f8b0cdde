import { Length } from "@/components/ui/fraction";
import { formatLength } from "@/lib/lengths/format-length";
import { type Fineness, type Unit } from "@/lib/records/types";

export interface LengthChangeProps {
  fromMm: number;
  toMm: number;
  unit: Unit;
  fineness: Fineness;
}

/** How much longer or shorter, signed; "The same" where the difference is less than can be shown. */
export function LengthChange({ fromMm, toMm, unit, fineness }: LengthChangeProps) {
  const change = toMm - fromMm;
  const { figure, negative } = formatLength(change, unit, fineness);
  if (figure === "0") return <>The same</>;
  return (
    <span className="whitespace-nowrap">
      {!negative && (
        <>
          <span aria-hidden="true">+</span>
          <span className="sr-only">plus </span>
        </>
      )}
      <Length mm={change} unit={unit} fineness={fineness} />
    </span>
  );
}
