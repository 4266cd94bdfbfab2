import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { degreesFromPrismDioptres, prismDioptres, prismDioptresByRule } from "@/lib/reflex/prism";
// Definition: 1 prism dioptre deviates by 1 unit in 100 units, P = 100·tan θ. Values computed with R.
import prism from "../../reference/optics-prism-dioptres.json";
// Rules of thumb: common practice, no source. Exact values beside them computed with R.
import rules from "../../reference/optics-rules-of-thumb.json";

const expectClose = (actual: number, expected: number) =>
  expect(Math.abs(actual - expected)).toBeLessThanOrEqual(1e-10 + 1e-9 * Math.abs(expected));

describe("prismDioptres", () => {
  it("gives 100·tan θ from 1° to 60°", () => {
    for (const [index, degrees] of prism.data.degrees.entries()) {
      expectClose(prismDioptres(degrees), prism.expected.prismDioptres[index] ?? Number.NaN);
    }
  });

  it("gives the exact value beside each rule of thumb", () => {
    for (const [degrees, dioptres] of Object.entries(rules.expected.prismDioptresOf)) {
      expectClose(prismDioptres(Number(degrees)), dioptres);
    }
  });

  it("keeps the sign and knows 0", () => {
    expect(prismDioptres(0)).toBe(0);
    expectClose(prismDioptres(-45), -100);
  });

  it("throws where no prism deviates so far", () => {
    for (const degrees of [90, -90, 180, Number.NaN, Number.POSITIVE_INFINITY]) {
      expect(() => prismDioptres(degrees)).toThrow(RangeError);
    }
  });
});

describe("degreesFromPrismDioptres", () => {
  it("gives the angle of 1 to 100 prism dioptres", () => {
    for (const { prismDioptres: dioptres, degrees } of prism.expected.degreesOfPrismDioptres) {
      expectClose(degreesFromPrismDioptres(dioptres), degrees);
    }
  });

  it("undoes prismDioptres", () => {
    fc.assert(
      fc.property(fc.double({ min: -89, max: 89, noNaN: true }), (degrees) => {
        expectClose(degreesFromPrismDioptres(prismDioptres(degrees)), degrees);
      }),
    );
  });

  it("throws on what is no number", () => {
    expect(() => degreesFromPrismDioptres(Number.NaN)).toThrow(RangeError);
  });
});

describe("prismDioptresByRule", () => {
  it("gives the taught 2Δ per degree", () => {
    const rule = rules.data.rules.find((candidate) => candidate.rule === "1 degree in prism dioptres");
    expect(prismDioptresByRule(1)).toBe(rule?.prismDioptres);
    expect(prismDioptresByRule(-15)).toBe(-30);
  });

  // From the notes of the reference file: 12.7% high at 1° is 100·(2 − 1.7455)/2; too low above 35°.
  it("is too high for small angles and too low for large ones", () => {
    expect((prismDioptresByRule(1) - prismDioptres(1)) / prismDioptresByRule(1)).toBeCloseTo(0.127, 3);
    expect(prismDioptresByRule(33)).toBeGreaterThan(prismDioptres(33));
    expect(prismDioptresByRule(35)).toBeLessThan(prismDioptres(35));
  });
});
