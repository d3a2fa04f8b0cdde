/** Why the phone could not keep something, in words for its owner. */
export class KeepProblem extends Error {
  constructor(
    message: string,
    override readonly cause: unknown,
  ) {
    super(message);
    this.name = "KeepProblem";
  }
}

/** Reads a browser's error while writing to the journal. */
export function keepProblem(error: unknown): KeepProblem {
  if (error instanceof KeepProblem) return error;
  const name = error instanceof DOMException || error instanceof Error ? error.name : "";
  if (name === "QuotaExceededError")
    return new KeepProblem(
      "Not kept: this phone has no room left. What you typed still stands here. Delete photos or apps that you do not need, then press again.",
      error,
    );
  if (name === "BookReplaced")
    return new KeepProblem(
      "Not kept: in another window the book was cleared or another one was read in. Note down what you typed, then open Notchbook again.",
      error,
    );
  if (name === "InvalidStateError" || name === "SecurityError" || name === "NotAllowedError")
    return new KeepProblem(
      "Not kept: the browser does not let Notchbook write to this phone. A private window keeps nothing; open Notchbook in an ordinary one, then press again.",
      error,
    );
  return new KeepProblem(
    "Not kept: the phone's storage did not answer. What you typed still stands here. Press again; if it fails again, save a copy under Workshop and restart the phone.",
    error,
  );
}

/** Why the browser gives no storage at all, in words. */
export function storageProblem(error: unknown): string {
  const name = error instanceof DOMException || error instanceof Error ? error.name : "";
  if (name === "QuotaExceededError")
    return "The phone has no room left. Delete photos or apps that you do not need, then try again.";
  if (name === "InvalidStateError" || name === "SecurityError" || name === "NotAllowedError")
    return "A private window keeps nothing: open Notchbook in an ordinary one. If this is one, allow this site in the browser’s settings to keep data, then try again.";
  return "The phone’s storage does not answer. Close other windows of the browser or restart the phone, then try again.";
}
