import { type ReactNode } from "react";
import { ChevronLeft } from "lucide-react";
import { AppLink } from "@/components/ui/app-link";
import { cx } from "@/components/ui/cx";

export type ScreenProps = {
  /** The name of the screen: its h1. */
  title: ReactNode;
  /** A line below the name. */
  sub?: ReactNode;
  /** Where this screen was opened from. */
  back?: { href: string; label: string };
  /** The main action: one Button or ButtonLink, `variant="main" full`. At the thumb on a phone. */
  action?: ReactNode;
  /** Small actions at the end of the head. */
  tools?: ReactNode;
  /** The whole width, for two panes or a drawing. */
  wide?: boolean;
  children: ReactNode;
};

/** The frame of every screen. */
export function Screen({ title, sub, back, action, tools, wide, children }: ScreenProps) {
  return (
    <main id="main" tabIndex={-1} className={cx("screen", wide ? "max-w-wide" : "max-w-page")}>
      <header className="mb-4">
        {back && (
          <AppLink
            href={back.href}
            className="-ms-2 inline-flex min-h-target items-center gap-1 pe-3 font-semibold text-chalk no-underline hover:underline"
          >
            <ChevronLeft aria-hidden="true" className="size-6 shrink-0" />
            <span className="min-w-0 wrap-anywhere">{back.label}</span>
          </AppLink>
        )}
        <div className="flex flex-wrap items-end justify-between gap-x-4 gap-y-2">
          <div className="min-w-0 flex-1 basis-48">
            <h1 className="font-figure text-xl font-bold text-balance wrap-anywhere lg:text-2xl">{title}</h1>
            {sub && <p className="text-soft wrap-anywhere">{sub}</p>}
          </div>
          {tools && <div className="flex flex-wrap gap-2">{tools}</div>}
        </div>
      </header>
      <div className="grid flex-1 grid-cols-[minmax(0,1fr)] content-start gap-4">{children}</div>
      {action && <div className="screen-action">{action}</div>}
    </main>
  );
}

export type BesideProps = {
  list: ReactNode;
  /** What was chosen from the list; left out while nothing is. */
  detail?: ReactNode;
  /** On a wide screen, in place of the detail while nothing is chosen. */
  nothing?: ReactNode;
};

/** A list and what was chosen from it: side by side from 64rem, one at a time below. Put it in a wide Screen. */
export function Beside({ list, detail, nothing }: BesideProps) {
  const chosen = detail !== undefined && detail !== null && detail !== false;
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-6 lg:grid-cols-[minmax(0,22rem)_minmax(0,1fr)]">
      <div className={cx("grid content-start gap-4", chosen && "hidden lg:grid")}>{list}</div>
      <div className={cx("grid content-start gap-4", !chosen && "hidden lg:grid")}>
        {chosen ? detail : nothing}
      </div>
    </div>
  );
}
