/** Puts groups on paper: sheets with a head from the second page on and a foot, or one page as long as a roll needs. */
import { type Block, type Item, moved, shiftAll } from "@/lib/pdf/blocks";
import { type Group, paginate } from "@/lib/pdf/paginate";
import { LONGEST_PAGE, type Paper } from "@/lib/pdf/papers";

export interface ComposedPage {
  readonly width: number;
  readonly height: number;
  readonly items: readonly Item[];
}

export interface Furniture {
  /** From the second page on. Pages count from 1; its height must not depend on them. */
  readonly head: (page: number, of: number) => Block;
  /** Where there is more than one page. */
  readonly foot: (page: number, of: number) => Block;
}

/** Blocks are measured from the left margin. */
export function compose(groups: readonly Group[], paper: Paper, { head, foot }: Furniture): ComposedPage[] {
  const { margin, width } = paper;
  const isRoll = paper.height === undefined;
  const bodyOf = (paper.height ?? LONGEST_PAGE) - margin.top - margin.bottom;
  const headHeight = head(2, 2).height;
  const footHeight = isRoll ? 0 : foot(2, 2).height;
  const alone = paginate(groups, () => bodyOf);
  const dealt =
    alone.length === 1
      ? alone
      : paginate(groups, (page) => bodyOf - footHeight - (page > 0 ? headHeight : 0));
  return dealt.map(({ blocks, height: used }, index) => {
    const below = index > 0 ? headHeight : 0;
    const height = paper.height ?? margin.top + below + used + margin.bottom;
    const furniture: Block[] = [];
    if (index > 0) furniture.push(head(index + 1, dealt.length));
    if (!isRoll && dealt.length > 1)
      furniture.push(moved(foot(index + 1, dealt.length), 0, bodyOf - footHeight));
    const items = [
      ...furniture.flatMap((block) => block.items),
      ...blocks.flatMap(({ y, block }) => shiftAll(block.items, 0, below + y)),
    ];
    return { width, height, items: shiftAll(items, margin.left, margin.top) };
  });
}
