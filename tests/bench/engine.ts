/** The drafting engine alone, in Node: what one redraft costs. */
import { makeSleeve, makeStyle, recipes, type SleeveAsk } from "@/lib/drafting";
import { type Measured, spread } from "./report";

const inches = (n: number): number => n * 25.4;

function time(runs: number, run: (i: number) => void): number[] {
  const times: number[] = [];
  for (let i = 0; i < runs + 200; i++) {
    const start = performance.now();
    run(i);
    // The first rounds are the compiler's.
    if (i >= 200) times.push(performance.now() - start);
  }
  return times;
}

export function measureEngine(): Measured[] {
  const given = time(2000, (i) =>
    makeSleeve({ length: inches(8), biceps: inches(12) + (i % 16), hem: inches(11), capDepth: inches(6.25) }),
  );
  const found = time(2000, (i) =>
    makeSleeve({
      length: inches(22),
      biceps: inches(14) + (i % 16),
      hem: inches(9),
      armhole: { front: inches(8.5), back: inches(8.75) },
      elbowDepth: inches(13),
      elbowWidth: inches(12),
    }),
  );
  return [
    { what: "one redraft, cap depth given (engine, Node)", value: spread(given) },
    { what: "one redraft, cap depth found from the armhole (engine, Node)", value: spread(found) },
  ];
}

/** Figures that every style can be made from: a grown arm, and a short sleeve for those that want one. */
const grown: SleeveAsk = {
  length: inches(23),
  biceps: inches(14),
  hem: inches(9.5),
  capDepth: inches(5.5),
  armhole: { front: inches(8.5), back: inches(8.75) },
  upperArm: inches(11.5),
  wrist: inches(6.5),
  hand: inches(7.5),
};

/** Each style redrawn while a figure of its block changes, as under a finger; and marked out, rounded to eighths. */
export function measureStyles(): Measured[] {
  return recipes.map(({ id, name }) => {
    const ask = (i: number) => ({
      style: id,
      block: { ...grown, biceps: grown.biceps + (i % 16) },
      values: {},
    });
    if (!makeStyle(ask(0)).ok) throw new Error(`The bench's figures do not make a ${name}`);
    return {
      what: `one redraft of a style: ${name} (engine, Node)`,
      value: spread(time(400, (i) => makeStyle(ask(i)))),
    };
  });
}
