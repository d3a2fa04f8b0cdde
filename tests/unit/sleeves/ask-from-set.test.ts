import { describe, expect, it } from "vitest";
import { parseLength } from "@/lib/lengths/parse-length";
import { phraseText } from "@/lib/lengths/phrase";
import {
  askFromSet,
  fillFromSet,
  saidOf,
  type SetAsk,
  triedAsks,
  usualReach,
} from "@/lib/sleeves/ask-from-set";
import { styleFromRecord } from "@/lib/sleeves/make-style-from-record";
import { emptyForm, readForm } from "@/lib/sleeves/sleeve-form";

const cm = (figures: Record<string, number>) =>
  Object.entries(figures).map(([key, value]) => ({ key, mm: value * 10 }));

/** Of a girl of 7: upper arm and its length near NHANES 2015-16 (calc); the others ours. */
const girl = cm({
  armscyeGirth: 28.5,
  upperArmGirth: 20.4,
  elbowGirth: 18.5,
  wristGirth: 13,
  handGirth: 15.2,
  upperArmLength: 26.1,
  armLength: 43,
});
/** Of a woman: P50 of the US Army surveys (seen) for arm, wrist and hand; the halves of the armscye ours. */
const woman = cm({
  armscyeFront: 18.3,
  armscyeBack: 18.9,
  upperArmGirth: 29,
  elbowGirth: 23.8,
  wristGirth: 15.4,
  handGirth: 18.7,
  upperArmLength: 31.1,
  armLength: 54.2,
});
const units = { unit: "cm", fineness: 8 } as const;
const mm = (ask: SetAsk, key: keyof SetAsk["typed"]) => {
  const read = parseLength(ask.typed[key] ?? "", "cm");
  return read.ok ? read.mm : null;
};

describe("a sleeve's first figures from a measurement set", () => {
  it("gives a child's arm 1 1/2 in and a grown one 2 1/2 in of ease, said to be common practice", () => {
    const small = askFromSet({ figures: girl, ageYears: 7, reach: "short", ...units });
    const grown = askFromSet({ figures: woman, ageYears: 30, reach: "long", ...units });
    expect(mm(small, "bicepsEase")).toBe(38);
    expect(mm(grown, "bicepsEase")).toBe(64);
    expect(phraseText(small.said.bicepsEase!, "in")).toContain("common practice, no source");
  });

  it("goes by the arm where the age is not known", () => {
    const ask = (figures: typeof girl) => askFromSet({ figures, reach: "long", ...units });
    expect(mm(ask(girl), "bicepsEase")).toBe(38);
    expect(mm(ask(woman), "bicepsEase")).toBe(64);
  });

  it("adds ease to the armscye, whole or by halves, and finds the cap from it", () => {
    const whole = askFromSet({ figures: girl, ageYears: 7, reach: "short", ...units });
    expect(whole).toMatchObject({ armholeBy: "whole", capBy: "armhole", bicepsBy: "arm" });
    expect(mm(whole, "armholeWhole")).toBe(310);
    const halves = askFromSet({ figures: woman, ageYears: 30, reach: "long", ...units });
    expect(halves.armholeBy).toBe("halves");
    expect(mm(halves, "armholeFront")).toBe(202);
    expect(mm(halves, "armholeBack")).toBe(208);
    expect(phraseText(whole.said.armholeWhole!, "cm")).toMatch(/^Armscye girth 28.5 cm and 2.5 cm of ease/u);
  });

  it("reaches as far as it is asked to", () => {
    const length = (reach: "short" | "three-quarter" | "long") =>
      mm(askFromSet({ figures: woman, ageYears: 30, reach, ...units }), "length");
    expect(length("long")).toBe(542);
    expect(length("short")).toBe(187);
    expect(length("three-quarter")).toBe(427);
  });

  it("keeps a closed hem over the hand, and opens one that is only known by the wrist", () => {
    const closed = askFromSet({ figures: woman, ageYears: 30, reach: "long", ...units });
    expect(closed.hemOpens).toBe(false);
    expect(mm(closed, "hem")!).toBeGreaterThanOrEqual(187);
    const noHand = woman.filter(({ key }) => key !== "handGirth");
    const opens = askFromSet({ figures: noHand, ageYears: 30, reach: "long", ...units });
    expect(opens.hemOpens).toBe(true);
    // Ingalls, Text-Book on Domestic Art, 1911 (seen): half hem = wrist/2 + 1/2 in.
    expect(mm(opens, "hem")!).toBeGreaterThanOrEqual(154 + 25.4);
  });

  it("leaves out what the set has not got, and asks for it", () => {
    const ask = askFromSet({ figures: cm({ upperArmGirth: 29 }), reach: "long", ...units });
    expect(ask.typed.length).toBeUndefined();
    expect(ask.capBy).toBe("given");
    const form = fillFromSet(emptyForm("cm", 8), ask, null);
    expect(readForm(form).missing).toEqual(["length", "capDepth", "hem"]);
  });

  it("offers a child a short sleeve first, a grown arm a long one, and what the set can give", () => {
    expect(usualReach(girl, 7)).toBe("short");
    expect(usualReach(woman, 30)).toBe("long");
    expect(usualReach(cm({ upperArmGirth: 29, upperArmLength: 31 }), 30)).toBe("short");
  });

  it.each([
    ["girl, short", girl, 7, "short"],
    ["girl, long", girl, 7, "long"],
    ["woman, short", woman, 30, "short"],
    ["woman, three-quarter", woman, 30, "three-quarter"],
    ["woman, long", woman, 30, "long"],
  ] as const)("draws a sleeve with nothing wrong: %s", (_, figures, ageYears, reach) => {
    for (const unit of ["in", "cm"] as const) {
      const ask = askFromSet({ figures, ageYears, reach, unit, fineness: 8 });
      const { record } = readForm(fillFromSet(emptyForm(unit, 8), ask, null));
      const made = styleFromRecord({ style: "plain", ask: record });
      expect(made?.ok).toBe(true);
      if (made?.ok) expect(made.checks.filter(({ verdict }) => verdict === "wrong")).toEqual([]);
    }
  });

  it("changes over the reach without touching what was typed by hand", () => {
    const of = (reach: "short" | "long") => askFromSet({ figures: woman, ageYears: 30, reach, ...units });
    const long = fillFromSet(emptyForm("cm", 8), of("long"), null);
    const typedOver = { ...long, typed: { ...long.typed, hem: "21,5" } };
    const short = fillFromSet(typedOver, of("short"), of("long"));
    expect(short.typed.hem).toBe("21,5");
    expect(short.typed.length).toBe(of("short").typed.length);
    expect(short.typed.elbowDepth).toBe("");
  });

  it("says where a figure is from only while it stands as the set has it", () => {
    const asks = triedAsks({ figures: woman, ageYears: 30, reach: null, ...units });
    const form = fillFromSet(emptyForm("cm", 8), asks.at(-1)!, null);
    expect(phraseText(saidOf(form.typed, asks).length!, "cm")).toBe("Arm length 54.2 cm as taken.");
    expect(saidOf({ ...form.typed, length: "55" }, asks).length).toBeUndefined();
  });
});
