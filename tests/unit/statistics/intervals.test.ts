import { describe, expect, it } from "vitest";
import { normalInterval, studentInterval } from "@/lib/statistics/intervals";
import { expectClose } from "./close-to";

describe("normalInterval", () => {
  it("spans 1.96 standard errors each way at 95 percent", () => {
    const interval = normalInterval(10, 2, 0.95);
    expect(interval).toMatchObject({ estimate: 10, standardError: 2 });
    expectClose(interval.low, 10 - 2 * 1.9599639845400543);
    expectClose(interval.high, 10 + 2 * 1.9599639845400543);
  });

  it("leaves the interval out when there is no standard error", () => {
    expect(normalInterval(10, Number.NaN, 0.95)).toEqual({ estimate: 10 });
  });

  it("closes to the point when the standard error is a true 0", () => {
    expect(normalInterval(10, 0, 0.95)).toEqual({ estimate: 10, standardError: 0, low: 10, high: 10 });
  });
});

describe("studentInterval", () => {
  it("spans t standard errors each way", () => {
    // t at 4 degrees of freedom, 95 percent: 2.776 in printed tables.
    expectClose(studentInterval(0, 1, 4, 0.95).high, 2.7764451051977943);
  });

  it("keeps the standard error but no interval below one degree of freedom", () => {
    expect(studentInterval(3, 1, 0, 0.95)).toEqual({ estimate: 3, standardError: 1 });
    expect(studentInterval(3, Number.POSITIVE_INFINITY, 4, 0.95)).toEqual({ estimate: 3 });
  });
});
