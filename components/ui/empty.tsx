import { type ReactNode } from "react";

export type EmptyProps = {
  /** What goes here, in a sentence or two. */
  say: ReactNode;
  /** The first step: a Button or ButtonLink. */
  action?: ReactNode;
};

/** A screen or a list with nothing in it yet. */
export function Empty({ say, action }: EmptyProps) {
  return (
    <div className="grid justify-items-center gap-4 rounded border-2 border-dashed border-edge px-4 py-8 text-center">
      <svg
        aria-hidden="true"
        viewBox="0 0 96 64"
        className="h-16 w-auto text-chalk"
        fill="none"
        stroke="currentColor"
        strokeWidth="2"
        strokeLinecap="round"
      >
        <path d="M6 44C22 44 26 10 48 10s26 34 42 34l-8 16H14z" strokeDasharray="5 4" />
        <path d="M48 18v36m-4-30 4-6 4 6m-8 24 4 6 4-6" strokeWidth="1.5" />
        <path d="m27 27 5 3m36-6-5 3m7 1-5 3" />
      </svg>
      <div className="max-w-[32rem] text-balance">{say}</div>
      {action && <div className="flex flex-wrap justify-center gap-2">{action}</div>}
    </div>
  );
}
