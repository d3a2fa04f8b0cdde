/** Makes papers off the main thread, where a long one would freeze the screen. */
import { expose, transfer } from "comlink";
import { canvasPainter } from "@/lib/pdf/canvas-painter";
import { fullSizePdf } from "@/lib/pdf/full-size";
import { marksPdf } from "@/lib/pdf/marks";
import { type OnProgress, type PdfApi, printProblem } from "@/lib/pdf/pdf-api";
import { readPrintFonts } from "@/lib/pdf/print-fonts";
import { receiptPdf } from "@/lib/pdf/receipt";
import { type PrintTools } from "@/lib/pdf/write-pdf";

const FAMILY = "Notchbook print";
// Without the space: a font that has it is the one whose sign for a missing letter is drawn, and this one's is
// blank. A name in a script the phone has no font for must come out as boxes, not as nothing.
const RANGE = "U+21-7E, U+A1-24F, U+370-52F, U+1E00-1FFF, U+2010-2027, U+2030-2212";
// Every message wakes the main thread: some forty steps are enough to see how far it is.
const STEPS_TOLD = 40;

async function fetchFont(name: string): Promise<ArrayBuffer> {
  try {
    const response = await fetch(`/fonts/${name}`);
    if (response.ok) return await response.arrayBuffer();
  } catch {
    // Offline, and not kept by the service worker yet.
  }
  throw printProblem(
    "The letters for printing are not on this phone yet. Connect to the internet, open the app once, and try again.",
  );
}

/** Latin words in a line drawn as a picture then look like the rest; without it, the phone's own letters do. */
async function offerToCanvas(file: ArrayBuffer, weight: "400" | "700"): Promise<void> {
  const { fonts } = self as unknown as WorkerGlobalScope;
  if (typeof FontFace === "undefined" || !fonts) return;
  fonts.add(await new FontFace(FAMILY, file, { weight, unicodeRange: RANGE }).load());
}

async function openTools(): Promise<Pick<PrintTools, "fonts" | "painter">> {
  const [regular, bold] = await Promise.all([fetchFont("print-regular.ttf"), fetchFont("print-bold.ttf")]);
  await Promise.all([offerToCanvas(regular, "400"), offerToCanvas(bold, "700")]).catch((error: unknown) =>
    console.warn("Pictures of text are drawn in the phone's own letters.", error),
  );
  return {
    fonts: readPrintFonts(regular, bold),
    painter: canvasPainter(`"${FAMILY}", system-ui, sans-serif`),
  };
}

let opened: ReturnType<typeof openTools> | undefined;

async function tools(onProgress?: OnProgress): Promise<PrintTools> {
  opened ??= openTools();
  try {
    return { ...(await opened), onProgress: onProgress && sparingly(onProgress) };
  } catch (error) {
    opened = undefined;
    throw error;
  }
}

function sparingly(tell: OnProgress): OnProgress {
  let told = -1;
  return (done, of) => {
    const step = Math.floor((done / of) * STEPS_TOLD);
    if (step === told) return;
    told = step;
    tell(done, of);
  };
}

const handOver = (file: ArrayBuffer): ArrayBuffer => transfer(file, [file]);

const api: PdfApi = {
  receipt: async (doc, paper, onProgress) => handOver(await receiptPdf(doc, paper, await tools(onProgress))),
  marks: async (doc, paper, onProgress) => handOver(await marksPdf(doc, paper, await tools(onProgress))),
  fullSize: async (job, onProgress) => handOver(await fullSizePdf(job, await tools(onProgress))),
};

expose(api);
