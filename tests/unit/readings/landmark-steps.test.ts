import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  ariaPosition,
  percentAlongRule,
  speakDegrees,
  valueAfterKey,
  valueAtShare,
} from "@/components/readings/landmark-steps";
import type { Degrees } from "@/lib/reflex/finding";

const everyValue: Degrees[] = [...Array.from({ length: 45 }, (_, i) => i + 1), ">45"];

describe("the rule as a scale", () => {
  it("gives every value back from the place where it stands", () => {
    for (const value of everyValue) expect(valueAtShare(percentAlongRule(value) / 100)).toBe(value);
  });
  it("answers a whole number from 1 to 45 or >45, wherever a finger goes", () => {
    fc.assert(
      fc.property(fc.double({ min: -2, max: 3, noNaN: true }), (share) => {
        expect(everyValue).toContain(valueAtShare(share));
      }),
    );
  });
  it("orders beyond the limbus after 45, outside the iris", () => {
    expect(ariaPosition(">45")).toBeGreaterThan(ariaPosition(45));
    expect(percentAlongRule(">45")).toBeGreaterThan(percentAlongRule(45));
    expect(percentAlongRule(">45")).toBeLessThan(100);
  });
});

describe("valueAfterKey", () => {
  it("moves by one degree with the arrows, over the limbus and back", () => {
    expect(valueAfterKey(30, "ArrowRight")).toBe(31);
    expect(valueAfterKey(30, "ArrowUp")).toBe(31);
    expect(valueAfterKey(30, "ArrowLeft")).toBe(29);
    expect(valueAfterKey(30, "ArrowDown")).toBe(29);
    expect(valueAfterKey(45, "ArrowRight")).toBe(">45");
    expect(valueAfterKey(">45", "ArrowRight")).toBe(">45");
    expect(valueAfterKey(">45", "ArrowLeft")).toBe(45);
    expect(valueAfterKey(1, "ArrowLeft")).toBe(1);
  });
  it("moves by landmark with Page Up and Page Down, and with Shift and an arrow", () => {
    for (const [key, isShift] of [
      ["PageUp", false],
      ["ArrowRight", true],
    ] as const) {
      expect(valueAfterKey(7, key, isShift)).toBe(15);
      expect(valueAfterKey(15, key, isShift)).toBe(30);
      expect(valueAfterKey(44, key, isShift)).toBe(45);
      expect(valueAfterKey(45, key, isShift)).toBe(">45");
      expect(valueAfterKey(">45", key, isShift)).toBe(">45");
    }
    for (const [key, isShift] of [
      ["PageDown", false],
      ["ArrowLeft", true],
    ] as const) {
      expect(valueAfterKey(">45", key, isShift)).toBe(45);
      expect(valueAfterKey(45, key, isShift)).toBe(30);
      expect(valueAfterKey(16, key, isShift)).toBe(15);
      expect(valueAfterKey(15, key, isShift)).toBe(1);
    }
  });
  it("goes to the ends with Home and End", () => {
    expect(valueAfterKey(22, "Home")).toBe(1);
    expect(valueAfterKey(22, "End")).toBe(">45");
  });
  it("starts from nothing chosen without skipping the first step", () => {
    expect(valueAfterKey(null, "ArrowRight")).toBe(1);
    expect(valueAfterKey(null, "ArrowLeft")).toBe(1);
    expect(valueAfterKey(null, "PageUp")).toBe(15);
  });
  it("leaves every other key to the page", () => {
    for (const key of ["Tab", "Enter", "r", "1", " "]) expect(valueAfterKey(30, key)).toBeNull();
  });
  it("never leaves the scale, whatever is pressed for however long", () => {
    const keys = fc.constantFrom("ArrowRight", "ArrowLeft", "PageUp", "PageDown", "Home", "End");
    fc.assert(
      fc.property(fc.array(fc.tuple(keys, fc.boolean()), { minLength: 1, maxLength: 80 }), (presses) => {
        let value: Degrees | null = null;
        for (const [key, isShift] of presses) value = valueAfterKey(value, key, isShift);
        expect(everyValue).toContain(value);
      }),
    );
  });
});

describe("speakDegrees", () => {
  it("says the degrees and the landmark", () => {
    expect(speakDegrees(30)).toBe("30 degrees, midway");
    expect(speakDegrees(15)).toBe("15 degrees, pupil margin");
    expect(speakDegrees(22)).toBe("22 degrees, between pupil margin and midway");
    expect(speakDegrees(1)).toBe("1 degree, inside the pupil");
    expect(speakDegrees(45)).toBe("45 degrees, limbus");
    expect(speakDegrees(">45")).toBe("over 45 degrees, beyond the limbus");
    expect(speakDegrees(null)).toBe("not chosen yet");
  });
});
