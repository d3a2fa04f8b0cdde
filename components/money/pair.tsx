import { type ReactNode } from "react";
import { cx } from "@/components/ui/cx";

/** What an amount is, and the amount at the end of the line; below it where the line is too short. In a `dl`. */
export function Pair({
  value,
  className,
  children,
}: {
  value: ReactNode;
  className?: string;
  children: ReactNode;
}) {
  return (
    <div className={cx("flex flex-wrap items-end justify-between gap-x-4 py-1", className)}>
      <dt className="min-w-0 flex-1 basis-32">{children}</dt>
      <dd className="figures ms-auto whitespace-nowrap">{value}</dd>
    </div>
  );
}
