import { describe, expect, it } from "vitest";
import { coverageFactor } from "@/lib/statistics/coverage-factor";
import { near } from "./near";

describe("coverageFactor", () => {
  it("is the printed 1.96 at 0.95, and the normal quantile elsewhere", () => {
    expect(coverageFactor(0.95)).toBe(1.96);
    // Printed tables: 1.6449 at 90 percent, 2.5758 at 99.
    expect(coverageFactor(0.9)).toEqual(near(1.6448536269514722));
    expect(coverageFactor(0.99)).toEqual(near(2.575829303548901));
  });
});
