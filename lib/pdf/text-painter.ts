/** How the browser's own text engine is asked to draw what jsPDF cannot set. */

export interface TextBox {
  /** How far the text moves the pen. */
  readonly widthPt: number;
  readonly heightPt: number;
  /** From the top of the box down to the baseline. */
  readonly baselinePt: number;
}

export interface PaintedText extends TextBox {
  /** Ink may stand out of the advance: the picture is this much wider on the left and on the right. */
  readonly bleedPt: number;
  /** Black on transparent. */
  readonly png: Uint8Array;
}

export interface TextPainter {
  measure(text: string, sizePt: number, bold: boolean): TextBox;
  paint(text: string, sizePt: number, bold: boolean): Promise<PaintedText>;
}
