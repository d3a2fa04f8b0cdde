import { Length } from "@/components/ui/fraction";
import { formatLength } from "@/lib/lengths/format-length";
import { type Fineness, type Unit } from "@/lib/records/types";

/** How much longer or shorter, signed; "the same" where the difference is less than can be shown. */
export function LengthChange({
  fromMm,
  toMm,
  unit,
  fineness,
}: {
  fromMm: number;
  toMm: number;
  unit: Unit;
  fineness: Fineness;
}) {
  const change = toMm - fromMm;
  const { figure, negative } = formatLength(change, unit, fineness);
  if (figure === "0") return <>the same</>;
  return (
    <span className="font-semibold whitespace-nowrap">
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
