import { describe, expect, it } from "vitest";
import { phraseText } from "@/lib/lengths/phrase";
import { type Sleeve, type SleeveAskRecord, type StyleId } from "@/lib/records/types";
import { fieldProblems } from "@/lib/sleeves/field-problems";
import { headLine } from "@/lib/sleeves/head-line";
import { layPieces } from "@/lib/sleeves/lay-pieces";
import {
  failingSeams,
  type GoodSleeve,
  piecesOf,
  styleFromRecord,
} from "@/lib/sleeves/make-style-from-record";
import { stepPictures } from "@/lib/sleeves/mark-out";
import { marksDocument } from "@/lib/sleeves/marks-document";
import {
  emptyForm,
  formInUnit,
  formOfSleeve,
  readForm,
  restoredForm,
  type SleeveForm,
} from "@/lib/sleeves/sleeve-form";
import { steppedStyleText, withStyleText } from "@/lib/sleeves/style-form";
import { styleName } from "@/lib/sleeves/style-names";
import { examplePieces, styleChoices, styleFigures } from "@/lib/sleeves/styles";
import { child, good, marked, record, woman } from "./helpers";

const ids = styleChoices.map(({ id }) => id);

const form = (style: StyleId, typed: Record<string, string> = {}): SleeveForm => {
  const empty = emptyForm("in", 8);
  const four = { length: "21 1/2", capDepth: "5 1/2", biceps: "13", hem: "9" };
  return { ...empty, typed: { ...empty.typed, ...four }, style, styleTyped: { [style]: typed } };
};

const kept = (filled: SleeveForm): Sleeve => ({
  workshopId: "w",
  id: "s",
  stamps: {},
  removedAt: null,
  wearerId: null,
  setId: null,
  name: "Sleeve",
  style: filled.style,
  ask: readForm(filled).record,
  fineness: 8,
  note: "",
});

const statement = (
  figures: NonNullable<SleeveAskRecord["style"]>["figures"],
  ask = woman,
): SleeveAskRecord => ({
  ...ask,
  style: { figures, cloth: "medium" },
});

describe("the styles", () => {
  it("are called the same by those that only name them", () => {
    for (const { id, name } of styleChoices) expect(styleName(id)).toBe(name);
    expect(new Set(ids).size).toBe(13);
  });
});

describe("the style on the form", () => {
  it("is plain in a draft and in a record of before there were styles", () => {
    const old = { unit: "in", name: "Blue" } as const;
    expect(restoredForm(old, "in", 8)).toMatchObject({ style: "plain", cloth: "medium", styleTyped: {} });
    expect(formOfSleeve(kept(form("plain")), "in")).toMatchObject({ style: "plain", styleTyped: {} });
    expect(readForm(form("plain")).record).not.toHaveProperty("style");
  });

  it("keeps a length as typed beside its millimetres, a count as a number, and brings both back", () => {
    const filled = {
      ...form("statement", { headOpen: '2"', slashes: "8", raise: "" }),
      cloth: "fine" as const,
    };
    const { record: ask, styleErrors } = readForm(filled);
    expect(styleErrors).toEqual({});
    expect(ask.style).toEqual({
      figures: { headOpen: { typed: '2"', mm: 50.8 }, slashes: 8 },
      cloth: "fine",
    });
    expect(formOfSleeve(kept(filled), "in")).toMatchObject({
      style: "statement",
      cloth: "fine",
      styleTyped: { statement: { headOpen: '2"', slashes: "8" } },
    });
  });

  it("says what to type where a figure cannot be read, and draws with the usual one meanwhile", () => {
    const read = readForm(form("statement", { headOpen: "abc", slashes: "2.5" }));
    expect(read.styleErrors.headOpen).toMatch(/Type a number/u);
    expect(read.styleErrors.slashes).toMatch(/no whole number/u);
    expect(styleFromRecord({ style: "statement", ask: read.record })?.ok).toBe(true);
  });

  it("keeps what was typed for a style that is left for another", () => {
    const tried = { ...form("statement", { headOpen: "2" }), style: "puff" as const };
    expect(readForm(tried).record.style?.figures).toEqual({});
    expect(readForm({ ...tried, style: "statement" }).record.style?.figures).toHaveProperty("headOpen");
  });

  it("has nothing left of a figure that was typed and emptied again", () => {
    const fresh = formOfSleeve(kept(form("statement")), "in");
    const typed = withStyleText(withStyleText(fresh, "headOpen", "2"), "slashes", "8");
    expect(typed.styleTyped).toEqual({ statement: { headOpen: "2", slashes: "8" } });
    expect(withStyleText(withStyleText(typed, "headOpen", ""), "slashes", "")).toEqual(fresh);
  });

  it("writes lengths again in another unit, and leaves counts", () => {
    const now = formInUnit(form("statement", { headOpen: "2", slashes: "8" }), "cm");
    expect(now.styleTyped.statement).toEqual({ headOpen: "5.1", slashes: "8" });
  });

  it("steps a count by one within its bounds, from the usual where nothing is typed", () => {
    const slashes = styleFigures("statement").find(({ key }) => key === "slashes")!;
    const step = (typed: string, way: 1 | -1) => steppedStyleText(slashes, typed, way, "in", 8);
    expect(step("", 1)).toBe(String(slashes.usual + 1));
    expect(step("8", -1)).toBe("7");
    expect(step(String(slashes.high), 1)).toBe(String(slashes.high));
    expect(step("abc", -1)).toBe(String(slashes.usual - 1));
  });

  it.each(ids)("asks for no figure of %s on any sleeve that it does not know how to read", (style) => {
    const known = new Map(styleFigures(style).map(({ key, kind }) => [key, kind]));
    for (const ask of [child, woman]) {
      const made = styleFromRecord({ style, ask })!;
      for (const { key, kind } of made.shown) expect([key, known.get(key)]).toEqual([key, kind]);
    }
  });
});

describe("what stands beside a style's figures", () => {
  const beside = (filled: SleeveForm) => {
    const read = readForm(filled);
    return fieldProblems(filled, styleFromRecord({ style: filled.style, ask: read.record }), read, false);
  };

  it("is what is out of its bounds, and the plain sleeve is there to be shown", () => {
    const filled = form("statement", { headOpen: "30" });
    expect(beside(filled).styleProblems.headOpen).toBeDefined();
    expect(beside(filled).general).toEqual([]);
    const made = styleFromRecord({ style: "statement", ask: readForm(filled).record });
    expect(made).toMatchObject({ ok: false, block: { style: "plain" } });
  });

  it("is not said twice where it cannot be read", () => {
    const { styleErrors, styleProblems } = beside(form("statement", { headOpen: "abc" }));
    expect(styleErrors.headOpen).toBeDefined();
    expect(styleProblems.headOpen).toBeUndefined();
  });

  it("leaves the block's problems beside the block's figures", () => {
    const filled = withStyleText(form("statement"), "slashes", "8");
    const found = beside({ ...filled, typed: { ...filled.typed, capDepth: "1/8" } });
    expect(found.problems.capDepth).toBeDefined();
    expect(found.styleProblems).toEqual({});
  });
});

describe("a sleeve with a style", () => {
  it("is made from its own figures, and of rounded marks where the unit is given", () => {
    const wide = good(statement({ headOpen: { typed: "2", mm: 50.8 }, slashes: 8 }), "statement");
    expect(wide.gathers[0]!.full).toBeGreaterThan(good(woman, "statement").gathers[0]!.full + 8 * 10);
    expect(wide.pieces[0]!.panels).toHaveLength(9);
    const { rounded } = marked(woman, "in", "statement");
    expect((rounded.figures.length / 3.175) % 1).toBeCloseTo(0, 9);
    expect(piecesOf(rounded)).toMatchObject({ style: "Two-part statement sleeve", pieces: [{}, {}] });
  });

  it("says first how its head goes in", () => {
    const says = (ask: SleeveAskRecord) => {
      const line = headLine(styleFromRecord({ style: "statement", ask })!, ask);
      return [line.verdict, phraseText(line.phrase, "in")];
    };
    expect(says(woman)[1]).toMatch(/^Goes in: head gathered \d(\.\d)?\s:\s1, [\d /]+ in into [\d /]+ in/u);
    expect(says(child)).toEqual(["plain", expect.stringMatching(/^Head gathered .* Type the armhole/u)]);
    const none = statement({ headOpen: { typed: "0", mm: 0 }, raise: { typed: "0", mm: 0 } });
    expect(says(none)[0]).not.toBe("good");
  });

  it("says that its seams do not meet, on the screen and on the sheet before the first step", () => {
    const { exact, rounded, step } = marked(woman, "in", "statement");
    expect(failingSeams(rounded)).toEqual([]);
    const seams = rounded.seams.map((seam) =>
      seam.id === "underarm-lower" ? { ...seam, agrees: false, remedy: ["Shorten it."] } : seam,
    );
    const failing: GoodSleeve = { ...rounded, seams };
    const line = headLine(failing, woman);
    expect(line.verdict).toBe("wrong");
    expect(phraseText(line.phrase, "in")).toMatch(/^Does not go together: .*underarm/u);
    const doc = marksDocument({
      sleeve: { name: "Blue", ask: woman, fineness: 8 },
      exact,
      rounded: failing,
      step,
      unit: "in",
      wearerName: "",
      author: "",
      today: "2026-03-14",
    });
    expect(doc.warnings[0]).toMatch(/^This sleeve fails/u);
    expect(doc.warnings[1]).toMatch(/underarm.*Shorten it\.$/u);
    expect(doc.checks.filter(({ verdict }) => verdict === "wrong")).toHaveLength(1);
  });
});

describe("the marks of a style", () => {
  it.each(ids)(
    "%s: the block's steps, then its own, each new sheet bare, everything in its frame",
    (style) => {
      const { rounded } = marked(record({ length: 21.4, capDepth: 5.5, biceps: 13.5, hem: 10 }), "in", style);
      const pictures = stepPictures(rounded);
      expect(pictures.map(({ step }) => step.n)).toEqual(pictures.map((_, i) => i + 1));
      const block = pictures.length - rounded.steps.length;
      let sheet = 0;
      for (const [i, { scene }] of rounded.steps.entries()) {
        const { before, box, fresh, measured, points, step } = pictures[block + i]!;
        const empty = scene.fresh.length + scene.measured.length + scene.points.length === 0;
        if (scene.sheet !== sheet && !empty) expect(before).toEqual([]);
        sheet = scene.sheet;
        if (step.stage === "sew") expect(before.length).toBeGreaterThan(0);
        expect(box.w).toBeGreaterThan(0);
        expect(box.h).toBeGreaterThan(0);
        const spots = [
          ...fresh.flatMap(({ curves }) => curves.flatMap((curve) => [curve[0], curve[3]])),
          ...measured.flatMap(({ from, to }) => [from, to]),
          ...points,
        ];
        for (const { x, y } of spots) {
          expect(x).toBeGreaterThan(box.x - 0.01);
          expect(x).toBeLessThan(box.x + box.w + 0.01);
          expect(y).toBeGreaterThan(box.y - 0.01);
          expect(y).toBeLessThan(box.y + box.h + 0.01);
        }
      }
    },
  );

  it("names its stages, and picks out the edge that is gathered", () => {
    const { rounded } = marked(woman, "in", "statement");
    const pictures = stepPictures(rounded);
    expect(new Set(pictures.map(({ step }) => step.stage))).toEqual(new Set(["draw", "cut", "sew"]));
    const pull = pictures.find(({ step }) => step.phrase.join("").startsWith("Pull the head"))!;
    expect(pull.fresh).toHaveLength(1);
    const doc = marksDocument({
      ...marked(woman, "in", "statement"),
      sleeve: { name: "Blue", ask: woman, fineness: 8 },
      unit: "in",
      wearerName: "",
      author: "",
      today: "2026-03-14",
    });
    expect(doc.subtitle).toMatch(/^Two-part statement sleeve/u);
    expect(doc.steps.some(({ text }) => text.startsWith("At the machine: "))).toBe(true);
  });
});

describe("pieces laid beside each other", () => {
  it.each(ids)("%s: none on another, all on the paper, at any shape of it", (style) => {
    for (const aspect of [0.6, 1, 1.8]) {
      const { box, laid } = layPieces(examplePieces(style), aspect);
      expect(laid.map(({ piece }) => piece.id)).toEqual(examplePieces(style).map(({ id }) => id));
      for (const [i, { box: a }] of laid.entries()) {
        expect(a.x).toBeGreaterThanOrEqual(box.x - 1e-6);
        expect(a.x + a.w).toBeLessThanOrEqual(box.x + box.w + 1e-6);
        expect(a.y + a.h).toBeLessThanOrEqual(box.y + box.h + 1e-6);
        for (const { box: b } of laid.slice(i + 1)) {
          const apart = a.x + a.w <= b.x || b.x + b.w <= a.x || a.y + a.h <= b.y || b.y + b.h <= a.y;
          expect(apart).toBe(true);
        }
      }
    }
  });

  it("lies them in a row on a wide paper and below each other on a high one", () => {
    const pieces = examplePieces("statement");
    const [wide, high] = [layPieces(pieces, 3), layPieces(pieces, 0.5)];
    expect(wide.laid[1]!.box.x).toBeGreaterThan(wide.laid[0]!.box.x + wide.laid[0]!.box.w);
    expect(high.laid[1]!.box.y).toBeGreaterThan(high.laid[0]!.box.y + high.laid[0]!.box.h);
  });
});
