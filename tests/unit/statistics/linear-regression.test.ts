import { describe, expect, it } from "vitest";
import { fitLine } from "@/lib/statistics/linear-regression";
import { near } from "./near";

describe("fitLine", () => {
  it("gives the textbook line, its standard errors and p", () => {
    // By hand: Sxx 10, Sxy 6, residual sum of squares 2.4 on 3 degrees of freedom.
    const line = fitLine([1, 2, 3, 4, 5], [2, 4, 5, 4, 5], 0.95);
    expect(line).toMatchObject({
      slope: { estimate: near(0.6), standardError: near(Math.sqrt(0.08)) },
      intercept: { estimate: near(2.2), standardError: near(Math.sqrt(0.8 * 1.1)) },
    });
    // t = 0.6/√0.08 = 2.1213 on 3 degrees of freedom: P = 2 (1/2 − (θ + sin θ cos θ)/π), θ = atan(t/√3).
    const angle = Math.atan(0.6 / Math.sqrt(0.08) / Math.sqrt(3));
    expect(line?.p).toEqual(near(1 - (2 * (angle + Math.sin(angle) * Math.cos(angle))) / Math.PI));
  });

  it("has no standard error at two points and no test on an exact line", () => {
    expect(fitLine([1, 3], [2, 8], 0.95)).toEqual({ slope: { estimate: 3 }, intercept: { estimate: -1 } });
    const exact = fitLine([1, 2, 4], [0.1, 0.3, 0.7], 0.95);
    expect(exact).toMatchObject({ slope: { estimate: near(0.2), standardError: 0 } });
    expect(exact).not.toHaveProperty("p");
  });

  it("is undefined when x does not vary, also but for rounding", () => {
    expect(fitLine([2, 2, 2], [1, 2, 3], 0.95)).toBeUndefined();
    expect(fitLine([0.3, 0.1 + 0.2, 0.3], [1, 2, 3], 0.95)).toBeUndefined();
  });
});
