import type { Config } from "tailwindcss";

/** A colour whose value app/globals.css sets for light, dark and print. */
const token = (name: string) => `var(--${name})`;

const COLOURS = [
  ...["paper", "sheet", "sunk", "ink", "ink-2", "ink-3", "hair", "edge", "tick"],
  ...["cobalt", "cobalt-wash", "brass", "brass-dot", "brass-wash", "verdi", "verdi-wash"],
  ...["tawny", "tawny-wash", "oxide", "oxide-wash"],
  ...["on-ink", "glint", "lit", "lit-line", "on-lit", "lit-glint", "field", "on-field"],
  ...["sclera", "iris", "iris-2", "pupil", "limbus", "surface"],
];

/** The system faces stand last: they fill in while ours load, and Δ never reaches them. */
const stack = (face: string, ...system: string[]) => [token(`face-${face}`), token("face-delta"), ...system];

/**
 * Tokens of the look. Colours, type, radii and shadows replace Tailwind's own, so that nothing outside the design can be
 * written by accident. Of the spacing scale the design uses 1 2 3 4 6 8 12 16 (4 to 64 px).
 */
export default {
  theme: {
    colors: {
      ...Object.fromEntries(COLOURS.map((name) => [name, token(name)])),
      current: "currentColor",
      inherit: "inherit",
      transparent: "transparent",
    },
    fontFamily: {
      serif: stack("serif", "Iowan Old Style", "Palatino Linotype", "Georgia", "serif"),
      sans: stack("sans", "Segoe UI", "system-ui", "sans-serif"),
      mono: stack("mono", "ui-monospace", "Cascadia Mono", "Menlo", "monospace"),
    },
    // In rem, so that a larger text size set in the browser is followed.
    fontSize: {
      key: ["0.75rem", { lineHeight: "1" }],
      note: ["0.8125rem", { lineHeight: "1.45" }],
      small: ["0.875rem", { lineHeight: "1.45" }],
      table: ["0.9375rem", { lineHeight: "1.45" }],
      body: ["1rem", { lineHeight: "1.45" }],
      h3: ["1.125rem", { lineHeight: "1.2", letterSpacing: "-0.005em" }],
      standfirst: ["clamp(1.25rem, 1.1rem + 0.6vw, 1.375rem)", { lineHeight: "1.36" }],
      h2: ["1.5rem", { lineHeight: "1.12", letterSpacing: "-0.012em" }],
      h1: ["clamp(2rem, 4vw, 2.375rem)", { lineHeight: "1.12", letterSpacing: "-0.012em" }],
      title: ["clamp(2rem, 4.5vw, 2.875rem)", { lineHeight: "1.12", letterSpacing: "-0.012em" }],
      score: ["4.75rem", { lineHeight: "1", letterSpacing: "-0.03em" }],
      masthead: ["clamp(4rem, 9vw, 6.5rem)", { lineHeight: "0.92", letterSpacing: "-0.028em" }],
    },
    fontWeight: { normal: "400", medium: "500", semibold: "600" },
    borderRadius: { none: "0", tag: "2px", control: "4px", full: "9999px" },
    boxShadow: { none: "none", float: token("shadow") },
    extend: {
      spacing: { slim: "2.25rem", touch: "2.75rem", desk: "3.75rem", margin: token("page-margin") },
      maxWidth: { page: "90rem", read: "70ch", standfirst: "60ch" },
      transitionDuration: { quick: "120ms", calm: "200ms" },
    },
  },
} satisfies Config;
