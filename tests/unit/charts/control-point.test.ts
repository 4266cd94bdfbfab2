import { describe, expect, it } from "vitest";
import {
  type ControlPoint,
  controlFormatter,
  controlTip,
  describeControl,
  timeSpan,
  valueAxis,
} from "@/components/charts/control-point";

const point = (
  label: string,
  value: number | undefined,
  state: ControlPoint["state"],
  more: Partial<ControlPoint> = {},
) => ({
  id: label,
  label,
  at: "2025-03-14T10:00:00Z",
  n: 24,
  value,
  state,
  ...more,
});

describe("controlFormatter", () => {
  it("gives degrees a sign only in a figure that has both sides of zero", () => {
    const spread = controlFormatter([point("R1", 4.2, "in", { upperWarning: 6 })], "degrees");
    const bias = controlFormatter([point("R1", 1.2, "in", { lowerWarning: -2 })], "degrees");
    expect(spread.one(4.2)).toBe("4.2°");
    expect(bias.one(1.2)).toBe("+1.2°");
    expect(bias.interval(-0.3, 2.7)).toBe("−0.3 to +2.7°");
  });
  it("writes kappa with two decimals and no unit", () => {
    expect(controlFormatter([], "kappa").one(0.8)).toBe("0.80");
  });
});

describe("describeControl", () => {
  const kappa = controlFormatter([], "kappa");
  it("says the latest state and how many points lie beyond which limit", () => {
    const points = [point("R1", 0.8, "in"), point("R2", 0.66, "action"), point("R3", 0.73, "warning")];
    expect(describeControl(points, "Median kappa", kappa)).toBe(
      "Median kappa: 3 rounds from R1 to R3. Latest 0.73, beyond a warning limit. " +
        "In all 1 beyond a warning limit, 1 beyond an action limit.",
    );
  });
  it("gives the reason when the latest round has no value", () => {
    const points = [point("R1", 0.8, "in"), point("R2", undefined, "none", { reason: "one category only" })];
    expect(describeControl(points, "Kappa", kappa)).toBe(
      "Kappa: 2 rounds from R1 to R2. Latest one category only. None beyond a limit.",
    );
    expect(describeControl([], "Kappa", kappa)).toBe("Kappa: no rounds yet.");
  });
  it("gives the reason instead of a number in the note of a point", () => {
    expect(controlTip(point("R2", undefined, "none", { reason: "one category only" }), kappa)).toEqual({
      title: "R2, 14 Mar 2025",
      lines: ["one category only", "24 readings"],
    });
  });
});

describe("axes of a control chart", () => {
  it("holds limits and intervals, but not intervals in a small multiple, which draws none", () => {
    const points = [point("R1", 0.8, "in", { low: 0.4, high: 1, lowerAction: 0.7 })];
    expect(valueAxis(points, 0.8, "kappa", false).low).toBeLessThan(0.4);
    expect(valueAxis(points, 0.8, "kappa", true).low).toBeGreaterThan(0.6);
    expect(valueAxis(points, 0.8, "kappa", false).high).toBe(1);
  });
  it("leaves room beyond the first and last round, and for a single one", () => {
    const [from, to] = timeSpan([1_000_000_000_000, 1_030_000_000_000]);
    expect(from).toBeLessThan(1_000_000_000_000);
    expect(to).toBeGreaterThan(1_030_000_000_000);
    const [only, end] = timeSpan([5]);
    expect(end).toBeGreaterThan(only);
  });
});
