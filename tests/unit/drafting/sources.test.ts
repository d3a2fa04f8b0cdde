/** Outside values, each with its source and how sure it is, as design/sources.md has them. */
import { describe, expect, it } from "vitest";
import { defaultMarks, INCH, makeSleeve, type Check, type SleeveAsk } from "@/lib/drafting";
import { child, draft, figures, inches, value } from "./helpers";
import { draftBasicSleeve } from "@/lib/drafting";

function checked(ask: SleeveAsk): Map<string, Check> {
  const made = makeSleeve(ask);
  if (!made.ok) throw new Error(JSON.stringify(made.problems));
  return new Map(made.checks.map((check) => [check.id, check]));
}

it("1 in = 25.4 mm exactly (international yard, 1959; exact)", () => {
  expect(INCH).toBe(25.4);
});

describe("hand practice for a child's sleeve (practice): hollow 1/2, raise 1/2, raise 3/4 in; B 12, C 6 1/4 in", () => {
  it("gives a front half of about 9 1/4 in, and a back half to match", () => {
    const { capFront, capBack } = draft(child).lengths;
    // "About", by the tape: within 1/8 in.
    expect(Math.abs(capFront / INCH - 9.25)).toBeLessThan(1 / 8);
    expect(Math.abs(capBack / INCH - 9.25)).toBeLessThan(1 / 8);
    // The two halves agree to 1/16 in.
    expect(Math.abs(capFront - capBack)).toBeLessThan(inches(1 / 16));
  });
  it("is kept to the letter on the front, and the back is hollowed less", () => {
    const { front, back } = defaultMarks(inches(12));
    // 1e-9 mm of float noise.
    [-0.5, 0.5, 0.75].forEach((out, i) => expect(front[i]!.out).toBeCloseTo(inches(out), 9));
    expect(back[0]!.out).toBeLessThan(0);
    expect(back[0]!.out).toBeGreaterThan(front[0]!.out);
  });
  it("is scaled with B", () => {
    // 1e-9 mm of float noise: exact proportion.
    expect(defaultMarks(inches(18)).front[2]!.out).toBeCloseTo(inches(0.75 * 1.5), 9);
  });
});

describe("Burton, School Sewing, 1916 (seen, year from memory): armhole 16, half width 8 1/2, points 3.2 and 6.4 in, cap 4 in", () => {
  const burton = { length: inches(18), biceps: inches(17), hem: inches(10), capDepth: inches(4) };
  it("draws: the half is 8 1/2 in, and marks can stand a fifth and two fifths of the armhole from the edge", () => {
    const base = figures(burton.biceps, burton.capDepth, burton.length, burton.hem);
    const run = inches(8.5) - base.beside;
    const marks = [
      { share: inches(16 / 5) / run, out: -inches(0.25) },
      { share: inches((2 * 16) / 5) / run, out: inches(0.5) },
    ];
    const d = value(draftBasicSleeve({ ...base, front: marks, back: marks }));
    // 1e-9 in of float noise: exact arithmetic of the rule.
    expect(d.points.underarmBack!.x / INCH).toBeCloseTo(16 / 2 + 1 / 2, 9);
    expect((d.points.underarmBack!.x - d.points.footBack1!.x) / INCH).toBeCloseTo(3.2, 9);
    expect((d.points.underarmBack!.x - d.points.footBack2!.x) / INCH).toBeCloseTo(6.4, 9);
  });
  it("passes the check of a flat cap's width, by Ingalls' rule as well", () => {
    const check = checked({ ...burton, armhole: { front: inches(8), back: inches(8) } }).get(
      "flat-cap-width",
    )!;
    expect(check).toMatchObject({ verdict: "good", mark: "seen" });
    // 1e-9 in of float noise.
    expect(check.value / INCH).toBeCloseTo(8.5, 9);
    expect(check.low! / INCH).toBeCloseTo(8, 9);
  });
});

describe("Ingalls, Text-Book on Domestic Art, 1911 (seen, year from memory)", () => {
  const base = { length: inches(22), biceps: inches(15), hem: inches(9), capDepth: inches(4) };
  it("half biceps line is armscye/2 + 1/2 in, never under armscye/2", () => {
    const check = checked({ ...base, armhole: { front: inches(8), back: inches(8) } }).get("flat-cap-width")!;
    expect(check.verdict).toBe("look");
    const [wanted, never] = check.remedy
      .filter((part) => typeof part === "object")
      .map(({ mm }) => mm / INCH);
    // 1e-9 in of float noise.
    expect(wanted).toBeCloseTo(8.5, 9);
    expect(never).toBeCloseTo(8, 9);
  });
  it("half elbow is elbow/2 + 1/2, half hem wrist/2 + 1/2, or hand/2", () => {
    const checks = checked({
      ...base,
      elbowDepth: inches(13),
      elbowGirth: inches(9.5),
      wrist: inches(6),
      hand: inches(7.25),
    });
    // 1e-9 in of float noise, halves.
    expect(checks.get("elbow")!.low! / INCH / 2).toBeCloseTo(9.5 / 2 + 0.5, 9);
    expect(checks.get("hem-wrist")!.low! / INCH / 2).toBeCloseTo(6 / 2 + 0.5, 9);
    expect(checks.get("hem-hand")!.low! / INCH / 2).toBeCloseTo(7.25 / 2, 9);
  });
});

describe("Threads magazine 2021; Armstrong as quoted (seen second hand)", () => {
  const sleeve = (biceps: number) =>
    checked({ length: 560, biceps, hem: 240, capDepth: 0.38 * biceps, upperArm: inches(12) }).get(
      "biceps-ease",
    )!;
  it("biceps ease is at least 2 in on an adult, 4 ample", () => {
    expect(sleeve(inches(13.9)).verdict).toBe("look");
    expect(sleeve(inches(14))).toMatchObject({ verdict: "good", mark: "seen" });
    expect(sleeve(inches(16)).verdict).toBe("good");
    expect(sleeve(inches(16.1)).verdict).toBe("look");
  });
  const ease = (headEase: number, cloth: "woven" | "knit") =>
    checked({ length: 560, biceps: 360, hem: 240, armhole: { front: 215, back: 220 }, headEase, cloth }).get(
      "head-ease",
    )!;
  it("cap ease is 1 to 1 1/2 in in set-in woven sleeves", () => {
    expect(ease(inches(0.9), "woven").verdict).toBe("look");
    expect(ease(inches(1), "woven")).toMatchObject({ verdict: "good", mark: "seen" });
    expect(ease(inches(1.5), "woven").verdict).toBe("good");
    expect(ease(inches(1.6), "woven").verdict).toBe("look");
  });
  it("1/2 in does for knits", () => {
    expect(ease(inches(0.5), "knit").verdict).toBe("good");
  });
});

describe("women of the US Army surveys: arm from ANSUR II (seen), scye girth from ANSUR 1989 (mean seen, P5 and P95 calc: mean ± 1.645 SD)", () => {
  it.each([
    ["P5", 259, 371.3 - 1.645 * 23, 142, 173],
    ["P50", 304, 370, 154, 187],
    ["P95", 360, 371.3 + 1.645 * 23, 168, 202],
  ])(
    "%s: with 2 in of ease all round a set-in sleeve is found, of sound shape",
    (_, arm, scye, wrist, hand) => {
      const armhole = (scye + inches(2)) / 2;
      const checks = checked({
        length: 560,
        biceps: arm + inches(2),
        hem: hand + inches(1),
        armhole: { front: armhole, back: armhole },
        upperArm: arm,
        wrist,
        hand,
      });
      for (const id of [
        "biceps-ease",
        "cap-shape",
        "cap-front",
        "cap-back",
        "head-ease",
        "hem-wrist",
        "hem-hand",
        "underarms",
      ]) {
        expect(checks.get(id)!.verdict, id).toBe("good");
      }
    },
  );
});

it("cap depth near a third of the armhole (memory): the child's practice cap is near it (a fifth)", () => {
  const armhole = (draft(child).lengths.cap - inches(1)) / 2;
  const check = checked({
    length: child.length,
    biceps: child.biceps,
    hem: child.hem,
    capDepth: child.capDepth,
    armhole: { front: armhole, back: armhole },
  }).get("cap-third")!;
  expect(check).toMatchObject({ verdict: "good", mark: "memory" });
});
