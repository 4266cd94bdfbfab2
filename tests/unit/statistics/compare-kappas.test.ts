import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { cohenKappa } from "@/lib/statistics/cohen-kappa";
import { compareKappas } from "@/lib/statistics/compare-kappas";
import { normalCdf } from "@/lib/statistics/normal";
import { InputError } from "@/lib/statistics/result";
import abstractors from "../../reference/gwet-table-3x3-abstractors.json";
import diagnosis from "../../reference/gwet-table-4x4-diagnosis.json";
import everitt from "../../reference/kappa-fleiss-cohen-everitt-1969.json";
import vision from "../../reference/kappa-vision-stuart-1953.json";
import { counts } from "./grid";
import { near, nearEstimate } from "./near";

const four = [
  { estimate: 0.62, standardError: 0.08 },
  { estimate: 0.55, standardError: 0.06 },
  { estimate: 0.71, standardError: 0.11 },
  { estimate: 0.4, standardError: 0.09 },
];

const kappa = fc.record({
  estimate: fc.double({ min: -1, max: 1, noNaN: true }),
  standardError: fc.double({ min: 0.01, max: 0.5, noNaN: true }),
});

describe("compareKappas", () => {
  it("pools by inverse variance and tests homogeneity", () => {
    // No printed example at hand: computed with Python (numpy, scipy.stats.chi2.sf) from Fleiss 1981's formulas.
    expect(compareKappas(four)).toEqual({
      ok: true,
      n: 4,
      pooled: {
        estimate: near(0.55881403631111),
        standardError: near(0.03952448157455963),
        low: near(0.4813474759173562),
        high: near(0.6362805967048639),
      },
      chiSquare: near(5.6093753891365505),
      df: 3,
      p: near(0.13224116192206714),
    });
  });

  it("takes whole results of cohenKappa", () => {
    // The kappas and errors of the reference files, pooled with Python as above.
    const tables = [everitt.data.table, vision.data.table, abstractors.data.table, diagnosis.data.table];
    expect(compareKappas(tables.map((table) => cohenKappa(table)))).toMatchObject({
      n: 4,
      pooled: { estimate: near(0.591504502029086), standardError: near(0.007081514557280531) },
      chiSquare: near(33.69951741556961),
      p: near(2.292724463077602e-7, 1e-9, 1e-16),
    });
  });

  it("leaves refused results out and does not count them", () => {
    const refused = cohenKappa(counts("5 0 | 0 0"));
    expect(compareKappas([refused, ...four, refused])).toEqual(compareKappas(four));
  });

  it("keeps its digits far into the tail", () => {
    const apart = [0.1, 0.9].map((estimate) => ({ estimate, standardError: 0.05 }));
    // scipy.stats.chi2.sf(128, 1)
    expect(compareKappas(apart)).toMatchObject({ chiSquare: near(128), p: near(1.1224297172982905e-29, 1e-9, 0) });
  });

  it("has nothing to test with one kappa", () => {
    expect(compareKappas(four.slice(0, 1))).toEqual({
      ok: true,
      n: 1,
      pooled: expect.objectContaining({ estimate: 0.62, standardError: near(0.08) }),
      chiSquare: 0,
      df: 0,
    });
  });

  it("says why kappas cannot be pooled", () => {
    expect(compareKappas([])).toEqual({ ok: false, n: 0, reason: "no kappa to compare" });
    expect(compareKappas([cohenKappa([])])).toEqual({ ok: false, n: 0, reason: "no kappa to compare" });
    const weightless = { ok: false, n: 5, reason: "a kappa without a standard error above 0" };
    expect(compareKappas([...four, { estimate: 1, standardError: 0 }])).toEqual(weightless);
    expect(compareKappas([...four, { estimate: 0.5 }])).toEqual(weightless);
    expect(compareKappas([...four, cohenKappa(counts("5 0 | 0 5"))])).toEqual(weightless);
  });

  it("for two kappas is the square of their difference over its error, and a two-sided normal test", () => {
    fc.assert(
      fc.property(kappa, kappa, (first, second) => {
        const z = (first.estimate - second.estimate) / Math.hypot(first.standardError, second.standardError);
        expect(compareKappas([first, second])).toMatchObject({
          chiSquare: near(z * z),
          p: near(2 * normalCdf(-Math.abs(z)), 1e-9, 1e-14),
        });
      }),
    );
  });

  it("is not changed by the order, and finds no difference among kappas moved to one value", () => {
    fc.assert(
      fc.property(fc.array(kappa, { minLength: 2, maxLength: 12 }), (kappas) => {
        const forward = compareKappas(Object.freeze(kappas));
        if (!forward.ok) throw new Error(forward.reason);
        expect(compareKappas(kappas.toReversed())).toMatchObject({
          pooled: nearEstimate(forward.pooled),
          chiSquare: near(forward.chiSquare),
        });
        const alike = compareKappas(kappas.map((one) => ({ ...one, estimate: 0.5 })));
        expect(alike).toMatchObject({ pooled: { estimate: near(0.5) }, chiSquare: near(0), p: near(1) });
      }),
    );
  });

  it.each([
    ["an estimate that is no number", { estimate: Number.NaN, standardError: 0.1 }],
    ["an endless estimate", { estimate: Number.POSITIVE_INFINITY, standardError: 0.1 }],
    ["a standard error that is no number", { estimate: 0.5, standardError: Number.NaN }],
    ["a negative standard error", { estimate: 0.5, standardError: -0.1 }],
  ])("refuses %s as the caller's mistake", (_, wrong) => {
    expect(() => compareKappas([...four, wrong])).toThrow(InputError);
  });

  it("refuses a confidence outside (0, 1)", () => {
    expect(() => compareKappas(four, { confidence: 1 })).toThrow(InputError);
  });
});
