/** What the printing worker does for a tab. */
import { type FullSizeJob } from "@/lib/pdf/full-size-document";
import { type MarksDocument } from "@/lib/pdf/marks-document";
import { type MarksPaper, type ReceiptPaper } from "@/lib/pdf/papers";
import { type ReceiptDocument } from "@/lib/pdf/receipt-document";

export type OnProgress = (done: number, of: number) => void;

export interface PdfApi {
  receipt(doc: ReceiptDocument, paper: ReceiptPaper, onProgress?: OnProgress): Promise<ArrayBuffer>;
  marks(doc: MarksDocument, paper: MarksPaper, onProgress?: OnProgress): Promise<ArrayBuffer>;
  fullSize(job: FullSizeJob, onProgress?: OnProgress): Promise<ArrayBuffer>;
}

/** Errors with this name carry a sentence for the user. A class would not survive the way between threads. */
export const PRINT_PROBLEM = "PrintProblem";

export function printProblem(say: string): Error {
  const problem = new Error(say);
  problem.name = PRINT_PROBLEM;
  return problem;
}

/** What to tell the user about an error of printing. */
export const sayPrintProblem = (error: unknown): string =>
  error instanceof Error && error.name === PRINT_PROBLEM
    ? error.message
    : "The paper could not be made. Nothing of your work is lost. Close other apps to free memory, and try again.";
