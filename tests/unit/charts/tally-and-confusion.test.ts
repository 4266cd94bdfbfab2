import { describe, expect, it } from "vitest";
import { cellMix, usedCategories } from "@/components/charts/confusion";
import { tallyGroups } from "@/components/charts/tally";

describe("tallyGroups", () => {
  it("groups strokes in fives and never draws an empty group", () => {
    expect(tallyGroups(13)).toEqual([5, 5, 3]);
    expect(tallyGroups(5)).toEqual([5]);
    expect(tallyGroups(4)).toEqual([4]);
    expect(tallyGroups(0)).toEqual([]);
  });
  it("draws exactly one stroke a reading", () => {
    for (let n = 0; n < 60; n += 1) expect(tallyGroups(n).reduce((sum, g) => sum + g, 0)).toBe(n);
  });
});

describe("usedCategories", () => {
  it("keeps a category that occurs on one side only", () => {
    expect(
      usedCategories([
        [3, 0, 1, 0],
        [0, 0, 0, 0],
        [0, 0, 0, 0],
        [0, 0, 0, 2],
      ]),
    ).toEqual([0, 2, 3]);
  });
});

describe("cellMix", () => {
  it("grows with the share of the row", () => {
    for (const isAgreement of [true, false]) {
      for (let share = 0; share < 1; share += 0.01) {
        expect(cellMix(share + 0.01, isAgreement).percent).toBeGreaterThanOrEqual(cellMix(share, isAgreement).percent);
      }
    }
  });

  // The eight colours are those of the design: sheet, ink, on-ink, cobalt and tawny in the light and the dark theme.
  const themes = [
    { sheet: "#fbfcfa", ink: "#16211e", onInk: "#fbfcfa", cobalt: "#1d4c9c", tawny: "#94470a" },
    { sheet: "#171f1c", ink: "#e6ece8", onInk: "#101614", cobalt: "#93b8f4", tawny: "#f0a667" },
  ];
  it("leaves every count readable at 4.5 to 1 in both themes", () => {
    for (const theme of themes) {
      for (let share = 0.01; share <= 1; share += 0.01) {
        for (const isAgreement of [true, false]) {
          const { percent, isReversed } = cellMix(share, isAgreement);
          const background = mix(isAgreement ? theme.cobalt : theme.tawny, theme.sheet, percent / 100);
          expect(contrast(background, rgb(isReversed ? theme.onInk : theme.ink))).toBeGreaterThanOrEqual(4.5);
        }
      }
    }
  });
});

function rgb(hex: string): number[] {
  return [1, 3, 5].map((at) => Number.parseInt(hex.slice(at, at + 2), 16));
}

function mix(first: string, second: string, share: number): number[] {
  const other = rgb(second);
  return rgb(first).map((channel, i) => channel * share + (other[i] ?? 0) * (1 - share));
}

/** Contrast ratio by the formula of WCAG 2.2. */
function contrast(first: number[], second: number[]): number {
  const luminance = (channels: number[]) => {
    const [r = 0, g = 0, b = 0] = channels.map((c) => {
      const s = c / 255;
      return s <= 0.04045 ? s / 12.92 : ((s + 0.055) / 1.055) ** 2.4;
    });
    return 0.2126 * r + 0.7152 * g + 0.0722 * b;
  };
  const [darker = 0, lighter = 0] = [luminance(first), luminance(second)].sort((a, b) => a - b);
  return (lighter + 0.05) / (darker + 0.05);
}
