import { describe, expect, it } from "vitest";
import { columnBounds, steppedLimits, steppedPath } from "@/components/charts/stepped-limits";

describe("steppedLimits", () => {
  it("draws one straight line when the limit never changes", () => {
    expect(steppedLimits([10, 20, 30], [0.7, 0.7, 0.7], 0, 40)).toEqual([{ from: 0, to: 40, value: 0.7 }]);
  });
  it("changes half way between two points", () => {
    expect(steppedLimits([10, 20], [0.7, 0.6], 0, 40)).toEqual([
      { from: 0, to: 15, value: 0.7 },
      { from: 15, to: 40, value: 0.6 },
    ]);
  });
  it("leaves a gap where a point has no limit, even between equal ones", () => {
    expect(steppedLimits([10, 20, 30], [0.7, undefined, 0.7], 0, 40)).toEqual([
      { from: 0, to: 15, value: 0.7 },
      { from: 25, to: 40, value: 0.7 },
    ]);
  });
});

describe("columnBounds", () => {
  it("covers the plot without overlap, however unevenly the rounds follow each other", () => {
    const columns = columnBounds([5, 6, 80], 0, 100);
    expect(columns[0]?.from).toBe(0);
    expect(columns.at(-1)?.to).toBe(100);
    columns.slice(1).forEach((column, i) => {
      expect(column.from).toBe(columns[i]?.to);
    });
  });
});

describe("steppedPath", () => {
  it("joins a step with an upright and starts anew after a gap", () => {
    const y = (value: number) => 100 * (1 - value);
    expect(
      steppedPath(
        [
          { from: 0, to: 15, value: 0.75 },
          { from: 15, to: 25, value: 0.5 },
          { from: 35, to: 40, value: 0.5 },
        ],
        y,
      ),
    ).toBe("M0.0 25.0H15.0V50.0H25.0M35.0 50.0H40.0");
  });
});
