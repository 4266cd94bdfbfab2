import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { invertPositive, multiply } from "@/lib/statistics/matrix";
import { near } from "./near";

const matrix = (rows: number[][]) => rows.map((row) => Float64Array.from(row));

describe("invertPositive", () => {
  it("inverts by hand", () => {
    // det = 11
    expect(
      invertPositive(
        matrix([
          [4, 1],
          [1, 3],
        ]),
      )?.map((row) => [...row]),
    ).toEqual([
      [near(3 / 11), near(-1 / 11)],
      [near(-1 / 11), near(4 / 11)],
    ]);
  });

  it("gives back the unit matrix with what it inverted", () => {
    const entry = fc.integer({ min: -5, max: 5 });
    fc.assert(
      fc.property(fc.array(fc.array(entry, { minLength: 5, maxLength: 5 }), { minLength: 5, maxLength: 5 }), (rows) => {
        // AᵀA + I is positive definite whatever A.
        const positive = matrix(
          rows.map((_, i) =>
            rows.map((_, j) => (i === j ? 1 : 0) + rows.reduce((sum, row) => sum + (row[i] ?? 0) * (row[j] ?? 0), 0)),
          ),
        );
        const inverse = invertPositive(positive);
        positive.forEach((row, i) => {
          const product = multiply(inverse ?? [], row);
          expect([...product]).toEqual(rows.map((_, j) => near(i === j ? 1 : 0, 0, 1e-9)));
        });
      }),
    );
  });

  it("is undefined for a singular matrix, and for one that is singular but for rounding", () => {
    expect(
      invertPositive(
        matrix([
          [1, 2],
          [2, 4],
        ]),
      ),
    ).toBeUndefined();
    expect(
      invertPositive(
        matrix([
          [0.1, 0.3],
          [0.3, 0.9],
        ]),
      ),
    ).toBeUndefined();
    expect(
      invertPositive(
        matrix([
          [1, 2],
          [2, 1],
        ]),
      ),
    ).toBeUndefined();
  });
});
