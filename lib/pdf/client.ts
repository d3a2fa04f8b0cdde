/** Printing as a screen asks for it. The worker is started for the first paper and let go when it has been idle. */
import { proxy, releaseProxy, type Remote, wrap } from "comlink";
import { type FullSizeJob } from "@/lib/pdf/full-size-document";
import { type MarksDocument } from "@/lib/pdf/marks-document";
import { type MarksPaper, type ReceiptPaper } from "@/lib/pdf/papers";
import { type OnProgress, type PdfApi, printProblem } from "@/lib/pdf/pdf-api";
import { type ReceiptDocument } from "@/lib/pdf/receipt-document";

const IDLE_MS = 60_000;

interface Running {
  readonly worker: Worker;
  readonly api: Remote<PdfApi>;
  /** Rejects when the worker dies: its answers would never come. */
  readonly died: Promise<never>;
}

let running: Running | undefined;
let calls = 0;
let idle: ReturnType<typeof setTimeout> | undefined;

function start(): Running {
  const worker = new Worker(new URL("../../worker/pdf.ts", import.meta.url));
  const died = new Promise<never>((_, reject) => {
    worker.addEventListener("error", () => {
      stop(worker);
      reject(
        printProblem(
          "The part of the app that prints could not start. Close the app, open it again, and try again.",
        ),
      );
    });
  });
  // Heard by whoever is waiting; nobody may be.
  died.catch(() => undefined);
  return { worker, api: wrap<PdfApi>(worker), died };
}

function stop(worker: Worker): void {
  worker.terminate();
  if (running?.worker === worker) running = undefined;
}

async function ask(work: (api: Remote<PdfApi>) => Promise<ArrayBuffer>): Promise<Blob> {
  clearTimeout(idle);
  running ??= start();
  const { worker, api, died } = running;
  calls++;
  try {
    return new Blob([await Promise.race([work(api), died])], { type: "application/pdf" });
  } finally {
    calls--;
    if (calls === 0)
      idle = setTimeout(() => {
        api[releaseProxy]();
        stop(worker);
      }, IDLE_MS);
  }
}

const told = (onProgress?: OnProgress) => onProgress && proxy(onProgress);

/** A receipt as a PDF. @throws Error; `sayPrintProblem` has the words for the user. */
export const makeReceipt = (
  doc: ReceiptDocument,
  paper: ReceiptPaper,
  onProgress?: OnProgress,
): Promise<Blob> => ask((api) => api.receipt(doc, paper, told(onProgress)));

/** A sheet of marks as a PDF. @throws Error; `sayPrintProblem` has the words for the user. */
export const makeMarks = (doc: MarksDocument, paper: MarksPaper, onProgress?: OnProgress): Promise<Blob> =>
  ask((api) => api.marks(doc, paper, told(onProgress)));

/** Patterns at full size as a PDF. @throws Error; `sayPrintProblem` has the words for the user. */
export const makeFullSize = (job: FullSizeJob, onProgress?: OnProgress): Promise<Blob> =>
  ask((api) => api.fullSize(job, told(onProgress)));
