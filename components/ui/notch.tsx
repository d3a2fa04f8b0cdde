import { cx } from "@/components/ui/cx";

const spoken = { 1: "one notch, front", 2: "two notches, back" } as const;

export type NotchProps = {
  /** One marks the front of a pattern, two the back. Default 1. */
  count?: 1 | 2;
  /** What a screen reader says; "" when the words beside it say it already. Default "one notch, front" or "two notches, back". */
  label?: string;
  className?: string;
};

/** The small triangle cut into an edge, as a sign in a line of text; its height follows the text. */
export function Notch({ count = 1, label = spoken[count], className }: NotchProps) {
  const width = count === 1 ? 12 : 26;
  return (
    <svg
      viewBox={`0 0 ${width} 10`}
      className={cx("inline-block h-[0.65em] w-auto shrink-0 fill-current", className)}
      {...(label ? { role: "img", "aria-label": label } : { "aria-hidden": true })}
    >
      <path d={count === 1 ? "M0 0h12L6 10z" : "M0 0h12L6 10zM14 0h12l-6 10z"} />
    </svg>
  );
}
