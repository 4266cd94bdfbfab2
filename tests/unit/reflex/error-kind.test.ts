import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { directionLabel } from "@/lib/reflex/direction-label";
import { BLUNDERS, ERROR_KINDS, errorKind, isBlunder, isNamedOnOtherEye } from "@/lib/reflex/error-kind";
import { ALIGNED, type Finding } from "@/lib/reflex/finding";
import { mirrorFinding } from "@/lib/reflex/mirror-finding";
import { nameVerticalOnEye } from "@/lib/reflex/name-vertical-on-eye";
import { DEFAULT_TOLERANCE, isWithinTolerance } from "@/lib/reflex/tolerance";
import { arbitraryFinding } from "./arbitrary-finding";
import { deviation } from "./build-finding";

const blurred: Finding = { readable: false, reason: "blurred" };
const leftExo = deviation("left", { exo: 30 });
const combined = deviation("left", { exo: 30, hypo: 15 });

describe("errorKind", () => {
  it.each<[string, Finding, Finding]>([
    ["not readable against readable", blurred, leftExo],
    ["not readable against readable", leftExo, blurred],
    ["not readable against readable", blurred, ALIGNED],
    ["squint called on an aligned pair", deviation("right", { eso: 2 }), ALIGNED],
    ["squint missed", ALIGNED, leftExo],
    ["squint missed", ALIGNED, deviation("right", { hyper: 3 })],
    ["horizontal direction reversed", deviation("left", { eso: 30 }), leftExo],
    ["vertical direction reversed", deviation("left", { exo: 30, hyper: 15 }), combined],
    ["vertical direction reversed", deviation("right", { hypo: 15 }), deviation("right", { hyper: 15 })],
    ["vertical direction reversed", deviation("left", { hyper: 15 }), deviation("right", { hyper: 15 })],
    ["other eye", deviation("right", { exo: 30 }), leftExo],
    ["vertical part missed or added", leftExo, combined],
    ["vertical part missed or added", combined, leftExo],
    ["horizontal part missed or added", deviation("left", { hypo: 15 }), combined],
    ["horizontal part missed or added", deviation("left", { exo: 8, hypo: 15 }), deviation("left", { hypo: 15 })],
    ["unit slip", deviation("left", { exo: 35 }), deviation("left", { exo: 17 })],
    ["unit slip", deviation("left", { exo: 15 }), leftExo],
    ["size outside tolerance", deviation("left", { exo: 20 }), leftExo],
    ["size outside tolerance", deviation("left", { exo: ">45" }), leftExo],
    ["size outside tolerance", deviation("left", { exo: 45 }), deviation("left", { exo: ">45" })],
  ])("calls it: %s", (kind, reading, reference) => {
    expect(errorKind(reading, reference)).toBe(kind);
  });

  it.each<[string, Finding, Finding]>([
    ["horizontal before vertical and eye", deviation("right", { eso: 30, hypo: 15 }), combined],
    ["horizontal before unit slip", deviation("left", { eso: 15 }), leftExo],
  ])("gives the first kind that fits: %s", (_name, reading, reference) => {
    expect(errorKind(reading, reference)).toBe("horizontal direction reversed");
  });

  it("looks for the vertical sense before the eye, the eye before parts, and vertical parts before horizontal", () => {
    expect(errorKind(deviation("right", { exo: 30, hypo: 15 }), combined)).toBe("vertical direction reversed");
    expect(errorKind(deviation("right", { exo: 30 }), combined)).toBe("other eye");
    expect(errorKind(deviation("left", { hypo: 10 }), leftExo)).toBe("vertical part missed or added");
  });

  it("keeps the words and the order", () => {
    expect(ERROR_KINDS).toEqual([
      "not readable against readable",
      "squint called on an aligned pair",
      "squint missed",
      "horizontal direction reversed",
      "vertical direction reversed",
      "other eye",
      "vertical part missed or added",
      "horizontal part missed or added",
      "unit slip",
      "size outside tolerance",
    ]);
    expect(BLUNDERS).toEqual(ERROR_KINDS.slice(0, 8));
    expect(ERROR_KINDS.map(isBlunder)).toEqual([...Array(8).fill(true), false, false]);
    expect(isBlunder(null)).toBe(false);
  });

  it("finds nothing wrong with a photograph called not readable by both, whatever the reasons", () => {
    expect(errorKind(blurred, { readable: false, reason: "needs-cover-test" })).toBeNull();
  });

  it("accepts aligned for a borderline reference, and a borderline part left out beside a clear one", () => {
    expect(errorKind(ALIGNED, deviation("right", { eso: 4 }))).toBeNull();
    expect(errorKind(ALIGNED, deviation("right", { eso: 4, hyper: 2 }))).toBeNull();
    expect(errorKind(ALIGNED, deviation("right", { eso: 4, hyper: 3 }))).toBe("squint missed");
    expect(errorKind(deviation("left", { exo: 30 }), deviation("left", { exo: 30, hypo: 2 }))).toBeNull();
    expect(errorKind(deviation("left", { hypo: 15 }), deviation("left", { exo: 4, hypo: 15 }))).toBeNull();
    expect(errorKind(deviation("right", { exo: 4 }), deviation("right", { eso: 4 }))).toBe(
      "horizontal direction reversed",
    );
  });
});

describe("errorKind by the department's own tolerance", () => {
  it("holds sizes to it", () => {
    const strict = { ...DEFAULT_TOLERANCE, absoluteDegrees: 1, relative: 0.05 };
    expect(errorKind(deviation("left", { exo: 32 }), leftExo, strict)).toBe("size outside tolerance");
    expect(errorKind(deviation("left", { exo: 8 }), deviation("left", { exo: 4 }), strict)).toBe("unit slip");
    expect(errorKind(deviation("left", { exo: 32 }), leftExo)).toBeNull();
  });

  it("takes its borderline", () => {
    const wider = { ...DEFAULT_TOLERANCE, borderlineHorizontalDegrees: 9, borderlineVerticalDegrees: 7 };
    expect(errorKind(ALIGNED, deviation("left", { exo: 8, hypo: 6 }), wider)).toBeNull();
    expect(errorKind(ALIGNED, deviation("left", { exo: 9 }), wider)).toBe("squint missed");
  });
});

describe("the same vertical deviation named on the other eye", () => {
  const rightHyper = deviation("right", { hyper: 15 });
  const leftHypo = deviation("left", { hypo: 15 });

  it("is no error and is reported apart", () => {
    expect(errorKind(leftHypo, rightHyper)).toBeNull();
    expect(isNamedOnOtherEye(leftHypo, rightHyper)).toBe(true);
    expect(isNamedOnOtherEye(rightHyper, rightHyper)).toBe(false);
    expect(isNamedOnOtherEye(deviation("left", { hyper: 15 }), rightHyper)).toBe(false);
    expect(isNamedOnOtherEye(blurred, rightHyper)).toBe(false);
    expect(isNamedOnOtherEye(ALIGNED, rightHyper)).toBe(false);
  });

  it("is held to its size like any other", () => {
    expect(errorKind(deviation("left", { hypo: 26 }), rightHyper)).toBe("unit slip");
    expect(errorKind(deviation("left", { hypo: 22 }), rightHyper)).toBe("size outside tolerance");
  });

  it("does not excuse the other eye where a horizontal part says which eye deviates", () => {
    expect(errorKind(deviation("right", { exo: 30, hyper: 15 }), combined)).toBe("other eye");
    expect(isNamedOnOtherEye(deviation("right", { exo: 30, hyper: 15 }), combined)).toBe(false);
    expect(errorKind(rightHyper, combined)).toBe("other eye");
  });

  it("leaves a horizontal part added to it as that", () => {
    expect(errorKind(deviation("left", { exo: 10, hypo: 15 }), rightHyper)).toBe("horizontal part missed or added");
  });
});

describe("unit slip", () => {
  const exo = (degrees: number) => deviation("left", { exo: degrees });

  it("is a ratio of 1.7 to 2.2 or 0.45 to 0.58, ends included", () => {
    expect(errorKind(exo(17), exo(10))).toBe("unit slip"); // 1.70
    expect(errorKind(exo(16), exo(10))).toBe("size outside tolerance");
    expect(errorKind(exo(22), exo(10))).toBe("unit slip"); // 2.20
    expect(errorKind(exo(23), exo(10))).toBe("size outside tolerance");
    expect(errorKind(exo(18), exo(40))).toBe("unit slip"); // 0.45
    expect(errorKind(exo(17), exo(40))).toBe("size outside tolerance");
    expect(errorKind(exo(23), exo(40))).toBe("unit slip"); // 0.575
    expect(errorKind(exo(24), exo(40))).toBe("size outside tolerance"); // 0.60
  });

  it("is nothing where the size is within tolerance", () => {
    expect(errorKind(exo(8), exo(4))).toBeNull(); // twice as much, and within 5°
  });

  it("must explain every part outside tolerance, in one sense", () => {
    const reference = deviation("left", { exo: 16, hypo: 14 });
    expect(errorKind(deviation("left", { exo: 30, hypo: 26 }), reference)).toBe("unit slip");
    expect(errorKind(deviation("left", { exo: 30, hypo: 14 }), reference)).toBe("unit slip");
    expect(errorKind(deviation("left", { exo: 30, hypo: 7 }), reference)).toBe("size outside tolerance");
    expect(errorKind(deviation("left", { exo: 30, hypo: 40 }), reference)).toBe("size outside tolerance");
  });
});

describe("errorKind, always", () => {
  it("is null for a finding against itself", () => {
    fc.assert(
      fc.property(arbitraryFinding, (finding) => {
        expect(errorKind(finding, finding)).toBeNull();
      }),
    );
  });

  it("stays the same when both are mirrored", () => {
    fc.assert(
      fc.property(arbitraryFinding, arbitraryFinding, (reading, reference) => {
        expect(errorKind(mirrorFinding(reading), mirrorFinding(reference))).toBe(errorKind(reading, reference));
      }),
    );
  });

  it("is null exactly for the same direction label within tolerance, naming on either eye and borderline apart", () => {
    const noBorderline = { ...DEFAULT_TOLERANCE, borderlineHorizontalDegrees: 0, borderlineVerticalDegrees: 0 };
    fc.assert(
      fc.property(arbitraryFinding, arbitraryFinding, (reading, reference) => {
        const eye = reference.readable && reference.eye !== "none" ? reference.eye : "right";
        const named = nameVerticalOnEye(reading, eye);
        const agrees =
          directionLabel(named) === directionLabel(reference) && isWithinTolerance(reading, reference, noBorderline);
        expect(errorKind(reading, reference, noBorderline) === null).toBe(agrees);
      }),
      { numRuns: 3000 },
    );
  });

  it("is a blunder exactly when the direction label differs, naming on either eye and borderline apart", () => {
    const noBorderline = { ...DEFAULT_TOLERANCE, borderlineHorizontalDegrees: 0, borderlineVerticalDegrees: 0 };
    fc.assert(
      fc.property(arbitraryFinding, arbitraryFinding, (reading, reference) => {
        const eye = reference.readable && reference.eye !== "none" ? reference.eye : "right";
        const isSame = directionLabel(nameVerticalOnEye(reading, eye)) === directionLabel(reference);
        expect(isBlunder(errorKind(reading, reference, noBorderline))).toBe(!isSame);
      }),
      { numRuns: 3000 },
    );
  });
});
