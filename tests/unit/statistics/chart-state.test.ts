import { describe, expect, it } from "vitest";
import { chartState } from "@/lib/statistics/chart-state";

describe("chartState", () => {
  it("asks for action strictly beyond the limit and warns strictly beyond two thirds of it", () => {
    expect([0, 2, 2.001, 3, 3.001, 40].map((distance) => chartState(distance, 3))).toEqual([
      "in",
      "in",
      "warning",
      "warning",
      "action",
      "action",
    ]);
  });

  it("takes a point on a limit for on it, though rounding puts it a hair beyond", () => {
    const distance = 53.3 - 50;
    expect(chartState(0.1 + 0.2, 0.3)).toBe("warning");
    expect(chartState(distance * (1 + 2e-16), distance)).toBe("warning");
    expect(chartState(0.2 + 0.4, 0.9)).toBe("in");
  });

  it("finds a point on target in control where the limits have no width yet", () => {
    expect(chartState(0, 0)).toBe("in");
  });
});
