import { CloudOff, LoaderCircle } from "lucide-react";
import { AppLink } from "@/components/ui/app-link";

export type KeptLineProps = {
  /** What is kept, and what waits. */
  said: string;
  /** The phone is still at work on it. */
  working: boolean;
  /** Where more about it stands. */
  href: string;
};

/** The line at the top of every screen: what is kept, and what no copy has yet. */
export function KeptLine({ said, working, href }: KeptLineProps) {
  const Sign = working ? LoaderCircle : CloudOff;
  return (
    <p role="status" className="kept-line">
      {/* The line is small; what can be touched reaches beyond it. */}
      <AppLink
        href={href}
        className="relative flex items-center gap-2 text-soft no-underline after:absolute after:-inset-x-2 after:-inset-y-2.5 hover:underline"
      >
        <Sign aria-hidden="true" className="size-4 shrink-0" />
        <span>{said}</span>
      </AppLink>
    </p>
  );
}
