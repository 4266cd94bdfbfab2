import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { binDifferences, mergePoints, spotRadiusPx } from "@/components/charts/merge-points";

describe("mergePoints", () => {
  it("counts readings on one spot and keeps what each was called", () => {
    const merged = mergePoints([
      { id: "a", mean: 27.5, difference: -5, label: "Case 4" },
      { id: "b", mean: 27.5, difference: 5, label: "Case 5" },
      { id: "c", mean: 27.5, difference: -5, label: "Case 9" },
    ]);
    expect(merged).toEqual([
      { id: "a", mean: 27.5, difference: -5, count: 2, labels: ["Case 4", "Case 9"] },
      { id: "b", mean: 27.5, difference: 5, count: 1, labels: ["Case 5"] },
    ]);
  });
  it("loses no reading", () => {
    const coordinate = fc.integer({ min: -90, max: 90 });
    const point = fc.record({ id: fc.string(), mean: coordinate, difference: coordinate });
    fc.assert(
      fc.property(fc.array(point), (points) => {
        expect(mergePoints(points).reduce((sum, p) => sum + p.count, 0)).toBe(points.length);
      }),
    );
  });
  it("keeps half degrees apart, because means of whole degrees end in .5", () => {
    expect(
      mergePoints([
        { id: "a", mean: 10, difference: 0 },
        { id: "b", mean: 10.5, difference: 0 },
      ]),
    ).toHaveLength(2);
  });
});

describe("spotRadiusPx", () => {
  it("makes area, not radius, proportional to the count", () => {
    expect(spotRadiusPx(4, 4) ** 2 / spotRadiusPx(1, 4) ** 2).toBeCloseTo(4, 10);
  });
  it("shrinks all spots together when one is very full", () => {
    expect(spotRadiusPx(400, 400)).toBeCloseTo(16, 10);
    expect(spotRadiusPx(1, 400)).toBeCloseTo(0.8, 10);
  });
});

describe("binDifferences", () => {
  it("centres a bin on zero and leaves empty bins out", () => {
    expect(binDifferences([0, 1, -1, 7.4, 7.6], 2.5)).toEqual([
      { centre: 0, count: 3 },
      { centre: 7.5, count: 2 },
    ]);
  });
});
