import { describe, expect, it } from "vitest";
import { type Sleeve } from "@/lib/records/types";
import { fieldProblems } from "@/lib/sleeves/field-problems";
import { markTexts, marksOf, parseShare } from "@/lib/sleeves/guide-marks";
import { styleFromRecord } from "@/lib/sleeves/make-style-from-record";
import {
  emptyForm,
  formInUnit,
  formOfSleeve,
  namesOf,
  readForm,
  restoredForm,
  type SleeveForm,
  withFigure,
} from "@/lib/sleeves/sleeve-form";

const form = (typed: Partial<SleeveForm["typed"]>, more: Partial<SleeveForm> = {}): SleeveForm => {
  const empty = emptyForm("in", 8);
  return { ...empty, ...more, typed: { ...empty.typed, ...typed } };
};
const four = { length: "9 1/2", capDepth: "6¼", biceps: "12", hem: "27.9 cm" };
const sleeve = (filled: SleeveForm): Sleeve => ({
  workshopId: "w",
  id: "s",
  stamps: {},
  removedAt: null,
  wearerId: null,
  setId: null,
  name: "Sleeve",
  style: "plain",
  ask: readForm(filled).record,
  fineness: filled.fineness,
  note: filled.note,
});

describe("the drafting form", () => {
  it("draws from four figures, each kept as it was typed beside its millimetres", () => {
    const read = readForm(form(four));
    expect(read).toMatchObject({ drawable: true, missing: [], errors: {} });
    expect(read.record.lengths.capDepth).toEqual({ typed: "6¼", mm: 158.75 });
    expect(read.record.lengths.hem).toEqual({ typed: "27.9 cm", mm: 279 });
  });

  it("names what is missing, in the order it is asked", () => {
    const read = readForm(form({ length: "9" }));
    expect(read.drawable).toBe(false);
    expect(namesOf(read.missing)).toBe("the cap depth, the biceps line and the hem round");
  });

  it("goes on drawing while an optional figure cannot be read", () => {
    const read = readForm(form({ ...four, hand: "abc" }));
    expect(read.drawable).toBe(true);
    expect(read.errors.hand).toMatch(/Type a number/u);
    expect(read.record.lengths.hand).toBeUndefined();
  });

  it("asks for the other half of an armhole", () => {
    const read = readForm(form({ ...four, armholeFront: "7" }));
    expect(read.errors.armholeBack).toMatch(/^Type the back armhole as well/u);
  });

  it("comes back from its record as it was typed", () => {
    const filled = form({ ...four, hand: "6" }, { hemOpens: true, note: "lined" });
    expect(formOfSleeve(sleeve(filled), "in")).toMatchObject({
      typed: filled.typed,
      capBy: "given",
      bicepsBy: "given",
      hemOpens: true,
      note: "lined",
    });
    const found = form(
      { length: "9", armholeWhole: "13", upperArm: "8", hem: "9" },
      { capBy: "armhole", armholeBy: "whole", bicepsBy: "arm" },
    );
    expect(formOfSleeve(sleeve(found), "in")).toMatchObject({
      capBy: "armhole",
      armholeBy: "whole",
      bicepsBy: "arm",
    });
  });

  it("does not read inches as centimetres after the workshop changed its unit", () => {
    const back = formOfSleeve(sleeve(form(four)), "cm");
    expect(back.typed.biceps).toBe("30.5");
    // What was typed with its unit stands.
    expect(back.typed.hem).toBe("27.9 cm");
    expect(formInUnit(form(four), "cm").typed.length).toBe("24.1");
    expect(formInUnit(form({ length: "abc" }), "cm").typed.length).toBe("abc");
  });

  it("takes up a draft that an older form put down", () => {
    const back = restoredForm({ unit: "in", name: "Blue", typed: { hem: "9" } as never }, "in", 16);
    expect(back).toMatchObject({ name: "Blue", fineness: 16, capBy: "given" });
    expect(back.typed).toMatchObject({ hem: "9", length: "" });
  });

  it("takes a found cap depth over when its handle is dragged", () => {
    const now = withFigure(form({}, { capBy: "armhole" }), "capDepth", 158.75);
    expect(now.capBy).toBe("given");
    expect(now.typed.capDepth).toBe("6 1/4");
  });
});

describe("what stands beside the fields", () => {
  it("puts the engine's problem beside the figure in the way", () => {
    const filled = form({ ...four, capDepth: "1/8" });
    const read = readForm(filled);
    const beside = fieldProblems(filled, styleFromRecord({ style: "plain", ask: read.record }), read, false);
    expect(beside.problems.capDepth).toBeDefined();
    expect(beside.general).toEqual([]);
  });

  it("puts a wrong check beside its figure too, and asks for empty ones only once Keep was pressed", () => {
    const filled = form({ ...four, armholeFront: "10", armholeBack: "10" });
    const read = readForm(filled);
    const beside = fieldProblems(filled, styleFromRecord({ style: "plain", ask: read.record }), read, false);
    expect(beside.problems.armholeFront).toBeDefined();
    const empty = form({});
    expect(fieldProblems(empty, null, readForm(empty), false).errors).toEqual({});
    expect(fieldProblems(empty, null, readForm(empty), true).errors.hem).toMatch(/^Type the hem round/u);
  });

  it("puts a mark's problem beside the mark", () => {
    const marks = markTexts([
      { share: 0.25, out: -12.7 },
      { share: 0.55, out: 12.7 },
      { share: 0.8, out: 90 },
    ]);
    const filled = form(four, { marks: { front: marks, back: null } });
    const read = readForm(filled);
    const beside = fieldProblems(filled, styleFromRecord({ style: "plain", ask: read.record }), read, false);
    expect([...beside.marks.front.keys()]).toEqual([2]);
  });
});

describe("guide marks as typed", () => {
  it("keeps the exact value of a cell that nobody typed in", () => {
    const texts = markTexts([{ share: 1 / 3, out: -9.854136585420694 }]);
    expect(marksOf(texts, "front", "in").marks).toEqual([{ share: 1 / 3, out: -9.854136585420694 }]);
  });

  it("reads hundredths and lengths, raised or hollowed", () => {
    const [text] = markTexts([{ share: 0.25, out: -12.7 }]);
    const typed = [{ ...text!, shareTyped: "33,5 %", outTyped: "5/8", raised: true }];
    expect(marksOf(typed, "front", "in").marks).toEqual([{ share: 0.335, out: 15.875 }]);
  });

  it.each(["0", "100", "-5", "x", ""])("refuses the share %j and keeps the last value", (shareTyped) => {
    expect(parseShare(shareTyped).ok).toBe(false);
    const [text] = markTexts([{ share: 0.25, out: 5 }]);
    const read = marksOf([{ ...text!, shareTyped }], "back", "in");
    expect(read.marks).toEqual([{ share: 0.25, out: 5 }]);
    expect(read.problems).toMatchObject([{ side: "back", index: 0, cell: "share" }]);
  });
});
