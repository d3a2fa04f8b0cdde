import { ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { staleness } from "@/lib/figures/staleness";
import { ageOn } from "@/lib/people/age";
import { formatDay } from "@/lib/people/format-day";
import { type MeasurementSet, type Wearer } from "@/lib/records/types";
import { type SetAsk } from "@/lib/sleeves/ask-from-set";

export interface FromSetNoticeProps {
  set: MeasurementSet | null;
  wearer: Wearer | null;
  today: string;
  isNew: boolean;
  /** The form was begun from another set than this, the latest. */
  fromOther: boolean;
  /** The form was filled from the set. */
  inUse: boolean;
  said: SetAsk["said"];
}

/** Which taking of the tape the figures are from, whether it is too old to cut from, or that there is none. */
export function FromSetNotice({ fromOther, inUse, isNew, said, set, today, wearer }: FromSetNoticeProps) {
  if (set && fromOther)
    return (
      <Notice
        tone="look"
        title={`There are newer measurements, taken on ${formatDay(set.takenOn, { style: "long" })}. Start over to draft from them.`}
      />
    );
  if (!set || !inUse) {
    if (!wearer || set || !isNew) return null;
    return (
      <Notice
        title={`There are no measurements of ${wearer.name} yet. Type bare figures, or measure first.`}
        action={<ButtonLink href={`/measure?wearer=${wearer.id}`}>Measure</ButtonLink>}
      />
    );
  }
  const age = wearer ? ageOn(wearer, today)?.years : undefined;
  const { say, stale } = staleness(set.takenOn, age, today);
  const count = Object.keys(said).length;
  return (
    <>
      {stale && (
        <Notice
          tone="look"
          title={say}
          action={
            wearer ? <ButtonLink href={`/measure?wearer=${wearer.id}`}>Measure again</ButtonLink> : undefined
          }
        />
      )}
      <p className="text-soft">
        {count === 0
          ? `Drafted with the set of ${formatDay(set.takenOn, { style: "long" })} at hand; no figure is as it was taken.`
          : `${count} figures are from the set taken on ${formatDay(set.takenOn, { style: "long" })}; each says where it comes from. Type over any of them.`}
      </p>
    </>
  );
}
