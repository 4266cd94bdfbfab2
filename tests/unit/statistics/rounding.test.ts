import { describe, expect, it } from "vitest";
import { sumOfSquares, withoutCancellation, withoutRounding } from "@/lib/statistics/rounding";

describe("withoutRounding", () => {
  it("drops a part below 1e-12 of its total, and nothing larger", () => {
    expect(withoutRounding(0.9e-12, 1)).toBe(0);
    expect(withoutRounding(1.1e-12, 1)).toBe(1.1e-12);
    expect(withoutRounding(0, 0)).toBe(0);
  });
});

describe("withoutCancellation", () => {
  it("drops a spread below 1e-12 of the numbers it came from, and nothing larger", () => {
    expect(withoutCancellation(0.9e-24, 1)).toBe(0);
    expect(withoutCancellation(1.1e-24, 1)).toBe(1.1e-24);
  });
});

describe("sumOfSquares", () => {
  it("adds squares, none to 0", () => {
    expect(sumOfSquares([3, -4])).toBe(25);
    expect(sumOfSquares([])).toBe(0);
  });
});
