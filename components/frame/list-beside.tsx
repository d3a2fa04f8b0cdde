"use client";

import { usePathname } from "next/navigation";
import { type ReactNode, Suspense, useSyncExternalStore } from "react";

/** Where Tailwind's `lg` begins. */
const WIDE = "(min-width: 64rem)";

function subscribeWide(listener: () => void): () => void {
  const media = window.matchMedia(WIDE);
  media.addEventListener("change", listener);
  return () => media.removeEventListener("change", listener);
}

export interface ListBesideProps {
  /** The list's own screen; there it is the screen itself. */
  href: string;
  title: string;
  action: ReactNode;
  list: ReactNode;
  children: ReactNode;
}

/** On a wide screen the list stays beside what was chosen from it; a phone never draws it there. */
export function ListBeside({ href, title, action, list, children }: ListBesideProps) {
  const path = usePathname();
  const wide = useSyncExternalStore(
    subscribeWide,
    () => window.matchMedia(WIDE).matches,
    () => false,
  );
  if (path === href) return children;
  return (
    <div className="lg:grid lg:grid-cols-[minmax(0,24.25rem)_minmax(0,1fr)]">
      <aside
        aria-labelledby="list-beside"
        className="hidden lg:sticky lg:top-0 lg:block lg:max-h-dvh lg:self-start lg:overflow-y-auto lg:py-2 lg:ps-8 lg:pe-1"
      >
        {wide && (
          <>
            <div className="mb-4 flex items-center justify-between gap-2">
              <h2 id="list-beside" className="font-figure text-2xl font-bold">
                {title}
              </h2>
              {action}
            </div>
            <div className="grid grid-cols-[minmax(0,1fr)] gap-4 pb-4">
              <Suspense>{list}</Suspense>
            </div>
          </>
        )}
      </aside>
      <div className="min-w-0">{children}</div>
    </div>
  );
}
