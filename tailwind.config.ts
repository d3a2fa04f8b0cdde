import { type Config } from "tailwindcss";
import plugin from "tailwindcss/plugin";

/**
 * The colours, named from the table. One list for each theme; every pair of text on surface that is used is
 * measured in tests/unit/ui/contrast.test.ts.
 *
 * Surfaces: `paper` (marking paper, the page), `card` (manila, what lies on it), `well` (where one writes).
 * Text: `ink`, `soft` (second text), and the signs `chalk` (guides, links), `pin` (wrong), `moss` (good),
 * `thread` (look at this). `onink` is text on a surface of `ink`, `onpin` on one of `pin`.
 * Lines: `line` only decorates, `edge` bounds what can be touched, `dot` is the printed dot of the paper.
 */
export const light = {
  paper: "#fbf8f0",
  card: "#f6e7c1",
  well: "#fffdf8",
  ink: "#16203a",
  soft: "#3d4357",
  chalk: "#1b4488",
  pin: "#8a1220",
  moss: "#1f4d2b",
  thread: "#643a00",
  onink: "#fffaf0",
  onpin: "#fffaf0",
  line: "#d3bd8a",
  edge: "#7a673c",
  dot: "#d2cab6",
} as const;

export type Token = keyof typeof light;

/** Navy marking paper and white chalk. */
export const dark: Record<Token, string> = {
  paper: "#0c1630",
  card: "#172545",
  well: "#081022",
  ink: "#fbf7ec",
  soft: "#ccd3e4",
  chalk: "#a8c9ff",
  pin: "#ffb4ae",
  moss: "#a6dfb0",
  thread: "#f4cb7d",
  onink: "#0c1630",
  onpin: "#3a0509",
  line: "#34456c",
  edge: "#8b9cc4",
  dot: "#2c3d66",
};

const variables = (theme: Record<Token, string>) =>
  Object.fromEntries(Object.entries(theme).map(([name, value]) => [`--${name}`, value]));

const config: Config = {
  content: ["./app/**/*.{ts,tsx}", "./components/**/*.{ts,tsx}"],
  theme: {
    colors: {
      transparent: "transparent",
      current: "currentColor",
      inherit: "inherit",
      ...Object.fromEntries(Object.keys(light).map((name) => [name, `var(--${name})`])),
    },
    fontFamily: {
      sans: ['"Source Sans 3 Variable"', "system-ui", "sans-serif"],
      figure: ['"Bitter Variable"', "Georgia", "serif"],
    },
    // Nothing smaller than 1rem but `fine`, which is for the tab bar and the ticks of a tape alone.
    fontSize: {
      fine: ["0.875rem", { lineHeight: "1.25" }],
      sm: ["1rem", { lineHeight: "1.4" }],
      base: ["1.125rem", { lineHeight: "1.45" }],
      lg: ["1.3125rem", { lineHeight: "1.35" }],
      xl: ["1.625rem", { lineHeight: "1.2" }],
      "2xl": ["2rem", { lineHeight: "1.15" }],
      figure: ["clamp(2.25rem, 13vw, 2.75rem)", { lineHeight: "1" }],
      giant: ["clamp(2.75rem, 21vw, 4.75rem)", { lineHeight: "1" }],
    },
    borderRadius: { none: "0", DEFAULT: "0.25rem", lg: "0.5rem", full: "9999px" },
    extend: {
      spacing: { target: "2.75rem", key: "3.25rem" },
      maxWidth: { page: "42rem", wide: "80rem" },
    },
  },
  plugins: [
    plugin(({ addBase }) => {
      addBase({
        ":root": { ...variables(light), "color-scheme": "light" },
        "@media (prefers-color-scheme: dark)": {
          ":root:not([data-theme='light'])": { ...variables(dark), "color-scheme": "dark" },
        },
        ":root[data-theme='dark']": { ...variables(dark), "color-scheme": "dark" },
      });
    }),
  ],
};

export default config;
