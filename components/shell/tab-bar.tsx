"use client";

import { usePathname } from "next/navigation";
import { AppLink } from "@/components/ui/app-link";
import { placeOf, places } from "@/components/shell/places";

/** The places of the app: along the bottom of a phone, down the side of a wide screen; a notch marks the chosen one. */
export function TabBar() {
  const path = usePathname();
  const here = placeOf(path);
  return (
    <nav aria-label="Places" className="tab-bar">
      <ul>
        {places.map(({ href, name, drawing }) => {
          const chosen = href === here;
          return (
            <li key={href}>
              <AppLink
                href={href}
                className="tab"
                aria-current={path === href ? "page" : chosen ? "true" : undefined}
              >
                {chosen && (
                  <svg aria-hidden="true" viewBox="0 0 30 17" className="tab-notch">
                    <path stroke="none" d="M1-1h28L15 15z" />
                    <path fill="none" d="M0 1h2l13 13L28 1h2" />
                  </svg>
                )}
                {drawing}
                <span>{name}</span>
              </AppLink>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}
