/**
 * Whether an error says that the database itself is spoilt, not that a question was a bad one. PostgreSQL tells by
 * the class of its code (appendix A of its manual): XX internal error and corruption, 58 system error (its files),
 * 57 the server going down. What has no code comes from under PostgreSQL: the program or its file system broke.
 */
export function isSpoilt(error: unknown): boolean {
  for (
    let at: unknown = error;
    typeof at === "object" && at !== null;
    at = (at as { cause?: unknown }).cause
  ) {
    const { code } = at as { code?: unknown };
    if (typeof code === "string" && /^[0-9A-Z]{5}$/.test(code)) return /^(XX|58|57)/.test(code);
  }
  return true;
}
