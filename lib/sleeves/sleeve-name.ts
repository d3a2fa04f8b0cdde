/** A name for a sleeve that was given none: "Ama's sleeve, 3 Mar 2026", or "Sleeve, 3 Mar 2026". */
export function suggestedName(wearerName: string | null, day: string): string {
  const name = wearerName?.trim();
  if (!name) return `Sleeve, ${day}`;
  return `${name}${/s$/iu.test(name) ? "’" : "’s"} sleeve, ${day}`;
}
