import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { describeFinding } from "@/lib/reflex/describe-finding";
import { ALIGNED, UNREADABLE_REASONS } from "@/lib/reflex/finding";
import { arbitraryFinding } from "./arbitrary-finding";
import { deviation } from "./build-finding";

describe("describeFinding", () => {
  it.each([
    [deviation("left", { exo: 30 }), "Left eye, exotropia 30°, no vertical part."],
    [deviation("right", { eso: 5, hyper: 12 }), "Right eye, esotropia 5°, hypertropia 12°."],
    [deviation("left", { hypo: 15 }), "Left eye, hypotropia 15°, no horizontal part."],
    [deviation("right", { exo: ">45" }), "Right eye, exotropia beyond the limbus (>45°), no vertical part."],
    [ALIGNED, "Neither eye deviates."],
    [{ readable: false, reason: "blurred" } as const, "Not readable: blurred."],
    [{ readable: false, reason: "needs-cover-test" } as const, "Not readable: cannot be judged without a cover test."],
  ])("says what was understood", (finding, sentence) => {
    expect(describeFinding(finding)).toBe(sentence);
  });

  it("says something else of each reason", () => {
    expect(new Set(UNREADABLE_REASONS.map((reason) => describeFinding({ readable: false, reason }))).size).toBe(7);
  });

  it("describes two findings alike only if they are the same", () => {
    fc.assert(
      fc.property(arbitraryFinding, arbitraryFinding, (first, second) => {
        const isSame = JSON.stringify(first) === JSON.stringify(second);
        expect(describeFinding(first) === describeFinding(second)).toBe(isSame);
      }),
    );
  });
});
