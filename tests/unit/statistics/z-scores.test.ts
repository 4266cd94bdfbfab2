import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { InputError } from "@/lib/statistics/result";
import { zScores } from "@/lib/statistics/z-scores";
// ISO 13528:2015 annex C.3 and 9.4, scores against the robust mean and standard deviation; computed with R.
import reference from "../../reference/algorithm-a.json";
import { near } from "./near";

function scores(...args: Parameters<typeof zScores>) {
  const result = zScores(...args);
  if (!result.ok) throw new Error(result.reason);
  return result.scores;
}

const EXPECTED = new Map(Object.entries(reference.expected.cases));

describe("zScores", () => {
  it.each(reference.data.cases.filter(({ id }) => id !== "madZero"))("gives the scores of $id", ({ id, values }) => {
    const expected = EXPECTED.get(id);
    const given = scores(values, { assigned: expected?.mean ?? Number.NaN, sd: expected?.sd ?? Number.NaN });
    expect(given.map((score) => score?.z)).toEqual((expected?.zScores ?? []).map((z) => near(z, 1e-6)));
  });

  it("warns beyond 2 and asks for action beyond 3, on either side", () => {
    const states = scores([14, 14.1, 16, 16.1, 3.9, 6, 5.9], { assigned: 10, sd: 2 }).map((score) => score?.state);
    expect(states).toEqual(["in", "warning", "warning", "action", "action", "in", "warning"]);
  });

  it("allows for an uncertain assigned value: z′", () => {
    // ISO 13528:2015, 9.5: (x − assigned)/√(sd² + u²), here 10/√(9 + 16).
    expect(scores([20], { assigned: 10, sd: 3, uncertainty: 4 })).toEqual([{ z: 2, state: "in" }]);
    expect(scores([20], { assigned: 10, sd: 3 })).toEqual([{ z: near(10 / 3), state: "action" }]);
  });

  it("keeps the order and the gaps", () => {
    expect(zScores([null, 12, null, 8], { assigned: 10, sd: 2 })).toEqual({
      ok: true,
      n: 2,
      scores: [null, { z: 1, state: "in" }, null, { z: -1, state: "in" }],
    });
  });

  it("does not change when values and assigned value move together, and shrinks with uncertainty", () => {
    const values = fc
      .array(fc.option(fc.integer({ min: -45, max: 45 })), { minLength: 1 })
      .filter((all) => all.some((value) => value !== null));
    fc.assert(
      fc.property(values, fc.integer({ min: -100, max: 100 }), (data, shift) => {
        const plain = scores(Object.freeze(data), { assigned: 1, sd: 4 });
        expect(
          scores(
            data.map((value) => (value === null ? null : value + shift)),
            { assigned: 1 + shift, sd: 4 },
          ),
        ).toEqual(plain);
        scores(data, { assigned: 1, sd: 4, uncertainty: 3 }).forEach((score, index) => {
          expect(Math.abs(score?.z ?? 0)).toBeLessThanOrEqual(Math.abs(plain[index]?.z ?? 0));
        });
      }),
    );
  });

  it("refuses no values", () => {
    expect(zScores([], { assigned: 1, sd: 1 })).toEqual({ ok: false, n: 0, reason: "no values" });
    expect(zScores([null], { assigned: 1, sd: 1 })).toEqual({ ok: false, n: 0, reason: "no values" });
  });

  it.each([
    ["a value that is no number", [Number.NaN], { assigned: 0, sd: 1 }],
    ["an endless assigned value", [1], { assigned: Number.POSITIVE_INFINITY, sd: 1 }],
    ["an sd of 0", [1], { assigned: 0, sd: 0 }],
    ["a negative uncertainty", [1], { assigned: 0, sd: 1, uncertainty: -1 }],
    ["an endless uncertainty", [1], { assigned: 0, sd: 1, uncertainty: Number.POSITIVE_INFINITY }],
    ["no values, but an sd below 0", [], { assigned: 0, sd: -1 }],
  ])("throws on %s", (_, values, options) => {
    expect(() => zScores(values, options)).toThrow(InputError);
  });
});
