import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { drawOrder, type Showing, smallestGap } from "@/lib/rounds/draw-order";
import { seededRandom } from "@/lib/statistics/random";

/** A round of so many cases, of which the first ones are shown again. */
const makeShowings = (cases: number, repeats: number): Showing[] =>
  Array.from({ length: cases + repeats }, (_, index) => ({ id: `item ${index}`, twin: `case ${index % cases}` }));
const gapOf = (showings: readonly Showing[], order: readonly string[]) =>
  smallestGap(order.flatMap((id) => showings.find((showing) => showing.id === id) ?? []));
const seeds = Array.from({ length: 100 }, (_, seed) => seed);

describe("drawOrder", () => {
  it("holds every item once, whatever is shown again", () => {
    fc.assert(
      fc.property(fc.array(fc.nat(9), { maxLength: 40 }), fc.nat(), (twins, seed) => {
        const showings = twins.map((twin, index) => ({ id: `item ${index}`, twin: String(twin) }));
        const order = drawOrder(showings, seededRandom(seed));
        expect(order.toSorted()).toEqual(showings.map(({ id }) => id).toSorted());
      }),
    );
  });
  it("is the same for the same random numbers, and another for others", () => {
    const showings = makeShowings(20, 4);
    const orders = seeds.map((seed) => drawOrder(showings, seededRandom(seed)).join());
    expect(drawOrder(showings, seededRandom(7)).join()).toBe(orders[7]);
    expect(new Set(orders).size).toBe(seeds.length);
  });
  it.each([
    [12, 1],
    [20, 4],
    [30, 3],
    [100, 2],
  ])("keeps showings of one case a third of the round apart (%d cases, %d again)", (cases, repeats) => {
    const showings = makeShowings(cases, repeats);
    for (const seed of seeds) {
      expect(gapOf(showings, drawOrder(showings, seededRandom(seed)))).toBeGreaterThanOrEqual((cases + repeats) / 3);
    }
  });
  // With many repeats chance seldom finds a third; what it finds still lies far from side by side.
  it.each([
    [12, 12],
    [20, 10],
    [60, 20],
  ])("never shows one case twice within three places (%d cases, %d again)", (cases, repeats) => {
    const showings = makeShowings(cases, repeats);
    for (const seed of seeds) expect(gapOf(showings, drawOrder(showings, seededRandom(seed)))).toBeGreaterThan(3);
  });
  it("gives a round too small for a distance, and one of nothing", () => {
    const twins = makeShowings(1, 1);
    expect(drawOrder(twins, seededRandom(1)).toSorted()).toEqual(["item 0", "item 1"]);
    expect(drawOrder([], seededRandom(1))).toEqual([]);
  });
  it("makes each order of three cases as likely as any other", () => {
    const counts = new Map<string, number>();
    const random = seededRandom(2026);
    const draws = 6000;
    for (let draw = 0; draw < draws; draw++) {
      const order = drawOrder(makeShowings(3, 0), random).join();
      counts.set(order, (counts.get(order) ?? 0) + 1);
    }
    expect(counts.size).toBe(6);
    // Chi-square on 5 degrees of freedom, 99.9% point 20.5 (from memory); the seed makes the draw the same every time.
    const chiSquare = [...counts.values()].reduce((sum, count) => sum + (count - draws / 6) ** 2 / (draws / 6), 0);
    expect(chiSquare).toBeLessThan(20.5);
  });
});

describe("smallestGap", () => {
  it("is the least distance between two showings of one case", () => {
    const order = ["a", "b", "c", "a", "d", "b", "a"].map((twin, index) => ({ id: String(index), twin }));
    expect(smallestGap(order)).toBe(3);
    expect(smallestGap(makeShowings(5, 0))).toBe(Number.POSITIVE_INFINITY);
  });
});
