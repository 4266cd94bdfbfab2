import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { limitsOfAgreement } from "@/lib/statistics/limits-of-agreement";
import { InputError } from "@/lib/statistics/result";
import giavarina from "../../reference/ba-giavarina-2015.json"; // Giavarina 2015, table 1: 30 pairs over a wide range
import pefr from "../../reference/ba-pefr-1986.json"; // Bland & Altman 1986, table I: peak flow, L/min, 17 people
import plasma from "../../reference/ba-plasma-volume-1999.json"; // Bland & Altman 1999, table 2: plasma volume, 99 people
import sbp from "../../reference/ba-sbp-1999.json"; // Bland & Altman 1999, table 1: blood pressure, mmHg, 85 people
import edges from "../../reference/edge-cases.json"; // constructed, computed with R
import { expectClose, expectOk } from "./close-to";
import { near } from "./near";

type Interval = { low: number; high: number };
type Expected = {
  n: number;
  bias: number;
  sd: number;
  lower: number;
  upper: number;
  seBias: number;
  biasCi: Interval;
  approx1999: { seLimit: number; lowerCi: Interval; upperCi: Interval };
  exactIndividual?: { lowerCi: Interval; upperCi: Interval };
  proportionalBias: {
    intercept: number;
    slope: number;
    seSlope: number;
    slopeCiLow: number;
    slopeCiHigh: number;
    p: number;
  };
  percentiles: { type6: { p2_5: number; p97_5: number } };
};

const nearInterval = ({ low, high }: Interval, relative = 1e-9) => ({
  low: near(low, relative),
  high: near(high, relative),
});

const log = (values: number[]) => values.map(Math.log);
const column = (rows: number[][], index: number) => rows.map((row) => row[index] ?? Number.NaN);
const three = edges.data.cases.find(({ id }) => id === "blandAltmanThreePairs");

const published: [string, number[], number[], Expected][] = [
  ["peak flow (1986)", pefr.data.x, pefr.data.y, pefr.expected.firstReadings],
  ["a wide range (Giavarina 2015)", giavarina.data.x, giavarina.data.y, giavarina.expected],
  ["plasma volume (1999)", plasma.data.Nadler, plasma.data.Hurley, plasma.expected.raw],
  ["plasma volume, logarithms (1999)", log(plasma.data.Nadler), log(plasma.data.Hurley), plasma.expected.logScale],
  ["pressure, S − J (1999)", column(sbp.data.S, 0), column(sbp.data.J, 0), sbp.expected.firstReadings_S_minus_J],
  ["pressure, J − R (1999)", column(sbp.data.J, 0), column(sbp.data.R, 0), sbp.expected.firstReadings_J_minus_R],
  ["three pairs", three?.x ?? [], three?.y ?? [], edges.expected.cases.blandAltmanThreePairs],
];

describe("limitsOfAgreement on published data", () => {
  it.each(published)("gives bias, SD, limits and intervals of %s", (_, first, second, expected) => {
    expect(limitsOfAgreement(first, second)).toMatchObject({
      ok: true,
      n: expected.n,
      bias: {
        estimate: near(expected.bias),
        standardError: near(expected.seBias),
        ...nearInterval(expected.biasCi),
      },
      sd: near(expected.sd),
      lower: {
        estimate: near(expected.lower),
        standardError: near(expected.approx1999.seLimit),
        ...nearInterval(expected.approx1999.lowerCi),
      },
      upper: {
        estimate: near(expected.upper),
        standardError: near(expected.approx1999.seLimit),
        ...nearInterval(expected.approx1999.upperCi),
      },
    });
  });

  // Carkeet 2015; the values were confirmed with scipy's noncentral t. 1e-6 is the tolerance of the files.
  const exact = published.flatMap(([name, first, second, { exactIndividual }]) =>
    exactIndividual ? [[name, first, second, exactIndividual] as const] : [],
  );
  it.each(exact)("gives the exact intervals of %s", (_, first, second, { lowerCi, upperCi }) => {
    expect(limitsOfAgreement(first, second)).toMatchObject({
      exact: { lower: nearInterval(lowerCi, 1e-6), upper: nearInterval(upperCi, 1e-6) },
    });
  });

  it.each(published)("gives the slope of difference on mean of %s", (_, first, second, { proportionalBias: line }) => {
    expect(limitsOfAgreement(first, second)).toMatchObject({
      proportional: {
        slope: {
          estimate: near(line.slope),
          standardError: near(line.seSlope),
          low: near(line.slopeCiLow),
          high: near(line.slopeCiHigh),
        },
        intercept: { estimate: near(line.intercept) },
        p: near(line.p, 1e-9, 1e-16),
      },
    });
  });

  it.each(published)("gives the percentiles of %s", (_, first, second, { percentiles }) => {
    expect(limitsOfAgreement(first, second)).toMatchObject({
      percentiles: { lower: near(percentiles.type6.p2_5), upper: near(percentiles.type6.p97_5) },
    });
  });

  it("reproduces what the papers print", () => {
    // Bland & Altman 1986: -2.1 (-22.0 to 17.8), SD 38.8, SE 9.4. Their limits use 2 SD and are not compared.
    const { data } = pefr;
    expect(limitsOfAgreement(data.x, data.y)).toMatchObject({
      bias: { estimate: near(-2.1, 0, 0.05), low: near(-22, 0, 0.05), high: near(17.8, 0, 0.05) },
      sd: near(38.8, 0, 0.05),
    });
    // Giavarina 2015: -27.17 (-40.16 to -14.17), SD 34.81, limits -95.39 and 41.05.
    expect(limitsOfAgreement(giavarina.data.x, giavarina.data.y)).toMatchObject({
      bias: { estimate: near(-27.17, 0, 0.005), low: near(-40.16, 0, 0.005), high: near(-14.17, 0, 0.005) },
      lower: { estimate: near(-95.39, 0, 0.005) },
      upper: { estimate: near(41.05, 0, 0.005) },
    });
    // Bland & Altman 1999, S − J: 16.29, SD 19.61, limits -22.1 and 54.7.
    expect(limitsOfAgreement(column(sbp.data.S, 0), column(sbp.data.J, 0))).toMatchObject({
      bias: { estimate: near(16.29, 0, 0.005) },
      sd: near(19.61, 0, 0.005),
      lower: { estimate: near(-22.1, 0, 0.05) },
      upper: { estimate: near(54.7, 0, 0.05) },
    });
    // Bland & Altman 1999, plasma volume as ratios: 1.06 and 1.15.
    const ratio = expectOk(limitsOfAgreement(log(plasma.data.Nadler), log(plasma.data.Hurley)));
    expect(Math.exp(ratio.lower.estimate)).toBeCloseTo(1.06, 2);
    expect(Math.exp(ratio.upper.estimate)).toBeCloseTo(1.15, 2);
  });
});

describe("limitsOfAgreement", () => {
  it("refuses fewer than three pairs, gaps counted", () => {
    const reason = "fewer than three pairs";
    expect(limitsOfAgreement([], [])).toEqual({ ok: false, n: 0, reason });
    expect(limitsOfAgreement([5], [3])).toEqual({ ok: false, n: 1, reason });
    expect(limitsOfAgreement([5, 9], [3, 8])).toEqual({ ok: false, n: 2, reason });
    expect(limitsOfAgreement([5, null, 9, 1], [3, 1, 8, null])).toEqual({ ok: false, n: 2, reason });
  });

  it("says that the same difference everywhere is a width of 0, and leaves out what that makes undefined", () => {
    const point = { estimate: 1, standardError: 0, low: 1, high: 1 };
    expect(limitsOfAgreement([5, 6, 7], [4, 5, 6])).toEqual({
      ok: true,
      n: 3,
      bias: point,
      sd: 0,
      lower: point,
      upper: point,
      exact: { lower: { low: 1, high: 1 }, upper: { low: 1, high: 1 } },
      proportional: { slope: { estimate: 0, standardError: 0, low: 0, high: 0 }, intercept: point },
      percentiles: { lower: 1, median: 1, upper: 1 },
    });
    // 0.1 more each time, which floating point does not hold exactly.
    expect(limitsOfAgreement([0.2, 0.4, 0.8], [0.1, 0.3, 0.7])).toMatchObject({ sd: 0 });
  });

  it("leaves the slope out when the means do not vary", () => {
    const result = expectOk(limitsOfAgreement([1, 2, 3], [3, 2, 1]));
    expect(result.proportional).toBeUndefined();
    expect(result.sd).toBe(2);
  });

  it("gives a constant column its limits", () => {
    expect(limitsOfAgreement([2, 2, 2, 2], [1, 2, 3, 2])).toMatchObject({
      ok: true,
      n: 4,
      bias: { estimate: 0 },
      sd: near(Math.sqrt(2 / 3)),
    });
  });

  it("narrows and widens with coverage and confidence, by quantiles other than 1.96", () => {
    const { x, y } = pefr.data;
    const { bias, sd, ...half } = expectOk(limitsOfAgreement(x, y, { coverage: 0.5 }));
    expectClose(half.upper.estimate, bias.estimate + 0.6744897501960817 * sd);
    // Sorted: -81 -43 -35 -24 -24 -18 -15 -12 -8 -4 1 6 7 30 49 62 73; ranks 4.5 and 13.5 of 18.
    expect(half.percentiles).toEqual({ lower: near(-24), median: near(-8), upper: near(18.5) });
    // t at 16 degrees of freedom for 80 percent, 1.337 in printed tables.
    const loose = expectOk(limitsOfAgreement(x, y, { confidence: 0.8 }));
    expect(loose.bias.high).toEqual(near(bias.estimate + 1.337 * (bias.standardError ?? 0), 1e-3));
  });

  it("gives exact limits at 10,000 cases, close to the large-sample ones", () => {
    const first = Array.from({ length: 10_000 }, (_, i) => Math.sin(i) + Math.cos(1.7 * i));
    const { exact, upper } = expectOk(limitsOfAgreement(first, new Array<number>(10_000).fill(0)));
    expect(exact.upper.low).toEqual(near(upper.low ?? Number.NaN, 2e-3));
    expect(exact.upper.high).toEqual(near(upper.high ?? Number.NaN, 2e-3));
  });

  it("throws on what cannot be paired or is no share", () => {
    expect(() => limitsOfAgreement([1, 2, 3], [1, 2])).toThrow(InputError);
    expect(() => limitsOfAgreement([1, 2, Number.NaN], [1, 2, 3])).toThrow(InputError);
    expect(() => limitsOfAgreement([1, 2, 3], [1, Number.POSITIVE_INFINITY, 3])).toThrow(InputError);
    expect(() => limitsOfAgreement([1, 2, 3], [1, 2, 4], { confidence: 95 })).toThrow(InputError);
    expect(() => limitsOfAgreement([1, 2, 3], [1, 2, 4], { coverage: 1 })).toThrow(InputError);
  });
});

const degrees = fc.integer({ min: -45, max: 45 });
const pairs = fc.array(fc.tuple(degrees, degrees), { minLength: 3, maxLength: 40 });
const split = (rows: [number | null, number | null][]) => [rows.map(([a]) => a), rows.map(([, b]) => b)] as const;

describe("limitsOfAgreement, whatever the readings", () => {
  it("moves with a shift of one of the two, and keeps its width", () => {
    fc.assert(
      fc.property(pairs, degrees, (rows, shift) => {
        const [first, second] = split(rows);
        const before = expectOk(limitsOfAgreement(first, second));
        const after = expectOk(
          limitsOfAgreement(
            first.map((value) => (value ?? 0) + shift),
            second,
          ),
        );
        expect(after.sd).toEqual(near(before.sd));
        expect(after.bias.estimate).toEqual(near(before.bias.estimate + shift));
        expect(after.lower.estimate).toEqual(near(before.lower.estimate + shift));
        expect(after.upper.high).toEqual(near((before.upper.high ?? 0) + shift));
        expect(after.exact.lower.low).toEqual(near(before.exact.lower.low + shift));
        expect(after.percentiles.median).toEqual(near(before.percentiles.median + shift));
      }),
    );
  });

  it("mirrors when the two change places", () => {
    fc.assert(
      fc.property(pairs, (rows) => {
        const [first, second] = split(rows);
        const one = expectOk(limitsOfAgreement(first, second));
        const other = expectOk(limitsOfAgreement(second, first));
        expect(other.bias.estimate).toEqual(near(-one.bias.estimate));
        expect(other.lower.estimate).toEqual(near(-one.upper.estimate));
        expect(other.exact.lower.low).toEqual(near(-one.exact.upper.high));
        expect(other.percentiles.lower).toEqual(near(-one.percentiles.upper));
        expect(other.proportional?.slope.estimate ?? 0).toEqual(near(-(one.proportional?.slope.estimate ?? 0)));
      }),
    );
  });

  it("answers the same whether a pair with a gap is there or not, and leaves its input alone", () => {
    const gap = fc.constantFrom<[number | null, number | null]>([null, 7], [3, null], [null, null]);
    fc.assert(
      fc.property(pairs, gap, fc.nat(), (rows, hole, place) => {
        const withHole: [number | null, number | null][] = [...rows];
        withHole.splice(place % (rows.length + 1), 0, hole);
        const [first, second] = split(withHole);
        Object.freeze(first);
        Object.freeze(second);
        expect(limitsOfAgreement(first, second)).toEqual(limitsOfAgreement(...split(rows)));
      }),
    );
  });
});
