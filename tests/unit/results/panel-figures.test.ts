import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ALIGNED } from "@/lib/reflex/finding";
import { panelFigures } from "@/lib/results/panel-figures";
import { PanelFiguresSchema } from "@/lib/results/schema";
import { arbitraryFinding } from "../reflex/arbitrary-finding";
import { deviation } from "../reflex/build-finding";
import { shown } from "./worked-table";

/**
 * Two examiners on three cases; the second leaves Z unread, and everybody's repeat of X is out of it.
 *
 * | case | reference | first    | second   | horizontal | size   |
 * |------|-----------|----------|----------|------------|--------|
 * | X    | L exo 20  | L exo 20 | L exo 30 | 0, −10     | 0, +10 |
 * | Y    | R eso 10  | R eso 10 | R exo 10 | 0, −20     | 0, -   |
 * | Z    | aligned   | aligned  | unread   | 0          | -      |
 */
const x = deviation("left", { exo: 20 });
const y = deviation("right", { eso: 10 });
const first = [shown("X", x, x), shown("Y", y, y), shown("Z", ALIGNED, ALIGNED), shown("W", x, ALIGNED, "repeat")];
const second = [
  shown("X", x, deviation("left", { exo: 30 })),
  shown("Y", y, deviation("right", { exo: 10 })),
  shown("Z", ALIGNED, null),
  shown("W", x, ALIGNED, "repeat"),
];

describe("panelFigures", () => {
  const figures = panelFigures([first, second]);

  it("gives kappa and the table of all readings together, as worked by hand", () => {
    // Five readings, four agree: 20/25. Margins of the reference L exo 2, R eso 2, aligned 1; of the readings L exo 2,
    // R eso 1, R exo 1, aligned 1. By chance (4 + 2 + 1)/25 = 7/25. Kappa (20 − 7)/(25 − 7) = 13/18.
    expect(figures).toMatchObject({ examinerCount: 2, readCount: 5 });
    expect(figures.kappa).toMatchObject({ ok: true, n: 5, kappa: { estimate: expect.closeTo(13 / 18, 10) } });
    expect(figures.confusion).toEqual({
      categories: ["aligned", "R eso", "R exo", "L exo"],
      counts: [
        [1, 0, 0, 0],
        [0, 1, 1, 0],
        [0, 0, 0, 0],
        [0, 0, 0, 2],
      ],
    });
  });
  it("gives bias and limits over all readings, as worked by hand", () => {
    // Horizontal: −30/5 = −6; squares 500 − 5·36 = 320, over 4 is 80, SD 8.9443; limits −6 ± 17.5308.
    expect(figures.horizontal).toMatchObject({
      ok: true,
      n: 5,
      bias: { estimate: -6 },
      sd: expect.closeTo(8.9443, 4),
      lower: { estimate: expect.closeTo(-23.5308, 3) },
      upper: { estimate: expect.closeTo(11.5308, 3) },
    });
    // Size, without the reversed reading: 0, 10 and 0; mean 10/3, SD √(200/3/2) = 5.7735.
    expect(figures.size).toMatchObject({
      ok: true,
      n: 3,
      bias: { estimate: expect.closeTo(10 / 3, 10) },
      sd: expect.closeTo(5.7735, 4),
    });
    expect(figures.vertical).toMatchObject({ ok: true, n: 5, bias: { estimate: 0 }, sd: 0 });
  });
  it("gives the agreement among the examiners by Fleiss' kappa over the cases two have read", () => {
    // X: both L exo, 1. Y: apart, 0. Z has one reading and no pair. Observed 1/2. Shares by case, averaged over the
    // three (Gwet 2014 for unequal numbers): L exo 1/3, R eso 1/6, R exo 1/6, aligned 1/3; squares 10/36.
    // Kappa (18/36 − 10/36)/(26/36) = 8/26.
    expect(figures.amongExaminers).toMatchObject({ ok: true, kappa: { estimate: expect.closeTo(8 / 26, 10) } });
  });

  const readings = fc.array(fc.option(arbitraryFinding, { freq: 8 }), { minLength: 6, maxLength: 6 });
  const arbitraryPanel = fc
    .tuple(
      fc.array(arbitraryFinding, { minLength: 6, maxLength: 6 }),
      fc.array(readings, { minLength: 1, maxLength: 4 }),
    )
    .map(([references, panel]) =>
      panel.map((own) => references.map((reference, i) => shown("ABCDEF"[i] ?? "A", reference, own[i] ?? null))),
    );
  it("is the same whoever comes first, and every time it is asked", () => {
    fc.assert(
      fc.property(arbitraryPanel, (panel) => {
        expect(panelFigures(panel)).toEqual(panelFigures(structuredClone(panel)));
        expect(panelFigures(panel.toReversed())).toEqual(panelFigures(panel));
      }),
      { numRuns: 8 },
    );
  });
  it("draws cases, not readings, for its intervals: a panel twice as large says no more about the cases", () => {
    fc.assert(
      fc.property(arbitraryPanel, (panel) => {
        const [once, twice] = [panelFigures(panel), panelFigures([...panel, ...panel])];
        for (const measure of ["horizontal", "vertical", "size"] as const) {
          const [single, double] = [once[measure], twice[measure]];
          if (!single.ok || !double.ok) continue;
          expect(double.n).toBe(2 * single.n);
          expect(double.bias.low ?? 0).toBeCloseTo(single.bias.low ?? 0, 9);
          expect(double.bias.high ?? 0).toBeCloseTo(single.bias.high ?? 0, 9);
        }
        if (once.kappa.ok && twice.kappa.ok) {
          expect(twice.kappa.kappa.low ?? 0).toBeCloseTo(once.kappa.kappa.low ?? 0, 9);
        }
      }),
      { numRuns: 8 },
    );
  });
  it("holds only finite numbers and reasons", () => {
    fc.assert(
      fc.property(arbitraryPanel, (panel) => {
        const stored: unknown = JSON.parse(JSON.stringify(panelFigures(panel)));
        expect(PanelFiguresSchema.parse(stored)).toEqual(stored);
      }),
      { numRuns: 8 },
    );
    const nobody = panelFigures([]);
    expect(nobody).toMatchObject({ examinerCount: 0, readCount: 0, confusion: { categories: [], counts: [] } });
    for (const refused of [nobody.kappa, nobody.horizontal, nobody.size, nobody.amongExaminers]) {
      expect(refused).toEqual({ ok: false, n: 0, reason: expect.stringMatching(/\w/) });
    }
  });
});
