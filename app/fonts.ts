import localFont from "next/font/local";

// The loader reads these calls at build time, so every argument is spelt out. Upright and italic are loaded apart under
// one family name because preloading is decided per call, and only the upright faces are on every page; that name has to be
// the upright's constant, which is what its variable refers to. No size-adjusted system fallback is generated: it would
// stand before the Greek face in the stacks of tailwind.config.ts, and Δ would come from the system after all.

const newsreader = localFont({
  src: "../fonts/newsreader-latin-opsz-normal.woff2",
  weight: "200 800",
  style: "normal",
  display: "swap",
  variable: "--face-serif",
  adjustFontFallback: false,
  declarations: [{ prop: "font-family", value: "newsreader" }],
});

const newsreaderItalic = localFont({
  src: "../fonts/newsreader-latin-opsz-italic.woff2",
  weight: "200 800",
  style: "italic",
  display: "swap",
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: "font-family", value: "newsreader" }],
});

const atkinsonNext = localFont({
  src: "../fonts/atkinson-hyperlegible-next-latin-wght-normal.woff2",
  weight: "200 800",
  style: "normal",
  display: "swap",
  variable: "--face-sans",
  adjustFontFallback: false,
  declarations: [{ prop: "font-family", value: "atkinsonNext" }],
});

const atkinsonNextItalic = localFont({
  src: "../fonts/atkinson-hyperlegible-next-latin-wght-italic.woff2",
  weight: "200 800",
  style: "italic",
  display: "swap",
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: "font-family", value: "atkinsonNext" }],
});

const atkinsonMono = localFont({
  src: "../fonts/atkinson-hyperlegible-mono-latin-wght-normal.woff2",
  weight: "200 800",
  style: "normal",
  display: "swap",
  variable: "--face-mono",
  adjustFontFallback: false,
  declarations: [{ prop: "font-family", value: "atkinsonMono" }],
});

/** Only Δ, the prism dioptre. The range leaves out the increment sign U+2206, which looks alike and must not be used. */
const greek = localFont({
  src: "../fonts/source-sans-3-greek-wght-normal.woff2",
  weight: "200 900",
  style: "normal",
  display: "block",
  preload: false,
  variable: "--face-delta",
  adjustFontFallback: false,
  declarations: [
    { prop: "font-family", value: "greek" },
    { prop: "unicode-range", value: "U+0394" },
  ],
});

/** Classes for <html> that declare `--face-serif`, `--face-sans`, `--face-mono` and `--face-delta`. */
export const faceClasses = [newsreader, atkinsonNext, atkinsonMono, greek].map((face) => face.variable).join(" ");

// The italics are reached through the family name of their uprights; they are listed so that the loader keeps them.
export const italicFaces = [newsreaderItalic, atkinsonNextItalic];
