import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { examinerFigures } from "@/lib/results/examiner-figures";
import { ExaminerFiguresSchema } from "@/lib/results/schema";
import { arbitraryFinding } from "../reflex/arbitrary-finding";
import { deviation } from "../reflex/build-finding";
import { itemId, shown, WORKED_TABLE } from "./worked-table";

describe("examinerFigures", () => {
  const figures = examinerFigures(WORKED_TABLE);

  it("gives kappa and agreement of the worked table", () => {
    // Seven read; A, D, E and G agree: 4/7 = 28/49. Margins of the reference: L exo 3, R eso 1, R hyper 1, aligned 1,
    // not readable 1; of the readings: L exo 3, R exo 2, R hyper 1, aligned 1. By chance (9 + 1 + 1)/49 = 11/49.
    // Kappa (28 − 11)/(49 − 11) = 17/38.
    expect(figures.kappa).toMatchObject({
      ok: true,
      n: 7,
      kappa: { estimate: expect.closeTo(17 / 38, 10) },
      observed: expect.closeTo(4 / 7, 10),
      expected: expect.closeTo(11 / 49, 10),
    });
    // Wilson's interval of 4/7: centre (4/7 + 3.8415/14)/(1 + 3.8415/7) = 0.54612, reach 0.29566.
    expect(figures.observedAgreement).toMatchObject({
      ok: true,
      n: 7,
      share: { estimate: 4 / 7, low: expect.closeTo(0.25046, 4), high: expect.closeTo(0.84178, 4) },
    });
    expect(figures.withinTolerance).toMatchObject({ ok: true, n: 7, share: { estimate: 3 / 7 } }); // A, D, E
  });
  it("gives the weighted kappas of steps of the worked table", () => {
    // Positions on 0, 15, 30, 45, >45: A 1→2, B 2→2, C 1→1, D 1→1, E 0→0, G 4→3. Margins 1 3 1 0 1 and 1 2 2 1 0.
    // Linear: apart 2 in all, by chance (9 + 15 + 5 + 15)/6 = 44/6; kappa 1 − 12/44 = 8/11.
    // Quadratic: apart 2 in all, by chance (19 + 21 + 7 + 43)/6 = 90/6; kappa 1 − 12/90 = 13/15.
    expect(figures.stepsLinear).toMatchObject({ ok: true, n: 6, kappa: { estimate: expect.closeTo(8 / 11, 10) } });
    expect(figures.stepsQuadratic).toMatchObject({ ok: true, n: 6, kappa: { estimate: expect.closeTo(13 / 15, 10) } });
  });
  it("shows the table of labels without those nobody used", () => {
    expect(figures.confusion).toEqual({
      categories: ["aligned", "R eso", "R exo", "R hyper", "L exo", "not readable"],
      counts: [
        [1, 0, 0, 0, 0, 0],
        [0, 0, 1, 0, 0, 0],
        [0, 0, 0, 0, 0, 0],
        [0, 0, 0, 1, 0, 0],
        [0, 0, 1, 0, 2, 0],
        [0, 0, 0, 0, 1, 0],
      ],
    });
  });
  it("counts cases, errors and what was left unread", () => {
    expect(figures).toMatchObject({ caseCount: 8, readCount: 7, repeatCount: 1, namedOnOtherEye: 1 });
    expect(figures.errorCounts).toEqual({
      "not readable against readable": 1,
      "horizontal direction reversed": 1,
      "other eye": 1,
      "size outside tolerance": 1,
    });
    expect(figures.items.find((item) => item.itemId === itemId("H"))).toMatchObject({ error: null, horizontal: null });
    expect(figures.items.find((item) => item.itemId === itemId("C"))).toMatchObject({
      error: "horizontal direction reversed",
      horizontal: { reading: -15, reference: 15 },
    });
  });

  const arbitraryRound = fc.array(
    fc.record({
      itemId: fc.uuid(),
      kind: fc.constantFrom("first" as const, "repeat" as const, "mirrored" as const),
      reference: arbitraryFinding,
      reading: fc.option(arbitraryFinding, { freq: 8 }),
    }),
    { maxLength: 40 },
  );
  it("holds only finite numbers and reasons: what is stored comes back as it was", () => {
    fc.assert(
      fc.property(arbitraryRound, (items) => {
        const computed = examinerFigures(items);
        expect(numbersIn(computed).filter((number) => !Number.isFinite(number))).toEqual([]);
        const stored: unknown = JSON.parse(JSON.stringify(computed));
        expect(computed).toMatchObject(ExaminerFiguresSchema.parse(stored));
      }),
    );
  });
  it("does not depend on the order of the cases", () => {
    fc.assert(
      fc.property(arbitraryRound, (items) => {
        const { items: _, ...forwards } = examinerFigures(items);
        const { items: __, ...backwards } = examinerFigures(items.toReversed());
        expect(roundedNumbers(backwards)).toEqual(roundedNumbers(forwards));
      }),
    );
  });
  it("takes from repeats nothing but their number", () => {
    fc.assert(
      fc.property(arbitraryRound, (items) => {
        const { repeatCount: _, ...figuresOfFirsts } = examinerFigures(items.filter(({ kind }) => kind === "first"));
        expect(examinerFigures(items)).toMatchObject(figuresOfFirsts);
      }),
    );
  });
  it("finds no error in somebody who reads the reference, on either eye where it is vertical only", () => {
    fc.assert(
      fc.property(arbitraryRound, (items) => {
        const perfect = examinerFigures(items.map((item) => ({ ...item, reading: item.reference })));
        expect(perfect.errorCounts).toEqual({});
        if (perfect.kappa.ok) expect(perfect.kappa.kappa.estimate).toBe(1);
        if (perfect.withinTolerance.ok) expect(perfect.withinTolerance.share.estimate).toBe(1);
      }),
    );
    const vertical = [shown("A", deviation("left", { hyper: 12 }), deviation("right", { hypo: 12 }))];
    expect(examinerFigures(vertical)).toMatchObject({ errorCounts: {}, namedOnOtherEye: 1 });
  });
  it("gives reasons in place of figures without a reading", () => {
    const unread = examinerFigures([shown("A", deviation("left", { exo: 20 }), null)]);
    expect(unread).toMatchObject({ caseCount: 1, readCount: 0, errorCounts: {} });
    const { kappa, observedAgreement, stepsLinear, withinTolerance } = unread;
    for (const refused of [kappa, observedAgreement, stepsLinear, withinTolerance, unread.horizontal.limits]) {
      expect(refused).toEqual({ ok: false, n: 0, reason: expect.stringMatching(/\w/) });
    }
    expect(unread.confusion).toEqual({ categories: [], counts: [] });
  });
});

function numbersIn(value: unknown): number[] {
  if (typeof value === "number") return [value];
  return typeof value === "object" && value !== null ? Object.values(value).flatMap(numbersIn) : [];
}

/** Sums in another order differ in their last digits. */
function roundedNumbers(value: unknown): unknown {
  return JSON.parse(JSON.stringify(value), (_, part: unknown) =>
    typeof part === "number" ? +part.toFixed(9) + 0 : part,
  );
}
