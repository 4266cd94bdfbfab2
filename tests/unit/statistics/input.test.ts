import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  completeRows,
  pairReadings,
  presentReadings,
  requireConfidence,
  requireFinite,
  requirePositive,
  requireWhole,
} from "@/lib/statistics/input";
import { InputError } from "@/lib/statistics/result";

describe("guards", () => {
  it.each([0, 1, -1, 95, Number.NaN])("refuse %f as a confidence", (confidence) => {
    expect(() => requireConfidence(confidence)).toThrow(InputError);
  });

  it("name the place of a bad number and let gaps pass", () => {
    expect(() => requireFinite([1, null, Number.NaN], "first")).toThrow("first[2]");
    expect(() => requireFinite([1, null, 3], "first")).not.toThrow();
  });

  it("refuse sizes that are not positive and counts that are not whole", () => {
    expect(() => requirePositive(0, "sd")).toThrow(InputError);
    expect(() => requirePositive(Number.POSITIVE_INFINITY, "sd")).toThrow(InputError);
    expect(() => requireWhole(2.5, "n", 1)).toThrow(InputError);
    expect(() => requireWhole(0, "n", 1)).toThrow(InputError);
    expect(() => requireWhole(1, "n", 1)).not.toThrow();
  });
});

describe("pairReadings", () => {
  it("drops the pair that has a gap, and shifts no other", () => {
    expect(pairReadings([1, null, 3, 4], [10, 20, null, 40])).toEqual([
      [1, 10],
      [4, 40],
    ]);
  });

  it("throws on unequal lengths, NaN and infinities", () => {
    expect(() => pairReadings([1, 2], [1])).toThrow(InputError);
    expect(() => pairReadings([Number.NaN], [1])).toThrow(InputError);
    expect(() => pairReadings([1], [Number.POSITIVE_INFINITY])).toThrow(InputError);
  });

  it("keeps every pair where index i is index i", () => {
    const reading = fc.option(fc.integer({ min: -45, max: 45 }));
    fc.assert(
      fc.property(fc.array(fc.tuple(reading, reading)), (rows) => {
        const kept = rows.filter(([a, b]) => a !== null && b !== null);
        expect(
          pairReadings(
            rows.map(([a]) => a),
            rows.map(([, b]) => b),
          ),
        ).toEqual(kept);
      }),
    );
  });
});

describe("presentReadings and completeRows", () => {
  it("leave gaps out without changing the input", () => {
    const values = [3, null, 5];
    expect(presentReadings(values, "values")).toEqual([3, 5]);
    expect(values).toEqual([3, null, 5]);
  });

  it("keep only rows in which every rater of the longest row rated", () => {
    expect(completeRows([[1, 2, 3], [4, null, 6], [7, 8], [], [9, 10, 11]])).toEqual([
      [1, 2, 3],
      [9, 10, 11],
    ]);
    expect(() => completeRows([[1, Number.NaN]])).toThrow(InputError);
  });
});
