import { describe, expect, it } from "vitest";
import { findTruthInPixels } from "@/lib/eyes/truth-in-pixels";

describe("findTruthInPixels", () => {
  it("counts pixels from the top left corner of the picture", () => {
    // 1600 px show 100 mm, so 16 px to a mm; eyes 60 mm apart about the middle, on the middle line of 700 px.
    const truth = findTruthInPixels({ fieldMm: 100, pupilDistanceMm: 60, eyeLevel: 0.5, kappaMm: 0.5 });
    expect(truth.pxPerMm).toBe(16);
    expect(truth.eyes.right.pupilCentre).toEqual([320, 350]);
    expect(truth.eyes.left.pupilCentre).toEqual([1280, 350]);
    expect(truth.eyes.right.reflex).toEqual([328, 350]);
    expect(truth.eyes.left.reflex).toEqual([1272, 350]);
    expect(truth.eyes.right.limbusTemporal).toEqual([226.4, 350]);
    expect(truth.eyes.right.limbusNasal).toEqual([413.6, 350]);
  });

  it("turns with the head, clockwise for the viewer", () => {
    const { right, left } = findTruthInPixels({ tiltDegrees: 5 }).eyes;
    expect(left.pupilCentre[1]).toBeGreaterThan(right.pupilCentre[1]);
  });

  it("narrows the limbus of a turned eye and keeps its height", () => {
    const { right, left } = findTruthInPixels({ right: { esoDegrees: 40 } }).eyes;
    const span = (ring: (typeof right)["limbus"], axis: 0 | 1) =>
      Math.max(...ring.map((point) => point[axis])) - Math.min(...ring.map((point) => point[axis]));
    expect(span(right.limbus, 0) / span(left.limbus, 0)).toBeCloseTo(Math.cos((40 * Math.PI) / 180), 2);
    expect(span(right.limbus, 1)).toBeCloseTo(span(left.limbus, 1), 1);
  });
});
