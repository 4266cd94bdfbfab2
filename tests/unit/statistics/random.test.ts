import { describe, expect, it } from "vitest";
import { chiSquareCdf } from "@/lib/statistics/chi-square";
import { seededRandom } from "@/lib/statistics/random";
import { InputError } from "@/lib/statistics/result";

function draw(seed: number, count: number): number[] {
  const next = seededRandom(seed);
  return Array.from({ length: count }, next);
}

describe("seededRandom", () => {
  it("repeats itself for a seed and differs between neighbouring seeds", () => {
    expect(draw(7, 50)).toEqual(draw(7, 50));
    expect(draw(7, 50).filter((value, index) => value === draw(8, 50)[index])).toEqual([]);
    expect(draw(2 ** 40, 5)).not.toEqual(draw(0, 5));
  });

  it("stays the same from version to version, so that stored results can be repeated", () => {
    // Pinned from this implementation.
    expect(draw(1, 3)).toEqual([0.5636717735324055, 0.5851113414391875, 0.8959073920268565]);
  });

  it("fills [0, 1) evenly: χ² over 100 equal cells stays within its 0.001 and 0.999 quantiles", () => {
    const count = 200_000;
    for (const seed of [0, 1, 2, 12345]) {
      const values = draw(seed, count);
      expect(values.every((value) => value >= 0 && value < 1)).toBe(true);
      const cells = new Array<number>(100).fill(0);
      for (const value of values) cells[Math.floor(value * 100)] = (cells[Math.floor(value * 100)] ?? 0) + 1;
      const statistic = cells.reduce((sum, cell) => sum + (cell - count / 100) ** 2 / (count / 100), 0);
      expect(chiSquareCdf(statistic, 99)).toBeGreaterThan(0.001);
      expect(chiSquareCdf(statistic, 99)).toBeLessThan(0.999);
    }
  });

  it("draws successive numbers that are uncorrelated", () => {
    const values = draw(3, 100_000);
    const products = values.slice(1).map((value, index) => (value - 0.5) * ((values[index] ?? 0) - 0.5));
    const correlation = (12 * products.reduce((sum, value) => sum + value, 0)) / products.length;
    expect(Math.abs(correlation)).toBeLessThan(4 / Math.sqrt(products.length));
  });

  it.each([-1, 1.5, Number.NaN])("throws on %f as a seed", (seed) => {
    expect(() => seededRandom(seed)).toThrow(InputError);
  });
});
