/** Deals blocks out to pages. */
import { type Block } from "@/lib/pdf/blocks";

/** Blocks that stay on one page where a page is long enough for them. */
export interface Group {
  readonly parts: readonly Block[];
  /** Space above, not wanted at the head of a page. */
  readonly gap?: number;
  /** Set again above this group where it opens a page: the head of a table that goes on. */
  readonly repeat?: Block;
}

export interface PlacedBlock {
  /** From the top of the page's body. */
  readonly y: number;
  readonly block: Block;
}

export interface DealtPage {
  readonly blocks: readonly PlacedBlock[];
  /** How far down the last block reaches. */
  readonly height: number;
}

const heightOf = (blocks: readonly Block[]): number => blocks.reduce((sum, { height }) => sum + height, 0);
// Sums of the same heights in another order differ in the last digits.
const SLACK = 1e-6;

/**
 * `room(page)` is the height of a page's body, page 0 first. A group that no page can hold is cut between its
 * parts; a part that no page can hold stands out at the foot of its own page, so parts must be lines, not texts.
 */
export function paginate(groups: readonly Group[], room: (page: number) => number): DealtPage[] {
  const pages: PlacedBlock[][] = [[]];
  let y = 0;
  const fits = (height: number) => y + height <= room(pages.length - 1) + SLACK;
  const place = (block: Block) => {
    pages.at(-1)!.push({ y, block });
    y += block.height;
  };
  const turn = (repeat?: Block) => {
    pages.push([]);
    y = 0;
    if (repeat) place(repeat);
  };
  for (const { parts, gap = 0, repeat } of groups) {
    const height = heightOf(parts);
    const atHead = pages.at(-1)!.length === 0;
    if (atHead || fits(gap + height)) y += atHead ? 0 : gap;
    else {
      const wholeOnNext = (repeat?.height ?? 0) + height <= room(pages.length) + SLACK;
      if (wholeOnNext || !fits(gap + (parts[0]?.height ?? 0))) turn(repeat);
      else y += gap;
    }
    for (const part of parts) {
      if (!fits(part.height) && pages.at(-1)!.length > 0) turn(repeat);
      place(part);
    }
  }
  return pages.map((blocks) => {
    const last = blocks.at(-1);
    return { blocks, height: last ? last.y + last.block.height : 0 };
  });
}
