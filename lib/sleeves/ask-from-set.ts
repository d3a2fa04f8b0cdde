/** The first figures of a sleeve, read off a measurement set. Eases and shares are common practice, no source, unless said. */
import { type MeasureKey } from "@/lib/figures/body-measures";
import { formatLength } from "@/lib/lengths/format-length";
import { type Phrase } from "@/lib/lengths/phrase";
import { mmPerInch } from "@/lib/lengths/units";
import { type Fineness, type Unit } from "@/lib/records/types";
import { grownArmMm, usualBicepsEase } from "@/lib/sleeves/ask-from-record";
import { type Reach, reaches } from "@/lib/sleeves/reach";
import { type FigureKey } from "@/lib/sleeves/sleeve-figures";
import { type SleeveForm } from "@/lib/sleeves/sleeve-form";

export interface SetAsk {
  /** As the form would have it typed. */
  typed: Partial<Record<FigureKey, string>>;
  /** Where each of them was taken from, one sentence. */
  said: Partial<Record<FigureKey, Phrase>>;
  capBy: SleeveForm["capBy"];
  armholeBy: SleeveForm["armholeBy"];
  bicepsBy: SleeveForm["bicepsBy"];
  hemOpens: boolean;
}

export interface AskFromSetOptions {
  figures: readonly { key: string; mm: number }[];
  /** Whole years, where known. */
  ageYears?: number;
  reach: Reach;
  unit: Unit;
  fineness: Fineness;
}

/** A short sleeve ends this far down the upper arm. */
const shortShare = 0.6;
const practice = "(common practice, no source)";

/** Up to here the eases are a child's: as far as the care rules reckon a child, 14 years. */
const childUnder = 14;

function isSmall(ageYears: number | undefined, upperArm: number | undefined): boolean {
  if (ageYears !== undefined) return ageYears < childUnder;
  return upperArm !== undefined && upperArm < grownArmMm;
}

/** How long a sleeve the set can give: a child's is first offered short, a grown one's long. */
export function usualReach(figures: AskFromSetOptions["figures"], ageYears: number | undefined): Reach {
  const has = (key: MeasureKey) => figures.some((figure) => figure.key === key);
  if (!has("armLength")) return "short";
  if (!has("upperArmLength")) return "long";
  return ageYears !== undefined && ageYears < childUnder ? "short" : "long";
}

export function askFromSet({ figures, ageYears, reach, unit, fineness }: AskFromSetOptions): SetAsk {
  const mm = (key: MeasureKey) => figures.find((figure) => figure.key === key)?.mm;
  const upperArm = mm("upperArmGirth");
  const small = isSmall(ageYears, upperArm);
  const typed: SetAsk["typed"] = {};
  const said: SetAsk["said"] = {};
  const put = (key: FigureKey, value: number | undefined, phrase: Phrase) => {
    if (value === undefined) return;
    typed[key] = formatLength(value, unit, fineness).figure;
    said[key] = phrase;
  };
  const as = (name: string, value: number | undefined): Phrase =>
    value === undefined ? [] : [`${name} `, { mm: value }, " as taken."];

  const { bicepsBy } = putBiceps();
  const { armholeBy, capBy } = putArmhole();
  putLength();
  const hemOpens = putHem();
  const hand = mm("handGirth");
  put("hand", hand, as("Hand girth", hand));
  if (reach !== "short") {
    const [depth, elbow] = [mm("upperArmLength"), mm("elbowGirth")];
    put("elbowDepth", depth, as("Upper arm length", depth));
    put("elbowGirth", elbow, as("Elbow girth", elbow));
  }
  if (reach === "long") put("wrist", mm("wristGirth"), as("Wrist girth", mm("wristGirth")));
  return { typed, said, capBy, armholeBy, bicepsBy, hemOpens };

  function putBiceps(): Pick<SetAsk, "bicepsBy"> {
    if (upperArm === undefined) return { bicepsBy: "given" };
    const ease = ageYears === undefined ? usualBicepsEase(upperArm) : (small ? 1.5 : 2.5) * mmPerInch;
    put("upperArm", upperArm, as("Upper arm girth", upperArm));
    put("bicepsEase", ease, [
      `Usual on ${small ? "a child's" : "a grown"} arm: `,
      { mm: ease },
      ` ${practice}.`,
    ]);
    return { bicepsBy: "arm" };
  }

  function putArmhole(): Pick<SetAsk, "armholeBy" | "capBy"> {
    const [front, back, whole] = [mm("armscyeFront"), mm("armscyeBack"), mm("armscyeGirth")];
    const ease = (small ? 1 : 1.5) * mmPerInch;
    const from = (name: string, value: number, share: number): Phrase => [
      `${name} `,
      { mm: value },
      " and ",
      { mm: share },
      ` of ease ${practice}. Where the bodice is drawn, measure its own seam line instead.`,
    ];
    if (front !== undefined && back !== undefined) {
      put("armholeFront", front + ease / 2, from("Armscye, front half", front, ease / 2));
      put("armholeBack", back + ease / 2, from("Armscye, back half", back, ease / 2));
      return { armholeBy: "halves", capBy: "armhole" };
    }
    if (whole !== undefined) {
      put("armholeWhole", whole + ease, from("Armscye girth", whole, ease));
      return { armholeBy: "whole", capBy: "armhole" };
    }
    return { armholeBy: "halves", capBy: "given" };
  }

  function putLength(): void {
    const [arm, upper] = [mm("armLength"), mm("upperArmLength")];
    if (reach === "long") return put("length", arm, as("Arm length", arm));
    if (upper === undefined) return;
    if (reach === "short")
      return put("length", upper * shortShare, [
        "Six tenths of the upper arm, ",
        { mm: upper },
        ` ${practice}.`,
      ]);
    if (arm !== undefined)
      put("length", (upper + arm) / 2, [
        "Half-way between the elbow, ",
        { mm: upper },
        ", and the wrist, ",
        { mm: arm },
        ` ${practice}.`,
      ]);
  }

  /** Whether the hem then needs an opening. */
  function putHem(): boolean {
    const [hand, wrist, elbow] = [mm("handGirth"), mm("wristGirth"), mm("elbowGirth")];
    const over = (name: string, value: number, ease: number, why: string): void =>
      put("hem", value + ease, [`${name} `, { mm: value }, " and ", { mm: ease }, ` ${why}`]);
    if (reach === "short" && upperArm !== undefined)
      over("Upper arm girth", upperArm, (small ? 1 : 2) * mmPerInch, `of ease ${practice}.`);
    if (reach === "three-quarter" && elbow !== undefined)
      over("Elbow girth", elbow, mmPerInch, `of ease ${practice}.`);
    if (reach !== "long") return false;
    if (hand !== undefined && (wrist === undefined || hand >= wrist + mmPerInch / 2)) {
      over(
        "Hand girth",
        hand,
        mmPerInch / 2,
        "more: without an opening the hem is never under the hand (Ingalls, Text-Book on Domestic Art, 1911).",
      );
      return false;
    }
    if (wrist === undefined) return false;
    over("Wrist girth", wrist, 1.5 * mmPerInch, `of ease ${practice}. The hem then needs an opening.`);
    return true;
  }
}

/** The form with the set's figures put in; what was typed over an earlier filling stays. */
export function fillFromSet(form: SleeveForm, now: SetAsk, before: SetAsk | null): SleeveForm {
  const typed = { ...form.typed };
  for (const key of Object.keys(typed) as FigureKey[]) {
    const untouched = typed[key] === "" || typed[key] === before?.typed[key];
    if (untouched) typed[key] = now.typed[key] ?? "";
  }
  if (before)
    return { ...form, typed, hemOpens: form.hemOpens === before.hemOpens ? now.hemOpens : form.hemOpens };
  const { armholeBy, bicepsBy, capBy, hemOpens } = now;
  return { ...form, typed, armholeBy, bicepsBy, capBy, hemOpens };
}

/** What the set gives as far down the arm as the form was filled; every reach for a form that was not. */
export function triedAsks({
  reach,
  ...options
}: Omit<AskFromSetOptions, "reach"> & { reach: Reach | null }): SetAsk[] {
  const tried = reach ? [reach] : reaches.map(({ value }) => value);
  return tried.map((one) => askFromSet({ ...options, reach: one }));
}

/** Where each figure on the form was taken from, as far as it still stands as the set has it. */
export function saidOf(typed: SleeveForm["typed"], asks: readonly SetAsk[]): SetAsk["said"] {
  const said: SetAsk["said"] = {};
  for (const ask of asks) {
    for (const key of Object.keys(ask.said) as FigureKey[]) {
      if (!said[key] && typed[key] === ask.typed[key]) said[key] = ask.said[key]!;
    }
  }
  return said;
}
