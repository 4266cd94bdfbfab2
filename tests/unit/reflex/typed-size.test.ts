import { describe, expect, it } from "vitest";
import { readTypedSize } from "@/lib/reflex/typed-size";
import prism from "../../reference/optics-prism-dioptres.json"; // definition: 100·tan θ, computed with R

describe("readTypedSize", () => {
  it("takes whole degrees from 1 to 45 and beyond the limbus as they are", () => {
    expect(readTypedSize({ value: 1, unit: "degrees" })).toEqual({ ok: true, degrees: 1 });
    expect(readTypedSize({ value: 45, unit: "degrees" })).toEqual({ ok: true, degrees: 45 });
    expect(readTypedSize({ value: ">45", unit: "degrees" })).toEqual({ ok: true, degrees: ">45" });
  });

  it("gives prism dioptres the nearest whole degree of the exact relation", () => {
    for (const { prismDioptres, degrees } of prism.expected.degreesOfPrismDioptres) {
      expect(readTypedSize({ value: prismDioptres, unit: "prism-dioptres" })).toEqual({
        ok: true,
        degrees: Math.round(degrees),
      });
    }
  });

  it.each([
    [0, "degrees"],
    [-3, "degrees"],
    [2.5, "degrees"],
    [46, "degrees"],
    [Number.NaN, "degrees"],
    [0, "prism-dioptres"],
    [0.8, "prism-dioptres"],
    [-20, "prism-dioptres"],
    [102, "prism-dioptres"],
    [Number.NaN, "prism-dioptres"],
    [Number.POSITIVE_INFINITY, "prism-dioptres"],
  ] as const)("refuses %d in %s with a reason", (value, unit) => {
    expect(readTypedSize({ value, unit })).toEqual({ ok: false, reason: expect.stringMatching(/\.$/) });
  });
});
