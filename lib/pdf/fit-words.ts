/** Words set as large as a box allows. */
import { type Block, type Item, shiftAll, space, stack } from "@/lib/pdf/blocks";
import { type Rect } from "@/lib/pdf/bezier-clip";
import { type Said } from "@/lib/pdf/full-size-labels";
import { notched } from "@/lib/pdf/parts";
import { type Align, type Typesetter } from "@/lib/pdf/typesetter";

const SMALLER = 0.94;
const SMALLEST = 0.3;
/** From here on a word may be broken between letters rather than made smaller yet. */
const BREAKABLE = 0.6;

/** `box` in points. In the middle of it where `align` says so, else from its upper left corner. */
export function fitted(set: Typesetter, said: readonly Said[], box: Rect, align: Align): Item[] {
  let scale = 1;
  let block = setAt(set, said, scale, box.w, align);
  while (
    scale > SMALLEST &&
    (block.height > box.h || (scale > BREAKABLE && breaks(set, said, scale, box.w)))
  ) {
    scale *= SMALLER;
    block = setAt(set, said, scale, box.w, align);
  }
  return shiftAll(block.items, box.x, box.y + (align === "centre" ? (box.h - block.height) / 2 : 0));
}

function setAt(set: Typesetter, said: readonly Said[], scale: number, width: number, align: Align): Block {
  return stack(
    said.flatMap((one, i) => {
      const style = { size: one.size * scale, bold: one.bold };
      const lines = one.notched
        ? notched(set, one.words, style, width)
        : set.lines(one.words, style, { x: 0, width, align });
      return [...(i > 0 ? [space(style.size * 0.12)] : []), ...lines];
    }),
  );
}

const breaks = (set: Typesetter, said: readonly Said[], scale: number, width: number): boolean =>
  said.some(({ words, size, bold }) =>
    words.split(/\s+/u).some((word) => set.width(word, { size: size * scale, bold }) > width),
  );
