import { TriangleAlert } from "lucide-react";
import { ageOn } from "@/lib/people/age";
import { formatDay } from "@/lib/people/format-day";
import { staleness } from "@/lib/figures/staleness";
import { type MeasurementSet, type Wearer } from "@/lib/records/types";

/** When a wearer was last measured, and whether that is too long ago to cut from. */
export function FiguresAge({
  wearer,
  latestSet,
  today,
}: {
  wearer: Wearer;
  latestSet: MeasurementSet | null;
  today: string;
}) {
  if (!latestSet) return <p>Not measured yet.</p>;
  const { say } = staleness(latestSet.takenOn, ageOn(wearer, today)?.years, today);
  return (
    <>
      <p>Measured {formatDay(latestSet.takenOn, { style: "long" })}</p>
      {say && (
        <p className="flex items-start gap-2 font-semibold text-thread">
          <TriangleAlert aria-hidden="true" className="mt-[0.2em] size-[1.1em] shrink-0" />
          <span>{say}</span>
        </p>
      )}
    </>
  );
}
