/** Parts that more than one document is made of. */
import { type Block, type Line, moved, overlay, row, stack } from "@/lib/pdf/blocks";
import { notch } from "@/lib/pdf/signs";
import { type TextStyle, type Typesetter } from "@/lib/pdf/typesetter";

export const present = (lines: readonly string[]): string[] => lines.filter((line) => line.trim() !== "");

/** All texts in one column, one below the other. */
export const textLines = (
  set: Typesetter,
  texts: readonly string[],
  style: TextStyle,
  width: number,
  x = 0,
): Line[] => present(texts).flatMap((text) => set.lines(text, style, { x, width }));

/** Words on the left, a figure on the right of the same line; each wraps in its own part of the width. */
export function pair(
  set: Typesetter,
  [left, leftStyle]: readonly [string, TextStyle],
  [right, rightStyle]: readonly [string, TextStyle],
  width: number,
): Block[] {
  const gap = leftStyle.size;
  const wanted = set.width(right, rightStyle);
  const rightWidth = Math.min(
    wanted,
    Math.max((width - gap) * 0.55, width - gap - set.width(left, leftStyle)),
  );
  return row([
    set.lines(left, leftStyle, { x: 0, width: width - rightWidth - gap }),
    set.lines(right, rightStyle, { x: width - rightWidth, width: rightWidth, align: "right" }),
  ]);
}

/** A sentence with a notch before it. */
export function notched(set: Typesetter, text: string, style: TextStyle, width: number): Block[] {
  const indent = style.size * 1.1;
  const lines = set.lines(text, style, { x: indent, width: width - indent });
  return lines.map((line, i) =>
    i > 0
      ? line
      : {
          ...line,
          items: [
            notch(style.size * 0.36, line.baseline - style.size * 0.52, style.size / 14),
            ...line.items,
          ],
        },
  );
}

/** The largest of the sizes at which the text stands on one line; the last where none does. */
export const fittingSize = (
  set: Typesetter,
  text: string,
  bold: boolean,
  sizes: readonly number[],
  width: number,
) => sizes.find((size) => set.width(text, { size, bold }) <= width) ?? sizes.at(-1)!;

/** Two columns whose first lines stand on one baseline; below that each keeps its own pace. */
export function abreast(left: readonly Line[], right: readonly Line[]): Block {
  const baseline = Math.max(left[0]?.baseline ?? 0, right[0]?.baseline ?? 0);
  const hung = (lines: readonly Line[]) => moved(stack(lines), 0, baseline - (lines[0]?.baseline ?? 0));
  return overlay(hung(left), hung(right));
}
