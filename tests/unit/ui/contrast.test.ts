import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";
import { dark, light, type Token } from "@/tailwind.config";

/** Relative luminance of a "#rrggbb" colour. Source: WCAG 2.2, definition of relative luminance (memory). */
const luminance = (hex: string): number => {
  const [r, g, b] = [1, 3, 5].map((at) => {
    const part = parseInt(hex.slice(at, at + 2), 16) / 255;
    return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4;
  }) as [number, number, number];
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
};

/** Contrast of two colours, 1 to 21. Source: WCAG 2.2, definition of contrast ratio (memory). */
const contrast = (a: string, b: string): number => {
  const [dim, bright] = [luminance(a), luminance(b)].sort((x, y) => x - y) as [number, number];
  return (bright + 0.05) / (dim + 0.05);
};

const surfaces: Token[] = ["paper", "card", "well"];
const texts: Token[] = ["ink", "soft", "chalk", "pin", "moss", "thread"];
const pairs: Array<[Token, Token]> = [
  ...texts.flatMap((text) => surfaces.map((surface): [Token, Token] => [text, surface])),
  ["onink", "ink"],
  ["onpin", "pin"],
];

describe("the measure itself", () => {
  // Closed forms: black on white is 21, a colour on itself 1; #777777 on white is 4.48 (calc, to two decimals).
  it("gives the known ratios", () => {
    expect(contrast("#000000", "#ffffff")).toBeCloseTo(21, 10);
    expect(contrast("#16203a", "#16203a")).toBe(1);
    expect(contrast("#777777", "#ffffff")).toBeCloseTo(4.48, 2);
  });
});

describe.each([
  ["light", light],
  ["dark", dark],
])("%s theme", (_name, theme: Record<Token, string>) => {
  it.each(Object.entries(theme))("%s is a full hex colour", (_token, hex) => {
    expect(hex).toMatch(/^#[0-9a-f]{6}$/);
  });

  // looks.md: text at 7 : 1.
  it.each(pairs)("%s on %s reads at 7 : 1", (text, surface) => {
    expect(contrast(theme[text], theme[surface])).toBeGreaterThanOrEqual(7);
  });

  // WCAG 2.2, 1.4.11 and 2.4.13: what bounds a control, and the ring of the focus, at 3 : 1 (memory).
  it.each(surfaces.flatMap((surface) => [["edge", surface] as const, ["chalk", surface] as const]))(
    "%s against %s shows at 3 : 1",
    (line, surface) => {
      expect(contrast(theme[line], theme[surface])).toBeGreaterThanOrEqual(3);
    },
  );

  // Text stands on the dotted paper too: the dots must not come near it.
  it.each(["ink", "soft", "chalk", "pin", "moss", "thread"] as const)(
    "%s still reads over a dot of the paper",
    (text) => {
      expect(contrast(theme[text], theme.dot)).toBeGreaterThanOrEqual(4.5);
    },
  );
});

describe("the style sheets", () => {
  const css = ["app/globals.css", "components/ui/ui.css", "components/shell/shell.css"]
    .map((file) => readFileSync(fileURLToPath(new URL(`../../../${file}`, import.meta.url)), "utf8"))
    .join("");

  it("uses no colour of its own but the shade under a sheet", () => {
    const bare = css.match(/#[0-9a-f]{3,8}\b|\b(?:rgb|hsl|oklch)a?\([^)]*\)/gi) ?? [];
    expect(bare).toEqual(["rgb(8 14 32 / 0.6)"]);
  });

  it("asks only for colours that both themes have", () => {
    const layout = new Set(["bar", "behind"]);
    const asked = [...css.matchAll(/var\(--([a-z]+)/g)]
      .map(([, name]) => name!)
      .filter((name) => !layout.has(name));
    expect(asked.length).toBeGreaterThan(10);
    for (const name of asked) expect(Object.keys(light)).toContain(name);
    expect(Object.keys(dark).sort()).toEqual(Object.keys(light).sort());
  });
});
