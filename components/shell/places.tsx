import { type ReactNode } from "react";

export type Place = { href: string; name: string; drawing: ReactNode };

const Drawing = ({ children }: { children: ReactNode }) => (
  <svg
    aria-hidden="true"
    viewBox="0 0 24 24"
    className="size-6 shrink-0"
    fill="none"
    stroke="currentColor"
    strokeWidth="1.75"
    strokeLinecap="round"
    strokeLinejoin="round"
  >
    {children}
  </svg>
);

/** The five places of the app, in the order of the bar. */
export const places: readonly Place[] = [
  {
    href: "/",
    name: "Today",
    // A threaded needle.
    drawing: (
      <Drawing>
        <path d="M3.5 20.5 15.6 8.4" />
        <ellipse cx="17.9" cy="6.1" rx="1.7" ry="3.3" transform="rotate(45 17.9 6.1)" />
        <path d="M17.9 6.1C15.5 1.8 9.5 2.6 9 6s-3.5 3.6-6 4.5" />
      </Drawing>
    ),
  },
  {
    href: "/clients",
    name: "Clients",
    // A dress stand.
    drawing: (
      <Drawing>
        <path d="M10 2.5h4M12 2.5V4M9 4.5h6c.3 1.6 1.8 2.4 3 3-.6 2.4-2 3.8-2 5.5s.9 2.5 1 3.5H7c.1-1 1-1.8 1-3.5S6.6 9.9 6 7.5c1.2-.6 2.7-1.4 3-3z" />
        <path d="M12 16.5v5M8.5 21.5h7" />
      </Drawing>
    ),
  },
  {
    href: "/sleeves",
    name: "Sleeves",
    // A sleeve as drafted: head, biceps line, grain.
    drawing: (
      <Drawing>
        <path d="M2.5 12C7 12 7.5 4 12 4s5 8 9.5 8l-3 8.5h-13z" />
        <path d="M12 8v8.5m-1.7-1.7 1.7 1.7 1.7-1.7" />
      </Drawing>
    ),
  },
  {
    href: "/orders",
    name: "Orders",
    // A card with a notched head.
    drawing: (
      <Drawing>
        <path d="M4 3.5h5.5l2.5 3 2.5-3H20v17H4z" />
        <path d="M7.5 11h9M7.5 15.5h5.5" />
      </Drawing>
    ),
  },
  {
    href: "/settings",
    name: "Workshop",
    // A thimble.
    drawing: (
      <Drawing>
        <path d="M5 20.5 7 8.5C7.4 5.5 9.5 3.5 12 3.5s4.6 2 5 5l2 12z" />
        <path d="M5.7 16.5h12.6" />
        <path d="M10.5 7.5h.01M13.5 7.5h.01M9.5 10.5h.01M12 10.5h.01M14.5 10.5h.01M10.5 13.3h.01M13.5 13.3h.01" />
      </Drawing>
    ),
  },
];

/** The place a path belongs to: the one it is, or lies below; wearers and measuring belong to the clients, sums to the sleeves, the bin to the workshop. */
export const placeOf = (path: string): string => {
  if (/^\/(measure|wearers)(\/|$)/.test(path)) return "/clients";
  if (/^\/sums(\/|$)/.test(path)) return "/sleeves";
  if (path === "/bin") return "/settings";
  const below = places.find(({ href }) => href !== "/" && (path === href || path.startsWith(`${href}/`)));
  return below?.href ?? (path === "/" ? "/" : "");
};
