import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { caseDisagreement } from "@/lib/statistics/case-disagreement";
import { InputError } from "@/lib/statistics/result";
import { arbitraryRatings, freeze } from "./arbitrary-ratings";
import { near } from "./near";

describe("caseDisagreement", () => {
  it("describes each case by its most frequent label, its share and its scatter", () => {
    const labels = [
      ["R eso", "R eso", "R eso", "R eso"],
      ["R eso", "R eso", "aligned", "L exo"],
      ["R eso", "R eso", "R eso", "aligned"],
    ];
    // By hand, in bits: -(1/2·log2 1/2 + 2·1/4·log2 1/4) = 1.5; -(3/4·log2 3/4 + 1/4·log2 1/4) = 2 - 3/4·log2 3.
    expect(caseDisagreement(labels)).toEqual({
      ok: true,
      n: 3,
      cases: [
        { ok: true, n: 4, modal: "R eso", tied: false, share: 1, entropy: 0, split: false },
        { ok: true, n: 4, modal: "R eso", tied: false, share: 0.5, entropy: near(1.5), split: true },
        {
          ok: true,
          n: 4,
          modal: "R eso",
          tied: false,
          share: 0.75,
          entropy: near(2 - 0.75 * Math.log2(3)),
          split: false,
        },
      ],
    });
  });

  it("calls a case split as soon as no label has more than half", () => {
    const split = (row: string) => {
      const result = caseDisagreement([[...row]]);
      return result.ok && result.cases[0]?.ok && result.cases[0].split;
    };
    expect(["aab", "aaabb", "a"].map(split)).toEqual([false, false, false]);
    expect(["ab", "aabb", "aabc", "abc"].map(split)).toEqual([true, true, true, true]);
  });

  it("names the first of the tied labels, and says that it is tied", () => {
    expect(
      caseDisagreement([
        ["b", "a", null],
        [10, 9, 10, 9],
      ]),
    ).toMatchObject({
      cases: [
        { n: 2, modal: "a", tied: true },
        { n: 4, modal: 9, tied: true },
      ],
    });
  });

  it("keeps the place of a case that nobody read", () => {
    expect(caseDisagreement([["a"], [null, null], [], ["b"]])).toMatchObject({
      n: 2,
      cases: [
        { ok: true, modal: "a" },
        { ok: false, n: 0, reason: "no readings" },
        { ok: false, n: 0, reason: "no readings" },
        { ok: true, modal: "b" },
      ],
    });
    expect(caseDisagreement([])).toEqual({ ok: false, n: 0, reason: "no readings" });
    expect(caseDisagreement([[], [null]])).toEqual({ ok: false, n: 0, reason: "no readings" });
  });

  it("depends on each case's own readings alone, in any order and with any gaps", () => {
    fc.assert(
      fc.property(arbitraryRatings(), (rows) => {
        const result = caseDisagreement(freeze(rows));
        const alone = rows.map((row) => caseDisagreement([row.toReversed().filter((rating) => rating !== null)]));
        const cases = alone.map((one) => (one.ok ? one.cases[0] : one));
        expect(result.ok ? result.cases : cases).toEqual(cases.map(nearEntropy));
        expect(result.n).toBe(alone.filter(({ ok }) => ok).length);
      }),
    );
  });

  it("has entropy between 0 when all agree and the logarithm of the number of labels used", () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 1, max: 9 }), { minLength: 1, maxLength: 30 }), (row) => {
        const result = caseDisagreement([row]);
        const described = result.ok ? result.cases[0] : undefined;
        if (!described?.ok) throw new Error("no description");
        const used = new Set(row).size;
        expect(described.entropy > 0).toBe(used > 1);
        expect(described.entropy).toBeLessThanOrEqual(Math.log2(used) + 1e-12);
        expect(described.share).toBe(row.filter((label) => label === described.modal).length / row.length);
        for (const label of row) {
          expect(row.filter((other) => other === label).length / row.length).toBeLessThanOrEqual(described.share);
        }
      }),
    );
  });

  it("refuses labels that are no labels", () => {
    expect(() => caseDisagreement([[Number.NaN]])).toThrow(InputError);
    expect(() => caseDisagreement(JSON.parse('["a", "b"]'))).toThrow(InputError);
  });
});

function nearEntropy<Described>(described: Described) {
  if (typeof described !== "object" || described === null || !("entropy" in described)) return described;
  return { ...described, entropy: near(Number(described.entropy)) };
}
