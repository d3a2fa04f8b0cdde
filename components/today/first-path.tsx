import { Check } from "lucide-react";
import { ButtonLink } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { cx } from "@/components/ui/cx";
import { Notch } from "@/components/ui/notch";
import { type FirstStep } from "@/lib/orders/first-steps";

const signs = { done: "Done", next: "Now", later: "Then" } as const;

/** How a new book is begun, the step to do now picked out. */
export function FirstPath({ steps }: { steps: readonly FirstStep[] }) {
  return (
    <Card aria-labelledby="first-path">
      <CardHead id="first-path" title="From the first client to the first order" />
      <ol className="grid gap-1">
        {steps.map(({ say, why, href, state }) => (
          <li
            key={say}
            aria-current={state === "next" ? "step" : undefined}
            className={cx(
              "flex flex-wrap items-center gap-x-3 gap-y-2 border-s-4 py-2 ps-3",
              state === "next" ? "border-ink bg-well pe-3" : "border-line",
            )}
          >
            <span className="flex w-6 shrink-0 justify-center" aria-hidden="true">
              {state === "done" ? (
                <Check className="size-5 text-moss" />
              ) : state === "next" ? (
                <Notch label="" />
              ) : null}
            </span>
            <span className="min-w-0 flex-1 basis-28">
              <span className={cx("block", state === "later" ? "text-soft" : "font-semibold")}>
                <span className="sr-only">{signs[state]}: </span>
                {say}
              </span>
              {state === "next" && <span className="block text-soft">{why}</span>}
            </span>
            {state === "later" && (
              <ButtonLink variant="quiet" className="-me-3 px-3!" href={href} aria-label={`${say} now`}>
                Now
              </ButtonLink>
            )}
          </li>
        ))}
      </ol>
    </Card>
  );
}
