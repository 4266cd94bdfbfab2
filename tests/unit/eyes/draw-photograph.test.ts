import { createHash } from "node:crypto";
import { describe, expect, it } from "vitest";
import { drawPhotograph } from "@/lib/eyes/draw-photograph";
import { completeParameters, type PhotographParameters } from "@/lib/eyes/parameters";
import type { PhotographTruth } from "@/lib/eyes/truth-in-pixels";
import { EXPECTED_PIXELS } from "./expected-pixels";

const TIMEOUT_MS = 120_000;

const SMALL: PhotographParameters = { seed: 9, skin: "D", iris: "umber", width: 320, height: 140, grain: 0 };

/** The middle of the light that is near white, in the half of the picture that shows one eye. */
function findReflex(data: Uint8Array, width: number, height: number, fromX: number, toX: number) {
  let sum = 0;
  let sumX = 0;
  let sumY = 0;
  for (let y = Math.round(height * 0.42); y < height * 0.68; y++) {
    for (let x = fromX; x < toX; x++) {
      if ((data[(y * width + x) * 3 + 2] ?? 0) < 240) continue;
      sum += 1;
      sumX += x + 0.5;
      sumY += y + 0.5;
    }
  }
  return { x: sumX / sum, y: sumY / sum };
}

describe("drawPhotograph", () => {
  it.each(EXPECTED_PIXELS)("keeps every byte of $name", { timeout: TIMEOUT_MS }, ({ parameters, sha256 }) => {
    const { data } = drawPhotograph(parameters);
    expect(createHash("sha256").update(data).digest("hex")).toBe(sha256);
  });

  it.each([
    { name: "aligned", right: {}, left: {} },
    { name: "right eso 30", right: { esoDegrees: 30 }, left: {} },
    { name: "left exo 15, hypo 10", right: {}, left: { esoDegrees: -15, hyperDegrees: -10 } },
  ])("draws the reflex where the truth says: $name", { timeout: TIMEOUT_MS }, ({ right, left }) => {
    const { data, width, height, truth } = drawPhotograph({ ...SMALL, tiltDegrees: 4, right, left });
    const off = (eye: keyof PhotographTruth["eyes"], fromX: number, toX: number) => {
      const drawn = findReflex(data, width, height, fromX, toX);
      const [x, y] = truth.eyes[eye].reflex;
      return Math.hypot(drawn.x - x, drawn.y - y);
    };
    expect(off("right", 0, width / 2)).toBeLessThan(0.5);
    expect(off("left", width / 2, width)).toBeLessThan(0.5);
  });

  it("leaves no reflex where its brightness is 0", { timeout: TIMEOUT_MS }, () => {
    const { data, width, height } = drawPhotograph({ ...SMALL, reflexBrightness: 0 });
    expect(findReflex(data, width, height, 0, width)).toEqual({ x: Number.NaN, y: Number.NaN });
  });
});

describe("completeParameters", () => {
  it("draws another face from another seed, and the same from the same", () => {
    const { right, left, seed, ...face } = completeParameters({ seed: 3 });
    const { right: _, left: __, seed: ___, ...again } = completeParameters({ seed: 3 });
    const { seed: ____, ...other } = completeParameters({ seed: 4 });
    expect(again).toEqual(face);
    expect(other.browArch).not.toBe(face.browArch);
  });

  it("lets an eye say its own pupil and iris", () => {
    const { right, left } = completeParameters({ pupilMm: 3, iris: "green", left: { pupilMm: 5, iris: "brown" } });
    expect(right).toMatchObject({ pupilMm: 3, iris: "green" });
    expect(left).toMatchObject({ pupilMm: 5, iris: "brown" });
  });
});
