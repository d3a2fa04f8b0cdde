import { type ReactNode } from "react";
import { CircleCheck, Info, OctagonX, TriangleAlert } from "lucide-react";
import { cx } from "@/components/ui/cx";

export type NoticeTone = "good" | "look" | "wrong" | "plain";

export type NoticeProps = {
  /** `good` done, `look` think before you go on, `wrong` it did not work, `plain` a thing to know. Default "plain". */
  tone?: NoticeTone;
  title: ReactNode;
  children?: ReactNode;
  /** What to do next: a Button or ButtonLink. */
  action?: ReactNode;
  /** Read out as soon as it appears. Leave out what stands on the page from the start. */
  live?: boolean;
  className?: string;
};

const tones = {
  good: { Sign: CircleCheck, colour: "text-moss", border: "border-moss", says: "Good: " },
  look: { Sign: TriangleAlert, colour: "text-thread", border: "border-thread", says: "Look: " },
  wrong: { Sign: OctagonX, colour: "text-pin", border: "border-pin", says: "Wrong: " },
  plain: { Sign: Info, colour: "text-chalk", border: "border-chalk", says: "" },
} as const;

/** Something to know at this moment: a sign, a sentence, and what to do next. */
export function Notice({ tone = "plain", title, children, action, live, className }: NoticeProps) {
  const { Sign, colour, border, says } = tones[tone];
  const role = live ? (tone === "wrong" ? "alert" : "status") : undefined;
  return (
    <div
      role={role}
      className={cx("grid gap-2 rounded border-2 border-s-8 bg-well p-3 text-ink", border, className)}
    >
      <p className={cx("flex items-start gap-2 font-semibold", colour)}>
        <Sign aria-hidden="true" className="mt-[0.15em] size-[1.2em] shrink-0" />
        <span>
          {says && <span className="sr-only">{says}</span>}
          {title}
        </span>
      </p>
      {children && <div className="grid gap-2">{children}</div>}
      {action && <div className="flex flex-wrap gap-2">{action}</div>}
    </div>
  );
}
