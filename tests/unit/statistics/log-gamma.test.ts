import { describe, expect, it } from "vitest";
import { deviance, logGamma, stirlingError } from "@/lib/statistics/log-gamma";
import { expectClose } from "./close-to";

describe("logGamma", () => {
  // Computed with mpmath 1.3 at 40 digits.
  it.each([
    [0.1, 2.252712651734206],
    [0.5, 0.5723649429247001],
    [2.5, 0.2846828704729192],
    [10, 12.801827480081469],
    [1234.5, 7550.550901077895],
    [1e7, 151180949.3694739],
  ])("is right to 14 digits at %f", (x, expected) => {
    expectClose(logGamma(x), expected, 1e-14, 0);
  });

  it("gives the logarithms of factorials", () => {
    let factorial = 1;
    for (let n = 1; n <= 20; n += 1) {
      factorial *= n;
      expectClose(logGamma(n + 1), Math.log(factorial), 1e-14, 1e-14);
    }
  });

  it("keeps the small remainder of Stirling's formula where the logarithms themselves are huge", () => {
    expectClose(stirlingError(1e9), 1 / 12e9, 1e-15, 0);
  });
});

describe("deviance", () => {
  it("is zero at its middle and agrees with its definition far from it", () => {
    expect(deviance(7, 7)).toBe(0);
    expectClose(deviance(2, 9), 2 * Math.log(2 / 9) + 7, 1e-15);
  });

  it("keeps its digits close to the middle, where the definition cancels", () => {
    // First terms of the series in e = x/m - 1 at m = 1e6: m (e²/2 - e³/6 + e⁴/12).
    const e = 1e-5;
    expectClose(deviance(1e6 * (1 + e), 1e6), 1e6 * (e ** 2 / 2 - e ** 3 / 6 + e ** 4 / 12), 1e-9, 0);
  });
});
