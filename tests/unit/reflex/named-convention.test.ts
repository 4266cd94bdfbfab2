import { describe, expect, it } from "vitest";
import { degreesFromDisplacement } from "@/lib/reflex/displacement";
import { CONVENTION_NAMES, namedConvention } from "@/lib/reflex/named-convention";

describe("namedConvention", () => {
  it("gives each stored name its label and its figure at 1 mm", () => {
    const own = 10.5;
    const rows = CONVENTION_NAMES.map((name) => {
      const { label, convention } = namedConvention(name, own);
      return [label, degreesFromDisplacement(1, convention)];
    });
    expect(rows).toEqual([
      ["Landmark rule", 7.5],
      ["7° per mm", 7],
      ["12° per mm from the pupil centre", 12],
      ["11° per mm from the limbus centre", 11],
      ["10.5° per mm, own figure", 10.5],
    ]);
  });

  it("says which centre a measured figure runs from, since 12 and 11 are the same eye seen from two", () => {
    expect(namedConvention("12-per-mm").convention).toMatchObject({ from: "pupil-centre" });
    expect(namedConvention("11-per-mm-limbus").convention).toMatchObject({ from: "limbus-centre" });
  });

  it("marks rules of thumb as such and names the source of the others", () => {
    expect(namedConvention("landmarks").source).toBe("Common practice, no source.");
    expect(namedConvention("7-per-mm").source).toBe("Common practice, no source.");
    expect(namedConvention("12-per-mm").source).toMatch("1997");
  });

  it("throws on an own convention without a figure above 0", () => {
    expect(() => namedConvention("own")).toThrow(RangeError);
    expect(() => namedConvention("own", 0)).toThrow(RangeError);
    expect(() => namedConvention("own", Number.NaN)).toThrow(RangeError);
  });
});
