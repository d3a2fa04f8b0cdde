import { AppLink } from "@/components/ui/app-link";
import { Length } from "@/components/ui/fraction";
import { type HistoryPoint } from "@/lib/measuring/history";
import { formatDay } from "@/lib/people/format-day";
import { LengthChange } from "./length-change";
import { type Fineness, type Unit } from "@/lib/records/types";

/** Each taking of one figure, the newest at the head. */
export function HistoryTable({
  points,
  unit,
  fineness,
}: {
  /** Oldest first. */
  points: readonly HistoryPoint[];
  unit: Unit;
  fineness: Fineness;
}) {
  const rows = points.map((point, i) => ({ ...point, before: points[i - 1] })).reverse();
  return (
    // With very large text the columns are wider than a phone: then they are moved under the thumb, not cut off.
    <div className="overflow-x-auto">
      <table className="w-full text-start">
        <caption className="sr-only">Each time it was taken, the newest first</caption>
        <thead>
          <tr className="border-b-2 border-edge text-start">
            <th scope="col" className="py-2 pe-3 text-start font-semibold">
              Taken
            </th>
            <th scope="col" className="py-2 pe-3 text-end font-semibold">
              Figure
            </th>
            <th scope="col" className="py-2 text-end font-semibold">
              Change
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map(({ setId, on, by, mm, before }) => (
            <tr key={setId} className="border-b border-line">
              <th scope="row" className="pe-3 text-start font-normal">
                <AppLink href={`/measure/set?id=${setId}`} className="inline-flex min-h-target items-center">
                  {formatDay(on)}
                </AppLink>
                {by && <span className="block text-sm text-soft">by {by}</span>}
              </th>
              <td className="pe-3 text-end text-lg font-bold">
                <Length mm={mm} unit={unit} fineness={fineness} />
              </td>
              <td className="text-end">
                {before ? (
                  <LengthChange fromMm={before.mm} toMm={mm} unit={unit} fineness={fineness} />
                ) : (
                  <span className="text-soft">first</span>
                )}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
