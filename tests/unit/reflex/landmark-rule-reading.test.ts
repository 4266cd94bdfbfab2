import { describe, expect, it } from "vitest";
import { landmarkRuleReading } from "@/lib/reflex/landmark-rule-reading";

const degrees = (radians: number) => (radians * 180) / Math.PI;

describe("landmarkRuleReading", () => {
  // Where each landmark is truly reached, from tan θ = edge / lever by hand; levers after Barry & Backes 1997.
  // The rounded angles are those of our notes on the rule: 14, 22 and 32° for the margin of a 2.5, 4 and 6 mm pupil,
  // 35, 38 and 41° for midway, 48° for the limbus (46° at an iris of 11.0 mm, 50° at 12.5).
  it.each([
    [2.5, 11.7, 14, 35, 48],
    [4, 11.7, 22, 38, 48],
    [6, 11.7, 32, 41, 48],
    [4, 11.0, 22, 37, 46],
    [4, 12.5, 22, 39, 50],
  ])(
    "reads its landmarks where a pupil of %d mm in an iris of %d mm has them",
    (pupilMm, hvidMm, margin, midway, limbus) => {
      const eye = { pupilMm, hvidMm };
      const trueMargin = degrees(Math.atan(pupilMm / 2 / 4.884));
      const trueMidway = degrees(Math.atan((pupilMm + hvidMm) / 2 / (4.884 + 5.243)));
      const trueLimbus = degrees(Math.atan(hvidMm / 2 / 5.243));
      expect([trueMargin, trueMidway, trueLimbus].map(Math.round)).toEqual([margin, midway, limbus]);
      expect(landmarkRuleReading(trueMargin, eye)).toBeCloseTo(15, 9);
      expect(landmarkRuleReading(trueMidway, eye)).toBeCloseTo(30, 9);
      expect(landmarkRuleReading(trueLimbus - 1e-9, eye)).toBeCloseTo(45, 6);
    },
  );

  it("reads too little below the limbus with a pupil of 4 mm", () => {
    for (let trueDegrees = 1; trueDegrees <= 48; trueDegrees += 1) {
      expect(landmarkRuleReading(trueDegrees)).toBeLessThan(trueDegrees);
    }
    expect(landmarkRuleReading(0)).toBe(0);
  });

  it("has no number beyond the limbus", () => {
    expect(landmarkRuleReading(49)).toBeNull();
    expect(landmarkRuleReading(89)).toBeNull();
  });

  it("throws outside 0 to 90 degrees", () => {
    for (const outside of [-1, 90, Number.NaN]) expect(() => landmarkRuleReading(outside)).toThrow(RangeError);
  });
});
