import { type ComponentProps, type ReactNode } from "react";
import { ChevronRight } from "lucide-react";
import { AppLink } from "@/components/ui/app-link";
import { cx } from "@/components/ui/cx";

export type CardProps = ComponentProps<"section"> & {
  /** Notches cut into the head: one for a front, two for a back, none for a plain card. Default 1. */
  notches?: 0 | 1 | 2;
  /** No room inside, for a card of rows. */
  flush?: boolean;
};

/** A manila card with a notched head. Give it a CardHead, or an `aria-label`. */
export function Card({ notches = 1, flush, className, children, ...rest }: CardProps) {
  return (
    <section {...rest} className={cx("card", flush ? "pt-5" : "p-4 pt-6", className)}>
      {notches > 0 && (
        <svg
          aria-hidden="true"
          viewBox={notches === 1 ? "0 0 22 13" : "0 0 44 13"}
          className={cx("card-notch", notches === 1 ? "w-[1.375rem]" : "w-[2.75rem]")}
        >
          <path stroke="none" d={notches === 1 ? "M0-1h22L11 12z" : "M0-1h22L11 12zM22-1h22L33 12z"} />
          <path fill="none" d={notches === 1 ? "M0 1h1l10 11L21 1h1" : "M0 1h1l10 11L21 1h2l10 11L43 1h1"} />
        </svg>
      )}
      {children}
    </section>
  );
}

export type CardHeadProps = {
  title: ReactNode;
  /** A line below the title. */
  sub?: ReactNode;
  /** The figure, or an action, at the end of the head. */
  end?: ReactNode;
  /** Heading level in the page. Default 2. */
  level?: 2 | 3;
  id?: string;
  className?: string;
};

/** The head of a card: its name, and at the end its figure. */
export function CardHead({ title, sub, end, level = 2, id, className }: CardHeadProps) {
  const Heading = `h${level}` as const;
  return (
    <header className={cx("mb-3 flex flex-wrap items-start justify-between gap-x-4 gap-y-1", className)}>
      <div className="min-w-0 flex-1 basis-40">
        <Heading id={id} className="font-figure text-lg font-bold wrap-anywhere">
          {title}
        </Heading>
        {sub && <p className="text-soft">{sub}</p>}
      </div>
      {end && <div className="min-w-0">{end}</div>}
    </header>
  );
}

/** A list of rows inside a flush card, ruled apart. */
export function Rows({ className, ...rest }: ComponentProps<"ul">) {
  return <ul {...rest} className={cx("rows", className)} />;
}

type RowSaid = {
  /** The main text. */
  title: ReactNode;
  /** The second line. */
  sub?: ReactNode;
  /** The figure at the end. */
  figure?: ReactNode;
  /** A small drawing or a notch before the text. */
  sign?: ReactNode;
};

function RowBody({ title, sub, figure, sign }: RowSaid) {
  return (
    <>
      {sign && <span className="flex w-6 shrink-0 justify-center">{sign}</span>}
      <span className="flex min-w-0 flex-1 flex-wrap items-center justify-between gap-x-3 gap-y-1">
        <span className="min-w-0 flex-1 basis-32">
          <span className="block font-semibold wrap-anywhere">{title}</span>
          {sub && <span className="block text-sm text-soft">{sub}</span>}
        </span>
        {figure !== undefined && <span className="figures ms-auto text-lg font-semibold">{figure}</span>}
      </span>
    </>
  );
}

/** A row that only tells. `children` stand below its text, for example buttons. */
export function Row({ children, ...said }: RowSaid & { children?: ReactNode }) {
  return (
    <li>
      <div className="row">
        <RowBody {...said} />
      </div>
      {children && <div className="px-4 pb-3">{children}</div>}
    </li>
  );
}

export type RowLinkProps = RowSaid & {
  href: string;
  /** The row whose detail stands beside the list. */
  chosen?: boolean;
};

/** A row that opens something. */
export function RowLink({ href, chosen, ...said }: RowLinkProps) {
  return (
    <li>
      <AppLink href={href} className="row row-link" aria-current={chosen ? "true" : undefined}>
        <RowBody {...said} />
        <ChevronRight aria-hidden="true" className="size-5 shrink-0 text-soft" />
      </AppLink>
    </li>
  );
}

export type RowButtonProps = RowSaid & { onPress: () => void; chosen?: boolean };

/** A row that does something on this screen. */
export function RowButton({ onPress, chosen, ...said }: RowButtonProps) {
  return (
    <li>
      <button
        type="button"
        onClick={onPress}
        className="row row-link w-full text-start"
        aria-current={chosen ? "true" : undefined}
      >
        <RowBody {...said} />
      </button>
    </li>
  );
}
