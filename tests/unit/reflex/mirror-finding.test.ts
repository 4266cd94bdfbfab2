import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ALIGNED } from "@/lib/reflex/finding";
import { mirrorFinding } from "@/lib/reflex/mirror-finding";
import { arbitraryDeviation, arbitraryFinding } from "./arbitrary-finding";
import { deviation } from "./build-finding";

describe("mirrorFinding", () => {
  it("keeps the directions and degrees and changes the eye", () => {
    expect(mirrorFinding(deviation("left", { exo: 30, hypo: 15 }))).toEqual(deviation("right", { exo: 30, hypo: 15 }));
  });

  it("leaves an aligned pair aligned and an unreadable photograph unreadable", () => {
    expect(mirrorFinding(ALIGNED)).toEqual(ALIGNED);
    expect(mirrorFinding({ readable: false, reason: "blurred" })).toEqual({ readable: false, reason: "blurred" });
  });

  it("gives the finding back when done twice, and another one when done once to a deviation", () => {
    fc.assert(
      fc.property(arbitraryFinding, (finding) => {
        expect(mirrorFinding(mirrorFinding(finding))).toEqual(finding);
      }),
    );
    fc.assert(
      fc.property(arbitraryDeviation, (finding) => {
        expect(mirrorFinding(finding)).not.toEqual(finding);
      }),
    );
  });
});
