import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  ALIGNED,
  type Degrees,
  type Eye,
  type Horizontal,
  type ReadableFinding,
  type Vertical,
} from "@/lib/reflex/finding";
import {
  eyesOnMap,
  jitterMm,
  landmarkDistanceMm,
  READING_MAP_MM,
  readingMapPosition,
} from "@/lib/reflex/reading-map-position";

function deviation(eye: Eye, horizontal?: [Horizontal, Degrees], vertical?: [Vertical, Degrees]): ReadableFinding {
  return {
    readable: true,
    eye,
    horizontal: horizontal?.[0] ?? "none",
    horizontalDegrees: horizontal?.[1] ?? null,
    vertical: vertical?.[0] ?? "none",
    verticalDegrees: vertical?.[1] ?? null,
  };
}

describe("landmarkDistanceMm", () => {
  // The landmark rule is common practice, no source: margin 15, midway 30, limbus 45.
  it("puts 15, 30 and 45 degrees on the three rings", () => {
    expect(landmarkDistanceMm(0)).toBe(0);
    expect(landmarkDistanceMm(15)).toBeCloseTo(READING_MAP_MM.pupil, 10);
    expect(landmarkDistanceMm(30)).toBeCloseTo((READING_MAP_MM.pupil + READING_MAP_MM.limbus) / 2, 10);
    expect(landmarkDistanceMm(45)).toBeCloseTo(READING_MAP_MM.limbus, 10);
  });
  it("never falls as degrees grow, and stays inside the drawn sclera", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 120, noNaN: true }),
        fc.double({ min: 0, max: 30, noNaN: true }),
        (d, more) => {
          expect(landmarkDistanceMm(d + more)).toBeGreaterThanOrEqual(landmarkDistanceMm(d));
          expect(landmarkDistanceMm(d + more)).toBeLessThan(READING_MAP_MM.sclera);
        },
      ),
    );
  });
});

describe("readingMapPosition", () => {
  it("puts the reflex of an eso eye on its temple side and of an exo eye on its nasal side", () => {
    // The patient's right eye stands at the viewer's left: its temple is at smaller x, its nose at larger x.
    expect(readingMapPosition(deviation("right", ["eso", 30]), "right")).toEqual({ x: -3.8, y: 0 });
    expect(readingMapPosition(deviation("right", ["exo", 30]), "right")).toEqual({ x: 3.8, y: 0 });
    expect(readingMapPosition(deviation("left", ["eso", 30]), "left")).toEqual({ x: 3.8, y: 0 });
    expect(readingMapPosition(deviation("left", ["exo", 30]), "left")).toEqual({ x: -3.8, y: 0 });
  });
  it("puts the reflex of a hyper eye below the pupil centre and of a hypo eye above", () => {
    expect(readingMapPosition(deviation("left", undefined, ["hyper", 15]), "left")).toEqual({ x: 0, y: 1.75 });
    expect(readingMapPosition(deviation("right", undefined, ["hypo", 15]), "right")).toEqual({ x: 0, y: -1.75 });
  });
  it("shows an eye that does not deviate slightly to the nose", () => {
    expect(readingMapPosition(ALIGNED, "right")).toEqual({ x: 0.5, y: 0 });
    expect(readingMapPosition(ALIGNED, "left")).toEqual({ x: -0.5, y: 0 });
    expect(readingMapPosition(deviation("left", ["exo", 30]), "right")).toEqual({ x: 0.5, y: 0 });
  });
  it("puts beyond the limbus on the sclera, outside the limbus and inside the drawing", () => {
    const place = readingMapPosition(deviation("right", ["exo", ">45"], ["hypo", ">45"]), "right");
    const far = Math.hypot(place?.x ?? 0, place?.y ?? 0);
    expect(far).toBeGreaterThan(READING_MAP_MM.limbus + 0.5);
    expect(far).toBeLessThan(READING_MAP_MM.sclera - 0.5);
  });
  it("keeps the direction of a combined deviation and measures along it", () => {
    // 3-4-5: 9 degrees across and 12 down are 15 in all, so the reflex lies on the pupil margin.
    const place = readingMapPosition(deviation("left", ["exo", 9], ["hypo", 12]), "left");
    expect(place?.x).toBeCloseTo(-1.75 * 0.6, 10);
    expect(place?.y).toBeCloseTo(-1.75 * 0.8, 10);
  });
  it("has no place for a photograph that cannot be read", () => {
    expect(readingMapPosition({ readable: false, reason: "blurred" }, "right")).toBeNull();
    expect(eyesOnMap({ readable: false, reason: "blurred" })).toEqual([]);
  });
  it("mirrors left to right when the same finding is read on the other eye", () => {
    const degrees = fc.oneof(fc.integer({ min: 1, max: 45 }), fc.constant(">45" as const));
    const across = fc.tuple(fc.constantFrom<Horizontal>("eso", "exo"), degrees);
    const down = fc.tuple(fc.constantFrom<Vertical>("hyper", "hypo"), degrees);
    fc.assert(
      fc.property(across, fc.option(down, { nil: undefined }), (horizontal, vertical) => {
        const right = readingMapPosition(deviation("right", horizontal, vertical), "right");
        const left = readingMapPosition(deviation("left", horizontal, vertical), "left");
        expect(left?.x).toBeCloseTo(-(right?.x ?? Number.NaN), 10);
        expect(left?.y).toBeCloseTo(right?.y ?? Number.NaN, 10);
      }),
    );
  });
});

describe("eyesOnMap", () => {
  it("draws both eyes for an aligned pair and only the deviating one otherwise", () => {
    expect(eyesOnMap(ALIGNED)).toEqual(["right", "left"]);
    expect(eyesOnMap(deviation("left", ["eso", 20]))).toEqual(["left"]);
  });
});

describe("jitterMm", () => {
  it("is the same every time for one seed and index, and differs between them", () => {
    expect(jitterMm(7, 3)).toEqual(jitterMm(7, 3));
    expect(jitterMm(7, 3)).not.toEqual(jitterMm(7, 4));
    expect(jitterMm(7, 3)).not.toEqual(jitterMm(8, 3));
  });
  it("never moves a dot farther than its reach, nor all to one side", () => {
    const shifts = Array.from({ length: 400 }, (_, index) => jitterMm(11, index, 0.4));
    for (const { x, y } of shifts) expect(Math.hypot(x, y)).toBeLessThanOrEqual(0.4);
    const mean = (values: number[]) => values.reduce((sum, v) => sum + v, 0) / values.length;
    // The standard error of each mean is 0.2 / 20 = 0.01 mm.
    expect(Math.abs(mean(shifts.map((s) => s.x)))).toBeLessThan(0.05);
    expect(Math.abs(mean(shifts.map((s) => s.y)))).toBeLessThan(0.05);
  });
});
