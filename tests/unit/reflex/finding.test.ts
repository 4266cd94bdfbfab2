import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ALIGNED, type Degrees, findingFaults, type ReadableFinding } from "@/lib/reflex/finding";
import { findingParts } from "@/lib/reflex/finding-parts";
import { arbitraryFinding } from "./arbitrary-finding";
import { deviation } from "./build-finding";

const anyDegrees: fc.Arbitrary<Degrees | null> = fc.constantFrom<(Degrees | null)[]>(
  ...[null, ">45" as const, -1, 0, 0.5, 1, 15, 44.5, 45, 46, Number.NaN, Number.POSITIVE_INFINITY],
);

const anyReadable: fc.Arbitrary<ReadableFinding> = fc.record({
  readable: fc.constant<true>(true),
  eye: fc.constantFrom<ReadableFinding["eye"][]>("none", "right", "left"),
  horizontal: fc.constantFrom<ReadableFinding["horizontal"][]>("none", "eso", "exo"),
  horizontalDegrees: anyDegrees,
  vertical: fc.constantFrom<ReadableFinding["vertical"][]>("none", "hyper", "hypo"),
  verticalDegrees: anyDegrees,
});

/** The rules said a second way, as a list of what may be: nothing of the code under test is used. */
function isPossible(finding: ReadableFinding): boolean {
  const allowed = new Set<Degrees | null>([">45", ...Array.from({ length: 45 }, (_, index) => index + 1)]);
  const isPart = (direction: string, degrees: Degrees | null) =>
    direction === "none" ? degrees === null : allowed.has(degrees);
  const hasParts = [finding.horizontal, finding.vertical].some((direction) => direction !== "none");
  return (
    hasParts === (finding.eye !== "none") &&
    isPart(finding.horizontal, finding.horizontalDegrees) &&
    isPart(finding.vertical, finding.verticalDegrees)
  );
}

describe("findingFaults", () => {
  it("finds a fault in every impossible finding and none in a possible one", () => {
    fc.assert(
      fc.property(anyReadable, (finding) => {
        expect(findingFaults(finding).length === 0).toBe(isPossible(finding));
      }),
      { numRuns: 2000 },
    );
  });

  it("finds none in any sound finding", () => {
    fc.assert(
      fc.property(arbitraryFinding, (finding) => {
        expect(findingFaults(finding)).toEqual([]);
      }),
    );
  });

  it("refuses 45 and 46 as stand-ins for beyond the limbus: 45 is 45, 46 is no value", () => {
    expect(findingFaults(deviation("left", { exo: 45 }))).toEqual([]);
    expect(findingFaults(deviation("left", { exo: ">45" }))).toEqual([]);
    expect(findingFaults(deviation("left", { exo: 46 })).map((fault) => fault.field)).toEqual(["horizontalDegrees"]);
  });

  it("names the field to mend", () => {
    expect(findingFaults({ ...ALIGNED, eye: "right" }).map((fault) => fault.field)).toEqual(["horizontal"]);
    expect(findingFaults({ ...deviation("right", { hyper: 5 }), eye: "none" }).map((fault) => fault.field)).toEqual([
      "eye",
    ]);
  });
});

describe("findingParts", () => {
  it("gives each part with its degrees, and the eye that stands higher", () => {
    expect(findingParts(deviation("left", { exo: 30, hypo: 15 }))).toEqual({
      horizontal: { direction: "exo", degrees: 30 },
      vertical: { direction: "hypo", sense: "right over left", degrees: 15 },
    });
    expect(findingParts(ALIGNED)).toEqual({ horizontal: null, vertical: null });
  });

  it("throws on a finding that breaks a rule, with the rule", () => {
    expect(() => findingParts({ ...ALIGNED, horizontal: "eso" })).toThrow(RangeError);
    expect(() => findingParts(deviation("right", { eso: 60 }))).toThrow(/whole numbers from 1 to 45/);
  });
});
