import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";

type Theme = "light" | "dark";
const css = readFileSync(new URL("../../../app/globals.css", import.meta.url), "utf8");
const [light = "", dark = ""] = css.slice(css.indexOf(":root {")).split("@variant dark {");

/** The value of a token in a theme; the dark one states only what differs. */
function colour(theme: Theme, token: string): string {
  const find = (block: string) => new RegExp(`--${token}: (#[0-9a-f]{6});`).exec(block)?.[1];
  const value = (theme === "dark" ? find(dark.slice(0, dark.indexOf("}"))) : undefined) ?? find(light);
  if (!value) throw new Error(`No colour ${token}`);
  return value;
}

/** Relative luminance and contrast as WCAG 2.2 defines them. */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const share = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}
function contrast(theme: Theme, first: string, second: string): number {
  const [low = 0, high = 0] = [colour(theme, first), colour(theme, second)].map(luminance).sort((a, b) => a - b);
  return (high + 0.05) / (low + 0.05);
}

const TEXT = ["ink", "ink-2", "ink-3", "cobalt", "brass", "verdi", "tawny", "oxide"];
const WASHES = ["cobalt", "brass", "verdi", "tawny", "oxide"];
const MARKS = ["edge", "brass-dot"];

describe.each(["light", "dark"] as const)("the %s theme", (theme) => {
  it("agrees with the formula on black and white", () => {
    expect((luminance("#ffffff") + 0.05) / (luminance("#000000") + 0.05)).toBeCloseTo(21, 10);
  });
  it.each(TEXT)("sets %s readable on page and sheet (4.5, WCAG 1.4.3)", (token) => {
    expect(contrast(theme, token, "paper")).toBeGreaterThanOrEqual(4.5);
    expect(contrast(theme, token, "sheet")).toBeGreaterThanOrEqual(4.5);
  });
  it.each(WASHES)("sets %s, ink and secondary ink readable on its wash", (token) => {
    for (const text of [token, "ink", "ink-2"]) {
      expect(contrast(theme, text, `${token}-wash`)).toBeGreaterThanOrEqual(4.5);
    }
  });
  it.each(MARKS)("keeps %s visible as a mark (3, WCAG 1.4.11)", (token) => {
    expect(contrast(theme, token, "paper")).toBeGreaterThanOrEqual(3);
    expect(contrast(theme, token, "sheet")).toBeGreaterThanOrEqual(3);
  });
  it("keeps text readable on a main button, a lit choice and the viewing field, and the glints visible", () => {
    expect(contrast(theme, "on-ink", "ink")).toBeGreaterThanOrEqual(4.5);
    expect(contrast(theme, "on-lit", "lit")).toBeGreaterThanOrEqual(4.5);
    expect(contrast(theme, "on-field", "field")).toBeGreaterThanOrEqual(4.5);
    expect(contrast(theme, "glint", "ink")).toBeGreaterThanOrEqual(3);
    expect(contrast(theme, "lit-glint", "lit")).toBeGreaterThanOrEqual(3);
  });
});

it("shows photographs on the same field in both themes", () => {
  expect(colour("dark", "field")).toBe(colour("light", "field"));
});
