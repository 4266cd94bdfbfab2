import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { progressLabels } from "@/components/ui/progress-labels";

describe("progressLabels", () => {
  it("divides a round of 24 evenly", () => {
    expect(progressLabels(24)).toEqual([1, 6, 12, 18, 24]);
  });
  it("names every position of a short round", () => {
    expect(progressLabels(4)).toEqual([1, 2, 3, 4]);
    expect(progressLabels(1)).toEqual([1]);
  });
  it("always rises from the first to the last position without crowding", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 400 }), (count) => {
        const labels = progressLabels(count);
        expect(labels[0]).toBe(1);
        expect(labels.at(-1)).toBe(count);
        expect(labels).toEqual([...new Set(labels)].sort((a, b) => a - b));
        // Two numbers nearer than a tenth of the rule would run into each other on a phone.
        const gaps = labels.slice(1).map((position, index) => position - (labels[index] ?? 0));
        for (const gap of gaps) expect(gap).toBeGreaterThanOrEqual(count / 10);
      }),
    );
  });
});
