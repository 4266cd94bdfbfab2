import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { biasChart, type Figure, kappaChart, pooledKappa } from "@/lib/drift/control-chart";

const figure = (roundId: string, estimate: number, standardError?: number): Figure => ({
  roundId,
  n: 24,
  value: { estimate, standardError },
});
const absent: Figure = { roundId: "absent", n: 0, reason: "did not take part" };

const arbitraryFigures = fc.array(
  fc.oneof(
    {
      weight: 4,
      arbitrary: fc.tuple(fc.double({ min: -1, max: 1, noNaN: true }), fc.double({ min: 0.01, max: 1, noNaN: true })),
    },
    { weight: 1, arbitrary: fc.constant(null) },
  ),
  { maxLength: 12 },
);
const toFigures = (drawn: ([number, number] | null)[]) =>
  drawn.map((each, index) => (each ? figure(`round ${index}`, ...each) : { ...absent, roundId: `round ${index}` }));

describe("biasChart", () => {
  it("holds a bias to 2 and 3 of its own standard errors around the reference", () => {
    // SE 1: warning beyond ±2, action beyond ±3; on the limit is within it.
    const values = [0, 2, -2, 2.01, -2.01, 3, 3.01, -3.01];
    const { centre, points } = biasChart(values.map((value, index) => figure(String(index), value, 1)));
    expect(centre).toBe(0);
    expect(points.map(({ state }) => state)).toEqual([
      "in",
      "in",
      "in",
      "warning",
      "warning",
      "warning",
      "action",
      "action",
    ]);
    expect(points[0]).toMatchObject({ lowerAction: -3, lowerWarning: -2, upperWarning: 2, upperAction: 3 });
  });
  it("gives a round with few readings wide limits instead of a false alarm", () => {
    const { points } = biasChart([figure("many", 4, 1), figure("few", 4, 2.5)]);
    expect(points.map(({ state, upperAction }) => [state, upperAction])).toEqual([
      ["action", 3],
      ["in", 7.5],
    ]);
  });
  it("keeps the place of a round without a value, and says why there is none", () => {
    const { points } = biasChart([figure("first", 0, 1), absent, figure("exact", 0)]);
    expect(points[1]).toEqual({ ...absent, state: "none" });
    expect(points[2]).toEqual({ ...figure("exact", 0), state: "none" }); // no standard error, no limits
  });
  it("has one point for every round, and mirrors when every bias changes its sign", () => {
    fc.assert(
      fc.property(arbitraryFigures, (drawn) => {
        const mirrored = drawn.map((each): [number, number] | null => each && [-each[0], each[1]]);
        const [there, back] = [biasChart(toFigures(drawn)), biasChart(toFigures(mirrored))];
        expect(there.points).toHaveLength(drawn.length);
        expect(back.points.map(({ state }) => state)).toEqual(there.points.map(({ state }) => state));
      }),
    );
  });
});

describe("kappaChart", () => {
  it("signals a fall below the centre, and never a rise", () => {
    const values = [0.75, 0.44, 0.54, 0.56, 0.96, 1];
    const { centre, points } = kappaChart(
      values.map((value, index) => figure(String(index), value, 0.1)),
      0.75,
    );
    expect(centre).toBe(0.75);
    expect(points.map(({ state }) => state)).toEqual(["in", "action", "warning", "in", "in", "in"]);
    expect(points[0]).toMatchObject({ lowerWarning: expect.closeTo(0.55, 10), lowerAction: expect.closeTo(0.45, 10) });
    for (const point of points) expect(Object.keys(point)).not.toContain("upperAction");
  });
  it("has no limits and no signal without a centre", () => {
    const figures = [figure("a", 0.2, 0.1), absent];
    expect(kappaChart(figures, undefined)).toEqual({ points: figures.map((each) => ({ ...each, state: "none" })) });
  });
  it("is never out of its limits above the centre", () => {
    fc.assert(
      fc.property(arbitraryFigures, fc.double({ min: -1, max: 1, noNaN: true }), (drawn, centre) => {
        const { points } = kappaChart(toFigures(drawn), centre);
        expect(points).toHaveLength(drawn.length);
        const risen = points.filter(({ value }) => value && value.estimate > centre);
        expect(new Set(risen.map(({ state }) => state)).size).toBeLessThanOrEqual(1);
        expect(risen.every(({ state }) => state === "in")).toBe(true);
      }),
    );
  });
});

describe("pooledKappa", () => {
  it("weighs each kappa by its precision", () => {
    // Weights 1/0.1² = 100 and 1/0.2² = 25: (100·0.8 + 25·0.3)/125 = 0.7.
    expect(pooledKappa([figure("a", 0.8, 0.1), figure("b", 0.3, 0.2)])).toBeCloseTo(0.7, 12);
  });
  it("leaves out rounds without a kappa or without its standard error, and is undefined without any", () => {
    const perfect = figure("perfect", 1, 0); // a standard error of 0 would outweigh all others
    expect(pooledKappa([absent, perfect, figure("a", 0.6, 0.1), figure("b", 0.9)])).toBeCloseTo(0.6, 12);
    expect(pooledKappa([absent, perfect])).toBeUndefined();
    expect(pooledKappa([])).toBeUndefined();
  });
});
