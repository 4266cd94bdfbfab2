import { describe, expect, it } from "vitest";
import { ALIGNED } from "@/lib/reflex/finding";
import { STEPS, stepOf, stepOfFinding } from "@/lib/reflex/step";
import { deviation } from "./build-finding";

describe("stepOf", () => {
  it("sends every whole degree to the nearest step", () => {
    const wholeDegrees = Array.from({ length: 46 }, (_, degrees) => degrees);
    const steps = [0, 15, 30, 45];
    for (const degrees of wholeDegrees) {
      const distances = steps.map((step) => Math.abs(step - degrees));
      expect(stepOf(degrees)).toBe(steps[distances.indexOf(Math.min(...distances))]);
    }
    expect([7, 8, 22, 23, 37, 38].map(stepOf)).toEqual([0, 15, 15, 30, 30, 45]);
  });

  it("sends ties to the larger step", () => {
    expect([7.5, 22.5, 37.5].map(stepOf)).toEqual([15, 30, 45]);
  });

  it("keeps beyond the limbus as a step of its own", () => {
    expect(stepOf(">45")).toBe(">45");
    expect(stepOf(45)).toBe(45);
    expect(STEPS).toEqual([0, 15, 30, 45, ">45"]);
  });

  it("throws on what is no size", () => {
    for (const degrees of [-1, 46, Number.NaN, Number.POSITIVE_INFINITY]) {
      expect(() => stepOf(degrees)).toThrow(RangeError);
    }
  });
});

describe("stepOfFinding", () => {
  it("goes by the larger part when there are two", () => {
    expect(stepOfFinding(deviation("left", { exo: 30, hypo: 15 }))).toBe(30);
    expect(stepOfFinding(deviation("left", { exo: 5, hypo: 16 }))).toBe(15);
    expect(stepOfFinding(deviation("right", { eso: 45, hyper: ">45" }))).toBe(">45");
  });

  it("is 0 when aligned and null when not readable", () => {
    expect(stepOfFinding(deviation("left", { hypo: 20 }))).toBe(15);
    expect(stepOfFinding(ALIGNED)).toBe(0);
    expect(stepOfFinding({ readable: false, reason: "blurred" })).toBeNull();
  });
});
