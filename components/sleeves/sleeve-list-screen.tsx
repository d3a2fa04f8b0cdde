"use client";

import { useMemo, useState } from "react";
import { ChevronRight } from "lucide-react";
import { useView, useWorkshop } from "@/components/store/use-book";
import { AppLink } from "@/components/ui/app-link";
import { Button, ButtonLink } from "@/components/ui/button";
import { Card, Rows } from "@/components/ui/card";
import { cx } from "@/components/ui/cx";
import { Empty } from "@/components/ui/empty";
import { Length } from "@/components/ui/fraction";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";
import { type Unit } from "@/lib/records/types";
import { mostCompared } from "@/lib/sleeves/compare";
import { headLine } from "@/lib/sleeves/head-line";
import { styleFromRecord } from "@/lib/sleeves/make-style-from-record";
import { styleName } from "@/lib/sleeves/style-names";
import { sleeveListQuery, type SleeveView } from "@/lib/store/queries/sleeves";
import { SleeveThumb } from "./sleeve-thumb";

const page = 20;

/** Every sleeve that was kept, newest first. */
export function SleeveListScreen() {
  const [limit, setLimit] = useState(page);
  const { state, view } = useView(sleeveListQuery, { limit });
  const unit = useWorkshop()?.unit ?? "in";
  // Null while nothing is being chosen.
  const [chosen, setChosen] = useState<string[] | null>(null);
  const { items, more } = view;
  const toggle = (id: string) =>
    setChosen((now) => {
      if (!now) return now;
      if (now.includes(id)) return now.filter((one) => one !== id);
      return now.length < mostCompared ? [...now, id] : now;
    });

  return (
    <Screen
      title="Sleeves"
      wide
      tools={
        <>
          <ButtonLink variant="quiet" href="/sleeves/many">
            One style for many
          </ButtonLink>
          <ButtonLink variant="quiet" href="/sums">
            Sewing sums
          </ButtonLink>
          {items.length > 1 && (
            <Button onClick={() => setChosen((now) => (now ? null : []))}>
              {chosen ? "Stop choosing" : "Compare"}
            </Button>
          )}
        </>
      }
      action={
        chosen ? (
          <CompareAction chosen={chosen} />
        ) : (
          <ButtonLink variant="main" full href="/sleeves/draft">
            Draft a sleeve
          </ButtonLink>
        )
      }
    >
      {state === "failed" && (
        <Notice
          tone="wrong"
          title="The book on this phone did not answer. Close Notchbook and open it again."
        />
      )}
      {items.length === 0 && state === "opening" && <Progress label="Opening the book" />}
      {items.length === 0 && state === "known" && (
        <Empty
          say="Here stand the sleeves you draft. Four figures draw one: length, cap depth, biceps line and hem. It says before cutting whether the sleeve goes in."
          action={<ButtonLink href="/sleeves/draft">Draft the first sleeve</ButtonLink>}
        />
      )}
      {chosen && (
        <p role="status" className="text-soft">
          Choose two to {mostCompared === 4 ? "four" : mostCompared} sleeves. {chosen.length} chosen.
        </p>
      )}
      {items.length > 0 && (
        <Card flush notches={1} aria-label="Sleeves, newest first">
          <Rows className="lg:grid lg:grid-cols-2">
            {items.map((item) => (
              <SleeveRow
                key={item.sleeve.id}
                item={item}
                unit={unit}
                choosing={chosen !== null}
                chosen={chosen?.includes(item.sleeve.id) ?? false}
                onToggle={toggle}
              />
            ))}
          </Rows>
        </Card>
      )}
      {more && <Button onClick={() => setLimit((now) => now + page)}>Show more</Button>}
    </Screen>
  );
}

function CompareAction({ chosen }: { chosen: string[] }) {
  return chosen.length < 2 ? (
    <Button variant="main" full disabled>
      Compare
    </Button>
  ) : (
    <ButtonLink variant="main" full href={`/sleeves/compare?ids=${chosen.join(",")}`}>
      Compare {chosen.length} sleeves
    </ButtonLink>
  );
}

interface SleeveRowProps {
  item: SleeveView;
  unit: Unit;
  choosing: boolean;
  chosen: boolean;
  onToggle(id: string): void;
}

const short = { good: "Goes in", look: "Goes in; look", wrong: "Does not go in", plain: "" } as const;

function SleeveRow({ choosing, chosen, item: { sleeve, wearer }, onToggle, unit }: SleeveRowProps) {
  const { ask, style } = sleeve;
  const made = useMemo(() => styleFromRecord({ ask, style }), [ask, style]);
  const verdict = made ? headLine(made, sleeve.ask).verdict : "wrong";
  const says = made?.ok ? short[verdict] : "Cannot be drawn";
  const inside = (
    <>
      <span className="flex w-16 shrink-0 justify-center">
        {made?.ok && <SleeveThumb pieces={made.pieces} />}
      </span>
      <span className="min-w-0 flex-1">
        <span className="block font-semibold wrap-anywhere">{sleeve.name}</span>
        <span className="block text-sm text-soft wrap-anywhere">
          {styleName(style)}, {wearer?.name ?? "nobody’s yet"}
          {made?.ok && (
            <>
              {", "}
              <Length mm={made.figures.length} unit={unit} fineness={sleeve.fineness} /> long
            </>
          )}
        </span>
        {says && (
          <span className={cx("block text-sm", verdict === "wrong" && "font-semibold text-pin")}>{says}</span>
        )}
      </span>
    </>
  );
  return (
    <li>
      {choosing ? (
        <label className="row row-link cursor-pointer">
          <input
            type="checkbox"
            checked={chosen}
            onChange={() => onToggle(sleeve.id)}
            className="size-6 shrink-0 accent-ink"
          />
          {inside}
        </label>
      ) : (
        <AppLink href={`/sleeves/draft?id=${sleeve.id}`} className="row row-link">
          {inside}
          <ChevronRight aria-hidden="true" className="size-5 shrink-0 text-soft" />
        </AppLink>
      )}
    </li>
  );
}
