import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ALIGNED } from "@/lib/reflex/finding";
import { DEGREES_MEASURES, degreesFigures } from "@/lib/results/degrees-figures";
import { arbitraryFinding } from "../reflex/arbitrary-finding";
import { deviation } from "../reflex/build-finding";
import { shown, WORKED_TABLE } from "./worked-table";

const firsts = WORKED_TABLE.filter(({ kind }) => kind === "first");

describe("degreesFigures", () => {
  it("gives bias and limits of the horizontal component as worked by hand", () => {
    // Differences A −5, B 0, C −30, D 0, E 0: mean −7. Squared deviations 4 + 49 + 529 + 49 + 49 = 680, over 4 is 170,
    // SD 13.0384. Limits −7 ± 1.96·13.0384 = −32.555 and 18.555. Bias ± t(4)·SD/√5 = −7 ± 2.7764·5.8310 = ±16.189.
    const { figures, pairs } = degreesFigures(firsts, "horizontal");
    expect(figures).toMatchObject({
      limits: {
        ok: true,
        n: 5,
        sd: expect.closeTo(13.0384, 4),
        bias: { estimate: -7, low: expect.closeTo(-23.189, 3), high: expect.closeTo(9.189, 3) },
        lower: { estimate: expect.closeTo(-32.555, 2) },
        upper: { estimate: expect.closeTo(18.555, 2) },
      },
      leftOut: { unread: 1, notReadable: 1, beyondLimbus: 1, otherDirection: 0 },
    });
    expect(pairs.slice(0, 3)).toEqual([
      { reading: -25, reference: -20 },
      { reading: -30, reference: -30 },
      { reading: -15, reference: 15 },
    ]);
    expect(pairs.slice(5)).toEqual([null, null, null]);
  });
  it("keeps in the vertical component a case that is beyond the limbus horizontally only", () => {
    const { figures, pairs } = degreesFigures(firsts, "vertical");
    expect(figures).toMatchObject({
      limits: { ok: true, n: 6, sd: 0, bias: { estimate: 0 } },
      leftOut: { unread: 1, notReadable: 1, beyondLimbus: 0, otherDirection: 0 },
    });
    expect(pairs[3]).toEqual({ reading: 10, reference: 10 }); // left hypo for right hyper is the same deviation
    expect(pairs[6]).toEqual({ reading: 0, reference: 0 });
  });
  it("compares sizes only where the direction was read right", () => {
    // Differences A 5, B 0, D 0: mean 5/3; squared deviations (100 + 25 + 25)/9, over 2 is 25/3, SD 2.8868.
    const { figures } = degreesFigures(firsts, "size");
    expect(figures).toMatchObject({
      limits: { ok: true, n: 3, bias: { estimate: expect.closeTo(5 / 3, 10) }, sd: expect.closeTo(2.8868, 4) },
      leftOut: { unread: 1, notReadable: 1, beyondLimbus: 1, otherDirection: 2 },
    });
  });
  it("takes the size of the larger part of the reference", () => {
    const reference = deviation("right", { exo: 10, hyper: 25 });
    const size = (reading: ReturnType<typeof deviation>) =>
      degreesFigures([shown("A", reference, reading)], "size").pairs;
    expect(size(deviation("right", { exo: 40, hyper: 20 }))).toEqual([{ reading: 20, reference: 25 }]);
    expect(size(deviation("right", { eso: 10, hyper: 20 }))).toEqual([{ reading: 20, reference: 25 }]);
    expect(size(deviation("right", { exo: 10 }))).toEqual([null]);
    expect(size(deviation("right", { exo: 10, hypo: 25 }))).toEqual([null]);
  });
  it("gives the reason and no number below three pairs", () => {
    const { figures } = degreesFigures(firsts.slice(0, 2), "horizontal");
    expect(figures.limits).toEqual({ ok: false, n: 2, reason: "fewer than three pairs" });
    expect(degreesFigures([], "size").figures.limits).toMatchObject({ ok: false, n: 0 });
  });

  const arbitraryItems = fc
    .array(fc.tuple(arbitraryFinding, fc.option(arbitraryFinding)), { maxLength: 30 })
    .map((pairs) => pairs.map(([reference, reading]) => shown("A", reference, reading)));
  it("has a pair or a reason for every item, and says how many of each", () => {
    fc.assert(
      fc.property(arbitraryItems, fc.constantFrom(...DEGREES_MEASURES), (items, measure) => {
        const { figures, pairs } = degreesFigures(items, measure);
        const leftOut = Object.values(figures.leftOut).reduce((sum, count) => sum + count, 0);
        expect(pairs).toHaveLength(items.length);
        expect(figures.limits.n).toBe(pairs.filter((pair) => pair !== null).length);
        expect(figures.limits.n + leftOut).toBe(items.length);
      }),
    );
  });
  it("turns its sign when reading and reference change places", () => {
    fc.assert(
      fc.property(arbitraryItems, fc.constantFrom("horizontal" as const, "vertical" as const), (items, measure) => {
        const swapped = items.flatMap(({ reading, reference }) => (reading ? [shown("A", reading, reference)] : []));
        const [there, back] = [items, swapped].map((each) => degreesFigures(each, measure).figures.limits);
        expect(back?.ok).toBe(there?.ok);
        if (!there?.ok || !back?.ok) return;
        expect(back.bias.estimate).toBeCloseTo(-there.bias.estimate, 9);
        expect(back.upper.estimate).toBeCloseTo(-there.lower.estimate, 9);
      }),
    );
  });
  it("counts aligned pairs as 0 and 0, so that they are in the components", () => {
    const items = [1, 2, 3].map(() => shown("A", ALIGNED, ALIGNED));
    expect(degreesFigures(items, "horizontal").figures.limits).toMatchObject({ ok: true, n: 3, bias: { estimate: 0 } });
  });
});
