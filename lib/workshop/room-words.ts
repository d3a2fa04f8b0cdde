/** Room on the phone in words: bytes as people count them. */
export function bytesWords(bytes: number): string {
  if (bytes < 1000) return "less than 1 kB";
  const units = ["kB", "MB", "GB", "TB"] as const;
  const step = Math.min(units.length, Math.floor(Math.log10(bytes) / 3));
  const size = bytes / 1000 ** step;
  return `${size < 10 ? Math.round(size * 10) / 10 : Math.round(size)} ${units[step - 1]}`;
}

/** `usage` and `quota` are what the browser reckons, in bytes; it may give neither. */
export function roomWords(usage: number | undefined, quota: number | undefined): string {
  if (usage === undefined || quota === undefined || quota === 0)
    return "This browser does not say how much room there is.";
  const left = Math.max(0, quota - usage);
  return `Notchbook takes ${bytesWords(usage)}; about ${bytesWords(left)} are left for it.`;
}

/** Less than this is worth saying: a few photos of another app fill it. */
const LITTLE_ROOM = 50_000_000;

export function isRoomShort(usage: number | undefined, quota: number | undefined): boolean {
  return usage !== undefined && quota !== undefined && quota > 0 && quota - usage < LITTLE_ROOM;
}
