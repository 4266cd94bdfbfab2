import { describe, expect, it } from "vitest";
import {
  describeAgreement,
  describeLeftOut,
  differenceAxis,
  isOutside,
  meanAxis,
  pointTip,
} from "@/components/charts/bland-altman";
import { isUnderFloor, kappaSummary, kappaText } from "@/components/charts/kappa-row";

const agreement = {
  bias: { estimate: 1.1, low: 0.3, high: 1.9 },
  lower: { estimate: -9.7, low: -11, high: -8.4 },
  upper: { estimate: 12, low: 10.7, high: 13.3 },
};

describe("kappa rows", () => {
  const good = { id: "a", label: "Ada Pell", n: 24, estimate: 0.86, low: 0.67, high: 1 };
  const poor = { id: "b", label: "Bo Tarn", n: 24, estimate: 0.52, low: 0.29, high: 0.71 };
  const few = { id: "c", label: "Cy Wend", n: 12, estimate: 0.4, low: 0.1, high: 0.7, isTooFew: true };
  const refused = { id: "d", label: "Di Moss", n: 24, reason: "one category only" };

  it("shows a refusal as its reason and a thin figure as too few, never as a number", () => {
    expect(kappaText(good)).toEqual({ figure: "0.86", interval: "(0.67 to 1.00)" });
    expect(kappaText(few)).toEqual({ figure: "", interval: "too few to say" });
    expect(kappaText(refused)).toEqual({ figure: "", interval: "one category only" });
  });
  it("never calls an examiner under the floor on too few readings or without a figure", () => {
    expect([good, poor, few, refused].map((row) => isUnderFloor(row, 0.6))).toEqual([false, true, false, false]);
    expect(isUnderFloor(poor, undefined)).toBe(false);
  });
  it("sums the figure up in words, leaving thin figures out of its range", () => {
    expect(kappaSummary([good, poor, few, refused], 0.6, 0.69)).toBe(
      "Kappa with 95 % interval of 4 examiners. From 0.52 to 0.86. Median 0.69. Under the floor of 0.60: Bo Tarn. Not to be said: 2.",
    );
  });
});

describe("limits of agreement", () => {
  it("counts a reading on the limit as inside", () => {
    expect(isOutside({ difference: 12 }, agreement)).toBe(false);
    expect(isOutside({ difference: 12.5 }, agreement)).toBe(true);
    expect(isOutside({ difference: -10 }, agreement)).toBe(true);
    expect(isOutside({ difference: 99 }, null)).toBe(false);
  });
  it("says the mean, the limits and how many lie outside", () => {
    const points = [13, 0, -10].map((difference, i) => ({ id: String(i), mean: 20, difference }));
    expect(describeAgreement(points, agreement, "°")).toBe(
      "Differences against means of 3 readings. Mean difference +1.1°, limits of agreement −9.7 to +12.0°; 2 outside.",
    );
    expect(describeAgreement(points.slice(0, 1), null, "°")).toBe("Differences against means of 1 reading.");
  });
  it("names every reason for leaving out, and none that did not happen", () => {
    const leftOut = [
      { label: "not readable", count: 12 },
      { label: "beyond the limbus", count: 0 },
      { label: "direction different", count: 3 },
    ];
    expect(describeLeftOut(leftOut)).toBe("Left out: 12 not readable, 3 direction different.");
    expect(describeLeftOut([])).toBeNull();
  });
  it("lists who is on a spot, and how many more", () => {
    const labels = ["Case 1", "Case 2", "Case 3", "Case 4", "Case 5", "Case 6"];
    expect(pointTip({ id: "a", mean: 17.5, difference: -5, count: 6, labels }, "°", agreement)).toEqual({
      title: "−5°",
      lines: ["at a mean of 17.5°", "6 readings", "Case 1", "Case 2", "Case 3", "Case 4", "and 2 more"],
    });
  });
  it("holds zero, all readings and the bands on its axes", () => {
    const points = [{ id: "a", mean: -32, difference: 18 }];
    const y = differenceAxis(points, agreement);
    expect(y.low).toBeLessThan(-11);
    expect(y.high).toBeGreaterThan(18);
    expect(y.ticks).toContain(0);
    const x = meanAxis(points);
    expect(x.low).toBeLessThanOrEqual(-35);
    expect(x.ticks).toEqual([-30, -15, 0, 15]);
    expect(meanAxis([]).low).toBe(0);
  });
});
