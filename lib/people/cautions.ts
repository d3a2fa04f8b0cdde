import { type Age, isChild, isUnderThree } from "@/lib/people/age";

export interface Caution {
  key: "cords" | "outerwear-cords" | "waist-cords" | "nightwear" | "small-parts" | "elastic" | "pins";
  /** One or two short sentences. */
  say: string;
  source: string;
  mark: "seen" | "practice";
}

const localLaw = "Local law decides.";

const outerwear =
  /\b(?:over|rain|great|top|duffle ?)?coats?\b|jacket|anorak|parka|\bhood|\bcape\b(?! sleeve)|cloak|poncho|sweatshirt|fleece|waterproof|gilet/iu;
const nightwear =
  /night|pyjama|pajama|pijama|sleep(?:wear|suit|ing)|bed ?(?:jacket|gown)|dressing ?gown|bath ?robe/iu;
const elastic = /elastic|puff|gathered|bishop|frill/iu;
const forTheVeryYoung = /\b(?:bab(?:y|ies)|infant|toddler|newborn|christening)/iu;
const forAChild = /\b(?:child|kid|girl|boy|school|nursery|flower ?girl|page ?boy)/iu;

/** Where no age is known, what the garment is called may still say that it is for a child. */
function ageFromWords(garment: string): Age | undefined {
  if (forTheVeryYoung.test(garment)) return { years: 0, certain: false };
  if (forAChild.test(garment)) return { years: 3, certain: false };
  return undefined;
}

/**
 * What to mind before a garment is cut for a child: cords, nightwear, small parts, elastic. Nothing for an adult.
 * @param garment its kind and notes, in any words: "Nightdress, drawstring neck".
 * @param age the wearer's, where known; else what the words give away.
 */
export function cautionsFor(garment: string, age: Age | undefined): Caution[] {
  const reckoned = age ?? ageFromWords(garment);
  if (!reckoned) return [];
  const { years } = reckoned;
  const found: Caution[] = [];

  if (isUnderThree(reckoned)) {
    found.push({
      key: "small-parts",
      say: `Under 3 years: no button, bead or trim that can come off and be swallowed, nothing that fits a tube 31.7 mm wide. ${localLaw}`,
      source: "16 CFR 1501",
      mark: "seen",
    });
  }
  if (isChild(reckoned)) {
    found.push({
      key: "cords",
      say:
        years < 7
          ? `Up to 7 years or 134 cm tall: no cords at the hood or neck. ${localLaw}`
          : `From 7 to 14 years: no drawstrings with free ends at the hood or neck. ${localLaw}`,
      source: "EN 14682, as summed up by test houses",
      mark: "seen",
    });
    if (nightwear.test(garment)) {
      found.push({
        key: "nightwear",
        say: `Children's nightwear must resist flame unless it fits tightly or is for an infant, and a full sleeve is not tight. Look at the cloth before cutting. ${localLaw}`,
        source: "16 CFR 1615 and 1616 (US)",
        mark: "seen",
      });
    }
    if (elastic.test(garment)) {
      found.push({
        key: "elastic",
        say: "Elastic on a child's arm must not mark the skin. Try it on the arm before it is sewn in.",
        source: "common practice, no source",
        mark: "practice",
      });
    }
  }
  if (outerwear.test(garment) && years <= 12 && years >= 2) {
    found.push({
      key: "outerwear-cords",
      say: `Outerwear in sizes 2T to 12: no drawstring at the hood or neck. ${localLaw}`,
      source: "16 CFR 1120 (US)",
      mark: "seen",
    });
  }
  if (outerwear.test(garment) && years <= 16 && years >= 2) {
    found.push({
      key: "waist-cords",
      say: `Outerwear in sizes 2T to 16: a cord at the waist or bottom at most 3 in outside its channel, no knot or toggle, sewn fast in the middle. ${localLaw}`,
      source: "16 CFR 1120 (US)",
      mark: "seen",
    });
  }
  return found;
}

/** For the moment of handing over, whoever it is for. */
export const handOverCaution: Caution = {
  key: "pins",
  say: "Feel every seam and hem for pins and needles before it is handed over.",
  source: "common practice, no source",
  mark: "practice",
};
