import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { InputError } from "@/lib/statistics/result";
import { robustLocationScale } from "@/lib/statistics/robust-location-scale";
// ISO 13528:2015 annex C.3: creosote of ISO 5725-5:1998, copper of the Analytical Methods Committee 1989, and constructed
// cases; computed with R, copper confirmed with hubers() of the R package MASS.
import reference from "../../reference/algorithm-a.json";
import { near } from "./near";

const { cases } = reference.data;
const EXPECTED = new Map(Object.entries(reference.expected.cases));

function estimate(values: readonly (number | null)[]) {
  const result = robustLocationScale(values);
  if (!result.ok) throw new Error(result.reason);
  return result;
}

describe("robustLocationScale", () => {
  it.each(cases.filter(({ id }) => id !== "madZero"))("gives mean, sd and uncertainty of $id", ({ id, values }) => {
    const expected = EXPECTED.get(id);
    expect(robustLocationScale(values)).toEqual({
      ok: true,
      n: expected?.n,
      location: near(expected?.mean ?? Number.NaN),
      scale: near(expected?.sd ?? Number.NaN),
      uncertainty: near(expected && "uncertainty" in expected ? expected.uncertainty : Number.NaN),
    });
  });

  it("comes near the published Huber estimates of copper, whose scale factor has more digits", () => {
    const copper = estimate(cases.find(({ id }) => id === "copper")?.values ?? []);
    expect(copper.location).toBeCloseTo(reference.published.copperHuber.mean, 3);
    expect(copper.scale).toBeCloseTo(reference.published.copperHuber.sd, 2);
  });

  it("says that it cannot start where more than half of the values are the same", () => {
    const madZero = cases.find(({ id }) => id === "madZero")?.values ?? [];
    expect(robustLocationScale(madZero)).toEqual({
      ok: false,
      n: 7,
      reason: "more than half of the values are the same",
    });
    expect(robustLocationScale([4])).toMatchObject({ ok: false, n: 1 });
    // 0.1 + 0.2 differs from 0.3 by rounding alone.
    expect(robustLocationScale([0.1 + 0.2, 0.3, 0.1 + 0.2, 0.3, 5])).toMatchObject({ ok: false, n: 5 });
    expect(robustLocationScale([1, 5, 5, 9])).toMatchObject({ ok: true, location: 5 }); // half alone is no hindrance
  });

  it("refuses no values", () => {
    expect(robustLocationScale([])).toEqual({ ok: false, n: 0, reason: "no values" });
    expect(robustLocationScale([null])).toEqual({ ok: false, n: 0, reason: "no values" });
  });

  it("follows a change of unit and origin, and is not moved by how far off a wild value is", () => {
    const values = fc.uniqueArray(fc.integer({ min: -50, max: 50 }), { minLength: 4, maxLength: 20 });
    fc.assert(
      fc.property(values, fc.integer({ min: -900, max: 900 }), fc.constantFrom(0.125, 2, 7), (data, shift, unit) => {
        const plain = estimate(data);
        const changed = estimate(data.map((value) => value * unit + shift));
        expect(changed.location).toBeCloseTo(plain.location * unit + shift, 7);
        expect(changed.scale).toBeCloseTo(plain.scale * unit, 7);
        const wild = estimate([...data, 1e4]);
        const wilder = estimate([...data, 1e9]);
        expect(wilder.location).toEqual(near(wild.location, 1e-6, 1e-6));
        expect(wilder.scale).toEqual(near(wild.scale, 1e-6));
      }),
    );
  });

  it("leaves missing values out and its input as it was", () => {
    const values = Object.freeze([24.14, null, 20.155, 19.5, null, 20.3]);
    expect(robustLocationScale(values)).toEqual(robustLocationScale([24.14, 20.155, 19.5, 20.3]));
  });

  it("keeps its digits far from 0", () => {
    const { location, scale } = estimate([9.8, 10.1, 10, 9.9, 10.2, 10.05, 9.95, 10.15].map((value) => value + 1e6));
    expect(location - 1e6).toBeCloseTo(10.01875, 8);
    expect(scale).toBeCloseTo(0.151347584222544, 8);
  });

  it("throws on values that are not finite", () => {
    expect(() => robustLocationScale([1, Number.NaN, 2])).toThrow(InputError);
    expect(() => robustLocationScale([1, Number.POSITIVE_INFINITY, 2])).toThrow(InputError);
  });
});
