import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  DEVIATING_EYES,
  DIRECTION_LABELS,
  deviatingEye,
  directionLabel,
  HORIZONTAL_DIRECTIONS,
  horizontalDirection,
  VERTICAL_DIRECTIONS,
  verticalDirection,
} from "@/lib/reflex/direction-label";
import { ALIGNED, type Finding } from "@/lib/reflex/finding";
import { arbitraryFinding } from "./arbitrary-finding";
import { deviation } from "./build-finding";

const unreadable: Finding = { readable: false, reason: "not-fixating" };

describe("directionLabel", () => {
  it.each([
    [ALIGNED, "aligned"],
    [deviation("right", { eso: 15 }), "R eso"],
    [deviation("left", { exo: 3 }), "L exo"],
    [deviation("right", { hyper: 15 }), "R hyper"],
    [deviation("left", { hypo: ">45" }), "L hypo"],
    [deviation("left", { exo: 30, hypo: 15 }), "L exo+hypo"],
    [deviation("right", { eso: ">45", hyper: 4 }), "R eso+hyper"],
    [unreadable, "not readable"],
  ])("names eye, horizontal and vertical direction, not the size", (finding, label) => {
    expect(directionLabel(finding)).toBe(label);
  });

  // Results are stored by these words and read by position: a changed order would change old tables.
  it("has 18 labels in an order that stays", () => {
    expect(DIRECTION_LABELS).toEqual([
      ...["aligned", "R eso", "R exo", "R hyper", "R hypo", "R eso+hyper", "R eso+hypo", "R exo+hyper", "R exo+hypo"],
      ...["L eso", "L exo", "L hyper", "L hypo", "L eso+hyper", "L eso+hypo", "L exo+hyper", "L exo+hypo"],
      "not readable",
    ]);
  });

  it("gives every sound finding one of the labels, and each label to some finding", () => {
    const seen = new Set<string>();
    fc.assert(
      fc.property(arbitraryFinding, (finding) => {
        seen.add(directionLabel(finding));
        expect(DIRECTION_LABELS).toContain(directionLabel(finding));
      }),
      { numRuns: 2000, seed: 1 },
    );
    expect(seen.size).toBe(DIRECTION_LABELS.length);
  });
});

describe("the sub-scales of the label", () => {
  it("give the horizontal direction whichever eye deviates", () => {
    expect(horizontalDirection(deviation("right", { eso: 15, hypo: 5 }))).toBe("eso");
    expect(horizontalDirection(deviation("left", { exo: 15 }))).toBe("exo");
    expect(horizontalDirection(deviation("left", { hyper: 15 }))).toBe("none");
    expect(horizontalDirection(ALIGNED)).toBe("none");
  });

  it("give the vertical direction by which eye is higher, so that right hyper is left hypo", () => {
    expect(verticalDirection(deviation("right", { hyper: 15 }))).toBe("right over left");
    expect(verticalDirection(deviation("left", { hypo: 15 }))).toBe("right over left");
    expect(verticalDirection(deviation("left", { hyper: 15 }))).toBe("left over right");
    expect(verticalDirection(deviation("right", { hypo: 15 }))).toBe("left over right");
    expect(verticalDirection(deviation("right", { eso: 15 }))).toBe("none");
  });

  it("give the deviating eye", () => {
    expect(deviatingEye(deviation("left", { exo: 30, hypo: 15 }))).toBe("left");
    expect(deviatingEye(ALIGNED)).toBe("none");
  });

  it("count an unreadable photograph as missing", () => {
    expect([horizontalDirection, verticalDirection, deviatingEye].map((scale) => scale(unreadable))).toEqual([
      null,
      null,
      null,
    ]);
  });

  it("list every value they can take", () => {
    fc.assert(
      fc.property(arbitraryFinding, (finding) => {
        expect([...HORIZONTAL_DIRECTIONS, null]).toContain(horizontalDirection(finding));
        expect([...VERTICAL_DIRECTIONS, null]).toContain(verticalDirection(finding));
        expect([...DEVIATING_EYES, null]).toContain(deviatingEye(finding));
      }),
    );
  });
});
