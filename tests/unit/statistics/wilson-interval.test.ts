import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { InputError } from "@/lib/statistics/result";
import { wilsonInterval } from "@/lib/statistics/wilson-interval";
import wilson from "../../reference/wilson-interval.json"; // Newcombe 1998, table I, method 3; others computed with R
import { expectOk } from "./close-to";
import { near } from "./near";

describe("wilsonInterval", () => {
  it.each(wilson.expected.cases)("gives the interval of $x out of $n", ({ x, n, p, low, high }) => {
    expect(wilsonInterval(x, n)).toEqual({ ok: true, n, estimate: near(p), low: near(low), high: near(high) });
  });

  it.each(Object.entries(wilson.published))(
    "reproduces the printed interval of %s",
    (fraction, [low = 0, high = 0]) => {
      const [count = 0, n = 0] = fraction.split("/").map(Number);
      expect(wilsonInterval(count, n)).toMatchObject({ low: near(low, 0, 0.00005), high: near(high, 0, 0.00005) });
    },
  );

  it("ends exactly at 0 and 1", () => {
    expect(wilsonInterval(0, 20)).toMatchObject({ estimate: 0, low: 0 });
    expect(wilsonInterval(20, 20)).toMatchObject({ estimate: 1, high: 1 });
  });

  it("refuses nothing out of nothing, and throws on impossible counts", () => {
    expect(wilsonInterval(0, 0)).toEqual({ ok: false, n: 0, reason: "nothing was counted" });
    expect(() => wilsonInterval(5, 4)).toThrow(InputError);
    expect(() => wilsonInterval(1, 0)).toThrow(InputError);
    expect(() => wilsonInterval(-1, 4)).toThrow(InputError);
    expect(() => wilsonInterval(0.5, 4)).toThrow(InputError);
    expect(() => wilsonInterval(Number.NaN, 4)).toThrow(InputError);
    expect(() => wilsonInterval(1, 4, { confidence: 1 })).toThrow(InputError);
  });

  it("mirrors when what is counted and what is not change places, and holds the share inside", () => {
    fc.assert(
      fc.property(fc.nat(300), fc.nat(300), fc.constantFrom(0.8, 0.95, 0.99), (count, rest, confidence) => {
        if (count + rest === 0) return;
        const one = expectOk(wilsonInterval(count, count + rest, { confidence }));
        const other = expectOk(wilsonInterval(rest, count + rest, { confidence }));
        expect(other.low).toEqual(near(1 - (one.high ?? 0)));
        expect(one.low).toBeLessThanOrEqual(one.estimate);
        expect(one.high).toBeGreaterThanOrEqual(one.estimate);
      }),
    );
  });
});
