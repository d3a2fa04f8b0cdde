/** The painter of the worker: text drawn on an OffscreenCanvas, with whatever fonts the phone has. */
import { directionOf } from "@/lib/pdf/text-runs";
import { type PaintedText, type TextBox, type TextPainter } from "@/lib/pdf/text-painter";

const DOTS_A_POINT = 600 / 72;
// Large letters are smooth with fewer dots, and a cheap phone has little memory.
const LARGEST_LETTER = 100;
const WIDEST_CANVAS = 8192;

/** `families` is a CSS list; the print fonts first, so that Latin words in an Arabic line look like the rest. */
export function canvasPainter(families: string): TextPainter {
  const measuring = new OffscreenCanvas(1, 1).getContext("2d");
  if (!measuring) throw new Error("This browser cannot draw text in the background.");

  const scaleOf = (sizePt: number) => Math.min(DOTS_A_POINT, LARGEST_LETTER / sizePt);
  const prepare = (
    context: OffscreenCanvasRenderingContext2D,
    text: string,
    sizePt: number,
    bold: boolean,
    scale: number,
  ) => {
    context.font = `${bold ? 700 : 400} ${sizePt * scale}px ${families}`;
    context.direction = directionOf(text);
    context.textAlign = "left";
    context.textBaseline = "alphabetic";
    context.fillStyle = "#000";
    return context.measureText(text);
  };
  const boxOf = (metrics: TextMetrics, scale: number): TextBox => {
    const above = Math.max(metrics.fontBoundingBoxAscent, metrics.actualBoundingBoxAscent);
    const below = Math.max(metrics.fontBoundingBoxDescent, metrics.actualBoundingBoxDescent);
    return {
      widthPt: metrics.width / scale,
      heightPt: (above + below) / scale,
      baselinePt: above / scale,
    };
  };

  return {
    measure(text, sizePt, bold) {
      const scale = scaleOf(sizePt);
      return boxOf(prepare(measuring, text, sizePt, bold, scale), scale);
    },
    async paint(text, sizePt, bold): Promise<PaintedText> {
      const wanted = scaleOf(sizePt);
      const natural = boxOf(prepare(measuring, text, sizePt, bold, wanted), wanted);
      const bleedPt = sizePt / 4;
      const scale = Math.min(wanted, WIDEST_CANVAS / (natural.widthPt + 2 * bleedPt));
      const width = Math.max(1, Math.ceil((natural.widthPt + 2 * bleedPt) * scale));
      const height = Math.max(1, Math.ceil(natural.heightPt * scale));
      const canvas = new OffscreenCanvas(width, height);
      const context = canvas.getContext("2d");
      if (!context) throw new Error("This phone has no memory left to draw the text.");
      prepare(context, text, sizePt, bold, scale);
      context.fillText(text, bleedPt * scale, natural.baselinePt * scale);
      const blob = await canvas.convertToBlob({ type: "image/png" });
      return {
        // The dots were rounded up; the picture is placed at the size they really have.
        widthPt: width / scale - 2 * bleedPt,
        heightPt: height / scale,
        baselinePt: natural.baselinePt,
        bleedPt,
        png: new Uint8Array(await blob.arrayBuffer()),
      };
    },
  };
}
