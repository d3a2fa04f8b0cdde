import { type ReactNode } from "react";

export type ProgressProps = {
  /** What is being done. */
  label: string;
  /** How much of it is done; left out while that is not known. */
  value?: number;
  /** How much there is in all. Default 100, shown as a percentage; else as "3 of 12". */
  max?: number;
  /** To stop it, or the like. */
  action?: ReactNode;
};

/** How far a longer piece of work is, drawn as a tape pulled out. */
export function Progress({ label, value, max = 100, action }: ProgressProps) {
  const known = value !== undefined && max > 0;
  const part = known ? Math.min(1, Math.max(0, value / max)) : 0;
  const said = !known ? "" : max === 100 ? `${Math.round(part * 100)} %` : `${value} of ${max}`;
  return (
    <div className="grid gap-1.5">
      <div className="flex flex-wrap justify-between gap-x-4" aria-hidden="true">
        <span className="font-semibold">{label}</span>
        <span className="figures">{said}</span>
      </div>
      <div
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={max}
        aria-valuenow={known ? value : undefined}
        aria-valuetext={said || undefined}
        className="progress-tape"
      >
        <div
          className={known ? "progress-done" : "progress-unknown"}
          style={known ? { width: `${part * 100}%` } : undefined}
        />
      </div>
      {action}
    </div>
  );
}
