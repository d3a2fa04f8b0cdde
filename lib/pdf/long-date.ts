/** An ISO date as a reader writes it, "1 December 2025"; what is no ISO date stays as it is. */
export function longDate(iso: string, lang: string): string {
  const date = /^\d{4}-\d{2}-\d{2}$/.test(iso) ? new Date(`${iso}T00:00:00Z`) : null;
  if (!date || Number.isNaN(date.getTime())) return iso;
  let format: Intl.DateTimeFormat;
  try {
    format = new Intl.DateTimeFormat(lang, { dateStyle: "long", timeZone: "UTC" });
  } catch {
    // A language tag that is none.
    format = new Intl.DateTimeFormat("en-GB", { dateStyle: "long", timeZone: "UTC" });
  }
  return format.format(date);
}
