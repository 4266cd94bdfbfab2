import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { concordance } from "@/lib/statistics/concordance";
import { InputError } from "@/lib/statistics/result";
import pefr from "../../reference/ba-pefr-1986.json"; // Bland & Altman 1986, table I
import sbp from "../../reference/ba-sbp-1999.json"; // Bland & Altman 1999, table 1
import cases from "../../reference/ccc-cases.json"; // constructed: shift, change of scale, noise, inverse
import edges from "../../reference/edge-cases.json"; // constructed, computed with R
import { expectOk } from "./close-to";
import { near } from "./near";

const column = (rows: number[][]) => rows.map((row) => row[0] ?? null);
const constructed = (id: "shifted" | "scaled" | "noisy" | "inverse") => {
  const { x, y } = cases.data.cases.find((entry) => entry.id === id) ?? { x: [], y: [] };
  return [id, x, y, cases.expected.cases[id]] as const;
};

describe("concordance", () => {
  // Lin 1989 and 2000; the values were confirmed with R epiR 2.0.57 epi.ccc().
  it.each([
    constructed("shifted"),
    constructed("scaled"),
    constructed("noisy"),
    constructed("inverse"),
    ["peak flow", pefr.data.x, pefr.data.y, pefr.expected.ccc] as const,
    ["blood pressure", column(sbp.data.S), column(sbp.data.J), sbp.expected.cccFirstReadings_S_J] as const,
  ])("gives rho, standard error and interval of %s", (_, first, second, expected) => {
    expect(concordance([...first], [...second])).toEqual({
      ok: true,
      n: expected.n,
      rho: {
        estimate: near(expected.ccc),
        standardError: near(expected.se),
        low: near(expected.ciLowZ),
        high: near(expected.ciHighZ),
      },
    });
  });

  it("is 1 or −1 without an interval on the line of identity or its mirror", () => {
    expect(concordance([3, 1, 4, 1, 5], [3, 1, 4, 1, 5])).toEqual({ ok: true, n: 5, rho: { estimate: 1 } });
    expect(concordance([0.1, 0.2, 0.7], [0.1, 0.2, 0.7])).toEqual({ ok: true, n: 3, rho: { estimate: 1 } });
    expect(concordance([0.1, 0.2, 0.6], [0.5, 0.4, 0])).toEqual({ ok: true, n: 3, rho: { estimate: -1 } });
  });

  it("is 0 without an interval when a column is constant, and refused when all is the same", () => {
    const { x = [], y = [] } = edges.data.cases.find(({ id }) => id === "cccConstant") ?? {};
    expect(concordance(x, y)).toEqual({ ok: true, n: 4, rho: { estimate: edges.expected.cases.cccConstant.ccc } });
    expect(concordance([1, 1, 1], [2, 2, 2])).toEqual({ ok: true, n: 3, rho: { estimate: 0 } });
    expect(concordance([0.1, 0.1, 0.1], [0.1, 0.1, 0.1])).toEqual({
      ok: false,
      n: 3,
      reason: "all readings are the same",
    });
  });

  it("refuses fewer than three pairs, and throws on what cannot be paired", () => {
    expect(concordance([], [])).toEqual({ ok: false, n: 0, reason: "fewer than three pairs" });
    expect(concordance([1, 2, null], [1, 3, 5])).toEqual({ ok: false, n: 2, reason: "fewer than three pairs" });
    expect(() => concordance([1, 2, 3], [1, 2])).toThrow(InputError);
    expect(() => concordance([1, 2, Number.NaN], [1, 2, 3])).toThrow(InputError);
    expect(() => concordance([1, 2, 3], [1, 2, 4], { confidence: -1 })).toThrow(InputError);
  });

  it("does not depend on which comes first, lies within ±1, ignores gaps, and leaves its input alone", () => {
    const value = fc.integer({ min: -45, max: 45 });
    fc.assert(
      fc.property(fc.array(fc.tuple(value, value), { minLength: 3, maxLength: 30 }), (rows) => {
        const first = Object.freeze([...rows.map(([a]) => a), null, 4]);
        const second = Object.freeze([...rows.map(([, b]) => b), 4, null]);
        const one = concordance(first, second);
        expect(
          concordance(
            rows.map(([a]) => a),
            rows.map(([, b]) => b),
          ),
        ).toEqual(one);
        if (!one.ok) return;
        const other = expectOk(concordance(second, first));
        expect(other.rho.estimate).toEqual(near(one.rho.estimate));
        if (one.rho.low !== undefined) expect(other.rho.low).toEqual(near(one.rho.low, 1e-7));
        expect(Math.abs(one.rho.estimate)).toBeLessThanOrEqual(1);
        expect(JSON.stringify(one)).not.toContain("null"); // how JSON writes NaN
      }),
    );
  });
});
