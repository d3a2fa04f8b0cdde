/**
 * Whether an error says that the database itself is spoilt, not that a question was a bad one. PostgreSQL tells by
 * the class of its code (appendix A of its manual): XX internal error and corruption, 58 system error (its files),
 * 57 the server going down. What has no code comes from under PostgreSQL: the program or its file system broke. A
 * DOMException comes from the browser's storage, while the journal is read: making the database anew would not help.
 */
export function isSpoilt(error: unknown): boolean {
  for (
    let at: unknown = error;
    typeof at === "object" && at !== null;
    at = (at as { cause?: unknown }).cause
  ) {
    if (at instanceof DOMException) return false;
    const { code } = at as { code?: unknown };
    // A file system's own codes (EBADF) are letters alone; each of PostgreSQL's has a digit.
    if (typeof code === "string" && /^(?=.*\d)[0-9A-Z]{5}$/.test(code)) return /^(XX|58|57)/.test(code);
  }
  return true;
}
