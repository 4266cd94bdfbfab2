import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ALIGNED, type Finding } from "@/lib/reflex/finding";
import { mirrorFinding } from "@/lib/reflex/mirror-finding";
import { DEFAULT_TOLERANCE, isWithinTolerance } from "@/lib/reflex/tolerance";
import { arbitraryFinding } from "./arbitrary-finding";
import { deviation } from "./build-finding";

const blurred: Finding = { readable: false, reason: "blurred" };

describe("isWithinTolerance", () => {
  it.each([
    [10, 5, true],
    [10, 15, true],
    [10, 4, false],
    [10, 16, false],
    [19, 24, true], // 25% of 19 would be less than 5
    [20, 25, true],
    [20, 26, false],
    [21, 26, true], // 25% of 21 is 5.25
    [21, 27, false],
    [40, 30, true],
    [40, 29, false],
    [36, 45, true],
  ])(
    "allows 5° up to a reference of 20° and a quarter above: reference %d°, reading %d°",
    (reference, reading, expected) => {
      expect(isWithinTolerance(deviation("left", { exo: reading }), deviation("left", { exo: reference }))).toBe(
        expected,
      );
      expect(isWithinTolerance(deviation("left", { hypo: reading }), deviation("left", { hypo: reference }))).toBe(
        expected,
      );
    },
  );

  it("needs both components to hold", () => {
    const reference = deviation("left", { exo: 30, hypo: 15 });
    expect(isWithinTolerance(deviation("left", { exo: 35, hypo: 12 }), reference)).toBe(true);
    expect(isWithinTolerance(deviation("left", { exo: 30, hypo: 25 }), reference)).toBe(false);
    expect(isWithinTolerance(deviation("left", { exo: 15, hypo: 15 }), reference)).toBe(false);
    expect(isWithinTolerance(deviation("left", { exo: 30 }), reference)).toBe(false);
  });

  it("compares signed sizes: a reversed direction is far off, the eye named is not in them", () => {
    expect(isWithinTolerance(deviation("left", { eso: 15 }), deviation("left", { exo: 15 }))).toBe(false);
    expect(isWithinTolerance(deviation("right", { hyper: 15 }), deviation("left", { hyper: 15 }))).toBe(false);
    expect(isWithinTolerance(deviation("right", { hyper: 15 }), deviation("left", { hypo: 15 }))).toBe(true);
  });

  it("holds beyond the limbus equal to beyond the limbus alone, in the same direction", () => {
    const reference = deviation("right", { eso: ">45" });
    expect(isWithinTolerance(deviation("right", { eso: ">45" }), reference)).toBe(true);
    expect(isWithinTolerance(deviation("right", { eso: 45 }), reference)).toBe(false);
    expect(isWithinTolerance(deviation("right", { exo: ">45" }), reference)).toBe(false);
    expect(isWithinTolerance(reference, deviation("right", { eso: 45 }))).toBe(false);
    expect(isWithinTolerance(ALIGNED, reference)).toBe(false);
  });

  it("accepts aligned for a reference below 5° horizontally or 3° vertically, whatever the department allows", () => {
    const strict = { ...DEFAULT_TOLERANCE, absoluteDegrees: 1 };
    expect(isWithinTolerance(ALIGNED, deviation("right", { eso: 4 }), strict)).toBe(true);
    expect(isWithinTolerance(ALIGNED, deviation("right", { eso: 5 }), strict)).toBe(false);
    expect(isWithinTolerance(ALIGNED, deviation("right", { hyper: 2 }), strict)).toBe(true);
    expect(isWithinTolerance(ALIGNED, deviation("right", { hyper: 3 }), strict)).toBe(false);
    expect(isWithinTolerance(ALIGNED, deviation("right", { eso: 4, hyper: 3 }), strict)).toBe(false);
    expect(isWithinTolerance(deviation("right", { eso: 30 }), deviation("right", { eso: 30, hyper: 2 }), strict)).toBe(
      true,
    );
  });

  it("still holds a borderline reference against a reading that sees a deviation", () => {
    expect(isWithinTolerance(deviation("right", { eso: 12 }), deviation("right", { eso: 4 }))).toBe(false);
    expect(isWithinTolerance(deviation("right", { eso: 9 }), deviation("right", { eso: 4 }))).toBe(true);
    expect(isWithinTolerance(deviation("right", { hyper: 7 }), deviation("right", { hyper: 2 }))).toBe(true);
  });

  it("goes by the department's own figures", () => {
    const own = { ...DEFAULT_TOLERANCE, absoluteDegrees: 3, absoluteUpToDegrees: 10, relative: 0.15 };
    expect(isWithinTolerance(deviation("left", { exo: 14 }), deviation("left", { exo: 10 }), own)).toBe(false);
    expect(isWithinTolerance(deviation("left", { exo: 34 }), deviation("left", { exo: 40 }), own)).toBe(true);
    expect(isWithinTolerance(deviation("left", { exo: 33 }), deviation("left", { exo: 40 }), own)).toBe(false);
    const wider = { ...DEFAULT_TOLERANCE, absoluteDegrees: 1, borderlineHorizontalDegrees: 9 };
    expect(isWithinTolerance(ALIGNED, deviation("left", { exo: 8 }), wider)).toBe(true);
  });

  it("agrees on not readable, whatever the reason, and never with a readable finding", () => {
    expect(isWithinTolerance(blurred, { readable: false, reason: "needs-cover-test" })).toBe(true);
    expect(isWithinTolerance(blurred, ALIGNED)).toBe(false);
    expect(isWithinTolerance(ALIGNED, blurred)).toBe(false);
  });

  it("holds for every finding against itself, and alike when both are mirrored", () => {
    fc.assert(
      fc.property(arbitraryFinding, arbitraryFinding, (reading, reference) => {
        expect(isWithinTolerance(reading, reading)).toBe(true);
        expect(isWithinTolerance(mirrorFinding(reading), mirrorFinding(reference))).toBe(
          isWithinTolerance(reading, reference),
        );
      }),
    );
  });
});
