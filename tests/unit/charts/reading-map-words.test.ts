import { describe, expect, it } from "vitest";
import { describeMap, describeUnreadable, groupFindings } from "@/components/charts/reading-map-words";
import { ALIGNED, type Finding } from "@/lib/reflex/finding";

const blurred: Finding = { readable: false, reason: "blurred" };
const leftExo: Finding = { ...ALIGNED, eye: "left", horizontal: "exo", horizontalDegrees: 30 };

describe("describeUnreadable", () => {
  it("counts those who found nothing to place, and is silent when all did", () => {
    expect(describeUnreadable({ reference: blurred, own: blurred, others: [blurred, leftExo] })).toBe(
      "Not readable: the reference, you, 1 of 2 others.",
    );
    expect(describeUnreadable({ reference: leftExo, others: [leftExo] })).toBeNull();
  });
});

describe("describeMap", () => {
  it("says every reading in words, equal ones together", () => {
    expect(describeMap("Case 31", { reference: leftExo, own: ALIGNED, others: [leftExo, leftExo, ALIGNED] })).toBe(
      "Case 31. Reference: Left eye, exotropia 30°, no vertical part. You: Neither eye deviates. " +
        "3 others: 2 × Left eye, exotropia 30°, no vertical part; 1 × Neither eye deviates.",
    );
  });
  it("tells nothing of readings it was not given", () => {
    expect(describeMap("Case 31", { others: [] })).toBe("Case 31.");
  });
});

describe("groupFindings", () => {
  it("puts the most frequent first and loses none", () => {
    const groups = groupFindings([ALIGNED, leftExo, leftExo, blurred]);
    expect(groups[0]?.count).toBe(2);
    expect(groups.reduce((sum, { count }) => sum + count, 0)).toBe(4);
  });
});
