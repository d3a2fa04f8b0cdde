import { type ComponentProps, type ReactNode } from "react";
import { AppLink, type AppLinkProps } from "@/components/ui/app-link";
import { cx } from "@/components/ui/cx";

/** `main` is the one thing to do next: at most one on a screen. */
export type ButtonVariant = "main" | "plain" | "quiet" | "danger";

type Look = {
  /** Default "plain". */
  variant?: ButtonVariant;
  /** A small drawing before the words; it is hidden from screen readers. */
  icon?: ReactNode;
  /** As wide as its container. */
  full?: boolean;
};

const base =
  "inline-flex min-h-target items-center justify-center gap-2 rounded px-4 py-2 text-center font-semibold " +
  "select-none touch-manipulation no-underline active:translate-y-px motion-reduce:active:translate-y-0 " +
  "disabled:cursor-not-allowed disabled:border-dashed aria-disabled:cursor-progress";

const looks: Record<ButtonVariant, string> = {
  main: "min-h-key border-2 border-ink bg-ink text-lg text-onink disabled:bg-transparent disabled:text-soft",
  plain: "border-2 border-edge bg-well text-ink hover:border-ink disabled:bg-transparent disabled:text-soft",
  quiet:
    "border-2 border-transparent bg-transparent text-chalk underline decoration-2 underline-offset-4 hover:border-line disabled:text-soft",
  danger: "border-2 border-pin bg-pin text-onpin disabled:bg-transparent disabled:text-pin",
};

const classes = ({ variant = "plain", full }: Look, className?: string) =>
  cx(base, looks[variant], full && "w-full", className);

const Drawing = ({ children }: { children: ReactNode }) => (
  <span aria-hidden="true" className="inline-flex shrink-0">
    {children}
  </span>
);

export type ButtonProps = ComponentProps<"button"> &
  Look & {
    /** While true it says so, keeps the focus, and a second tap does nothing. */
    busy?: boolean;
  };

/** A button; `type` is "button" unless told, so that none sends a form by accident. */
export function Button({
  variant,
  icon,
  full,
  busy = false,
  className,
  children,
  onClick,
  type = "button",
  ...rest
}: ButtonProps) {
  return (
    <button
      {...rest}
      type={type}
      className={classes({ variant, full }, className)}
      aria-busy={busy || undefined}
      aria-disabled={busy || undefined}
      onClick={busy ? (event) => event.preventDefault() : onClick}
    >
      {busy ? <span aria-hidden="true" className="stitching" /> : icon && <Drawing>{icon}</Drawing>}
      {children}
    </button>
  );
}

export type ButtonLinkProps = AppLinkProps & Look;

/** A link to another screen that looks like a button. */
export function ButtonLink({ variant, icon, full, className, children, ...rest }: ButtonLinkProps) {
  return (
    <AppLink {...rest} className={classes({ variant, full }, className)}>
      {icon && <Drawing>{icon}</Drawing>}
      {children}
    </AppLink>
  );
}
