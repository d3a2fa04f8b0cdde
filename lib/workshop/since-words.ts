/**
 * When something was, for the eye: "14:20" of today, "yesterday", a weekday of the last six days, else the day. Both
 * moments are read on the phone's own clock.
 */
export function sinceWords(at: Date, now: Date, locale = "en-GB"): string {
  const midnight = (moment: Date) => new Date(moment.getFullYear(), moment.getMonth(), moment.getDate());
  const days = Math.round((midnight(now).getTime() - midnight(at).getTime()) / 86_400_000);
  const words = (options: Intl.DateTimeFormatOptions) => new Intl.DateTimeFormat(locale, options).format(at);
  if (days === 0) return words({ hour: "2-digit", minute: "2-digit" });
  if (days === 1) return "yesterday";
  if (days > 1 && days < 7) return words({ weekday: "long" });
  return words({
    day: "numeric",
    month: "long",
    ...(at.getFullYear() !== now.getFullYear() && { year: "numeric" }),
  });
}
