import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Convention } from "@/lib/reflex/convention";
import { degreesFromDisplacement, displacementFromDegrees } from "@/lib/reflex/displacement";
import { prismDioptres } from "@/lib/reflex/prism";
// Hirschberg ratios from abstracts of the papers named there; conversions computed with R.
import published from "../../reference/optics-hirschberg-published.json";
// Gullstrand No. 1 (exact) schematic eye: decentration = (7.7 − 3.05 mm)·sin θ, computed with R.
import geometry from "../../reference/optics-reflex-geometry.json";
// Rules of thumb: common practice, no source. Exact values beside them computed with R.
import rules from "../../reference/optics-rules-of-thumb.json";

const schematicEye: Convention = { kind: "schematicEye" };
const landmarks: Convention = { kind: "landmarks" };
const perMm = (degreesPerMm: number): Convention => ({ kind: "perMm", degreesPerMm });

function expectClose(actual: number | null, expected: number): void {
  expect(Math.abs((actual ?? Number.NaN) - expected)).toBeLessThanOrEqual(1e-10 + 1e-9 * Math.abs(expected));
}

describe("the schematic eye", () => {
  const { table, inverse } = geometry.expected;

  it("gives the published decentrations from 0.5° to 60°", () => {
    for (const [index, degrees] of table.degrees.entries()) {
      expectClose(displacementFromDegrees(degrees, schematicEye), table.decentrationMm[index] ?? Number.NaN);
    }
  });

  it("gives the degrees and prism dioptres of 0.1 to 4.5 mm", () => {
    for (const { decentrationMm, degrees, prismDioptres: dioptres } of inverse) {
      const read = degreesFromDisplacement(decentrationMm, schematicEye);
      expectClose(read, degrees);
      expectClose(prismDioptres(read ?? Number.NaN), dioptres);
    }
  });

  it("takes another corneal radius and pupil depth", () => {
    const { cornealRadiusMm, entrancePupilDepthMm } = geometry.data;
    const named: Convention = { kind: "schematicEye", cornealRadiusMm, entrancePupilDepthMm };
    expect(degreesFromDisplacement(1, named)).toBe(degreesFromDisplacement(1, schematicEye));
    expectClose(displacementFromDegrees(30, { ...named, cornealRadiusMm: 8 }), 2.475); // (8 − 3.05)/2
  });

  it("contradicts the rules of thumb by the published amounts", () => {
    expectClose(degreesFromDisplacement(1, schematicEye), rules.expected.geometricDegreesFor1mm);
    expectClose(degreesFromDisplacement(2, schematicEye), rules.expected.geometricDegreesForPupilMargin_pupil4mm);
    expectClose(degreesFromDisplacement(1.5, schematicEye), rules.expected.geometricDegreesForPupilMargin_pupil3mm);
  });

  it("lies near zero where measurements lie: 19 to 23Δ and 11 to 13.5° per mm", () => {
    const degreesPerMm = (degreesFromDisplacement(1e-6, schematicEye) ?? 0) * 1e6;
    expectClose(degreesPerMm, published.expected.geometricDegreesPerMm);
    expectClose(prismDioptres(degreesPerMm * 1e-6) * 1e6, published.expected.geometricPrismDioptresPerMm);
    expect(degreesPerMm).toBeGreaterThan(11);
    expect(degreesPerMm).toBeLessThan(13.5);
  });

  it("has no angle for a displacement that no rotation gives, and no place for more than 90°", () => {
    expectClose(degreesFromDisplacement(4.65, schematicEye), 90);
    expect(degreesFromDisplacement(4.66, schematicEye)).toBeNull();
    expect(displacementFromDegrees(91, schematicEye)).toBeNull();
  });
});

describe("a figure per mm", () => {
  it("reads the taught 7° at 1 mm", () => {
    const rule = rules.data.rules.find((candidate) => candidate.rule === "1 mm of decentration");
    expect(degreesFromDisplacement(1, perMm(rule?.degrees ?? 0))).toBe(7);
  });

  it("gives the mm, degrees and prism dioptres of Hasebe et al. 1995, as rounded in their abstract", () => {
    const entry = published.data.entries.find(({ id }) => id === "hasebe1995");
    const { mm = Number.NaN, degrees = Number.NaN, prismDioptres: dioptres = Number.NaN } = entry ?? {};
    const read = degreesFromDisplacement(mm, perMm(published.expected.hasebe1995.degreesPerMm));
    expectClose(read, degrees);
    expect(prismDioptres(read ?? Number.NaN)).toBeCloseTo(dioptres, 1);
  });

  // A reader on 7° per mm reads a true 20° as about 12°: 1.67 mm by the levers of Barry & Backes 1997 (see
  // landmark-rule-reading), 1.59 mm by the schematic eye. On 12° per mm the same reflex is read as 19° to 20°.
  it("reads a true 20° as 11° to 12° on 7° per mm and as 19° to 20° on 12° per mm", () => {
    const mm = displacementFromDegrees(20, schematicEye) ?? Number.NaN;
    expect(degreesFromDisplacement(mm, perMm(7))).toBeCloseTo(11.1, 1);
    expect(degreesFromDisplacement(mm, perMm(12))).toBeCloseTo(19.1, 1);
    expect(degreesFromDisplacement(4.884 * Math.sin(Math.PI / 9), perMm(7))).toBeCloseTo(11.7, 1);
    expect(degreesFromDisplacement(4.884 * Math.sin(Math.PI / 9), perMm(12))).toBeCloseTo(20.0, 1);
  });

  it("is the same from whichever centre it is measured", () => {
    expect(degreesFromDisplacement(2, { kind: "perMm", degreesPerMm: 11, from: "limbus-centre" })).toBe(22);
  });
});

describe("the landmark rule", () => {
  it("reads 15° at the pupil margin, 30° midway and 45° at the limbus", () => {
    const [margin, midway, limbus] = [2, (2 + 5.85) / 2, 5.85];
    expect([0, margin, midway, limbus].map((mm) => degreesFromDisplacement(mm, landmarks))).toEqual([0, 15, 30, 45]);
    for (const rule of rules.data.rules.filter((candidate) => candidate.rule.startsWith("reflex"))) {
      expect([15, 30, 45]).toContain(rule.degrees);
    }
  });

  it("goes straight between landmarks", () => {
    expectClose(degreesFromDisplacement(1, landmarks), 7.5);
    expectClose(degreesFromDisplacement((2 + 3.925) / 2, landmarks), 22.5);
    expectClose(degreesFromDisplacement((3.925 + 5.85) / 2, landmarks), 37.5);
  });

  it("follows the pupil and the iris of the picture", () => {
    const small: Convention = { kind: "landmarks", pupilMm: 3, hvidMm: 11 };
    expectClose(degreesFromDisplacement(1.5, small), 15);
    expectClose(degreesFromDisplacement(3.5, small), 30);
    expectClose(degreesFromDisplacement(5.5, small), 45);
    expect(degreesFromDisplacement(5.6, small)).toBeNull();
  });

  it("has no number beyond the limbus, either way", () => {
    expect(degreesFromDisplacement(5.86, landmarks)).toBeNull();
    expect(degreesFromDisplacement(-5.86, landmarks)).toBeNull();
    expect(displacementFromDegrees(46, landmarks)).toBeNull();
  });
});

describe("every convention", () => {
  const conventions = [landmarks, { kind: "landmarks", pupilMm: 2.5 } as const, perMm(7), perMm(12), schematicEye];
  const anyConvention = fc.constantFrom<Convention[]>(...conventions);

  it("undoes itself, keeps the sign and knows 0", () => {
    fc.assert(
      fc.property(
        anyConvention,
        fc.double({ min: 1e-6, max: 45, noNaN: true }),
        fc.constantFrom(1, -1),
        (convention, size, sign) => {
          const degrees = sign * size;
          const mm = displacementFromDegrees(degrees, convention) ?? Number.NaN;
          expect(Math.sign(mm)).toBe(Math.sign(degrees));
          expectClose(degreesFromDisplacement(mm, convention), degrees);
          expectClose(displacementFromDegrees(-degrees, convention), -mm);
        },
      ),
    );
    for (const convention of conventions) {
      expectClose(degreesFromDisplacement(displacementFromDegrees(45, convention) ?? Number.NaN, convention), 45);
      expect(degreesFromDisplacement(0, convention)).toBe(0);
      expect(displacementFromDegrees(0, convention)).toBe(0);
    }
  });

  it("grows with the displacement", () => {
    const mm = fc.double({ min: 0, max: 4.6, noNaN: true });
    fc.assert(
      fc.property(anyConvention, mm, mm, (convention, first, second) => {
        const [less, more] = [Math.min(first, second), Math.max(first, second)];
        expect(degreesFromDisplacement(less, convention)).toBeLessThanOrEqual(
          degreesFromDisplacement(more, convention) ?? Number.NaN,
        );
      }),
    );
  });

  it("throws on what is no number and on an eye that cannot be", () => {
    for (const convention of conventions) {
      expect(() => degreesFromDisplacement(Number.NaN, convention)).toThrow(RangeError);
      expect(() => displacementFromDegrees(Number.POSITIVE_INFINITY, convention)).toThrow(RangeError);
    }
    for (const convention of [
      perMm(0),
      perMm(-7),
      perMm(Number.NaN),
      { kind: "landmarks", pupilMm: 0 },
      { kind: "landmarks", pupilMm: 12, hvidMm: 11.7 },
      { kind: "schematicEye", cornealRadiusMm: 3 },
    ] satisfies Convention[]) {
      expect(() => degreesFromDisplacement(1, convention)).toThrow(RangeError);
      expect(() => displacementFromDegrees(1, convention)).toThrow(RangeError);
    }
  });
});
