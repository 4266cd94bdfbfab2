import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { limitsWithMean } from "@/lib/statistics/limits-with-mean";
import { InputError } from "@/lib/statistics/result";
import sbp from "../../reference/ba-sbp-1999.json"; // Bland & Altman 1999, table 1: first readings of J, R, S
import anxiety from "../../reference/irr-anxiety.json"; // R package irr 0.84, artificial data
import lesions from "../../reference/loam-ct-lesions-woo-2020.json"; // Woo et al. 2020: 10 lesions (cm), 13 observers
import dentists from "../../reference/loam-icc-dmfs-dentists.json"; // Fleiss 1986, used by Jones et al. 2011
import { arbitraryRatings } from "./arbitrary-ratings";
import { expectOk } from "./close-to";
import { near } from "./near";

const firstReadings = sbp.data.J.map((row, i) => [
  row[0] ?? null,
  sbp.data.R[i]?.[0] ?? null,
  sbp.data.S[i]?.[0] ?? null,
]);

describe("limitsWithMean", () => {
  // Estimate and interval were confirmed with the R package loamr.
  it.each([
    ["dentists", dentists.data.ratings, dentists.expected.loam],
    ["lesions", lesions.data.ratings, lesions.expected.loam],
    ["anxiety", anxiety.data.ratings, anxiety.expected.loam],
    ["blood pressure", firstReadings, sbp.expected.loamFirstReadings_J_R_S],
  ])("gives limit, interval and offsets of %s", (_, ratings, expected) => {
    expect(limitsWithMean(ratings)).toEqual({
      ok: true,
      n: expected.subjects,
      limit: { estimate: near(expected.loam), low: near(expected.ciLow), high: near(expected.ciHigh) },
      offsets: expected.observerOffsets.map((offset) => near(offset)),
    });
  });

  it("has no interval with one subject, and is a true 0 when all agree", () => {
    expect(limitsWithMean([[1, 3]])).toEqual({
      ok: true,
      n: 1,
      limit: { estimate: near(1.9599639845400543) },
      offsets: [-1, 1],
    });
    expect(
      limitsWithMean([
        [0.1, 0.1, 0.1],
        [0.7, 0.7, 0.7],
      ]),
    ).toMatchObject({ ok: true, limit: { estimate: 0, low: 0, high: 0 } });
  });

  it("uses complete rows only, and refuses when there is none or one observer", () => {
    expect(limitsWithMean([[1, 2], [null, 3], [4, 7], [5]])).toEqual(
      limitsWithMean([
        [1, 2],
        [4, 7],
      ]),
    );
    expect(limitsWithMean([])).toEqual({ ok: false, n: 0, reason: "no row is complete" });
    expect(
      limitsWithMean([
        [null, 1],
        [2, null],
      ]),
    ).toEqual({ ok: false, n: 0, reason: "no row is complete" });
    expect(limitsWithMean([[1], [2]])).toEqual({ ok: false, n: 2, reason: "fewer than two observers" });
  });

  it("takes another coverage and confidence", () => {
    const usual = expectOk(limitsWithMean(dentists.data.ratings)).limit;
    const half = expectOk(limitsWithMean(dentists.data.ratings, { coverage: 0.5 })).limit;
    expect(half.estimate).toEqual(near((usual.estimate * 0.6744897501960817) / 1.9599639845400543));
    expect(expectOk(limitsWithMean(dentists.data.ratings, { confidence: 0.5 })).limit.high).toBeLessThan(
      usual.high ?? 0,
    );
  });

  it("throws on bad numbers and shares", () => {
    expect(() => limitsWithMean([[1, Number.POSITIVE_INFINITY]])).toThrow(InputError);
    expect(() => limitsWithMean([[1, 2]], { coverage: 0 })).toThrow(InputError);
    expect(() => limitsWithMean([[1, 2]], { confidence: 1.2 })).toThrow(InputError);
  });

  it("stays when subjects move, scales with the unit, and leaves its input alone", () => {
    fc.assert(
      fc.property(arbitraryRatings(), (ratings) => {
        for (const row of ratings) Object.freeze(row);
        const before = limitsWithMean(Object.freeze(ratings));
        const after = limitsWithMean(
          ratings.map((row, i) => row.map((value) => (value === null ? null : 2 * value + 7 * i))),
        );
        expect(after.ok).toBe(before.ok);
        if (!before.ok || !after.ok) return;
        expect(after.limit.estimate).toEqual(near(2 * before.limit.estimate, 1e-9, 1e-6));
        expect(after.offsets).toEqual(before.offsets.map((offset) => near(2 * offset)));
      }),
    );
  });
});
