import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ALIGNED } from "@/lib/reflex/finding";
import { mirrorFinding } from "@/lib/reflex/mirror-finding";
import { signedComponents } from "@/lib/reflex/signed-components";
import { arbitraryFinding } from "./arbitrary-finding";
import { deviation } from "./build-finding";

const uncensored = { horizontal: false, vertical: false };

describe("signedComponents", () => {
  it.each([
    ["right eso", deviation("right", { eso: 15 }), 15, 0],
    ["left eso", deviation("left", { eso: 15 }), 15, 0],
    ["right exo", deviation("right", { exo: 20 }), -20, 0],
    ["left exo", deviation("left", { exo: 20 }), -20, 0],
    ["right hyper", deviation("right", { hyper: 8 }), 0, 8],
    ["left hypo", deviation("left", { hypo: 8 }), 0, 8],
    ["left hyper", deviation("left", { hyper: 8 }), 0, -8],
    ["right hypo", deviation("right", { hypo: 8 }), 0, -8],
    ["left exo with hypo", deviation("left", { exo: 30, hypo: 12 }), -30, 12],
    ["aligned", ALIGNED, 0, 0],
  ])("gives the sign of %s", (_name, finding, horizontal, vertical) => {
    expect(signedComponents(finding)).toEqual({ horizontal, vertical, censored: uncensored });
  });

  it("gives no number beyond the limbus, says so, and keeps the other part", () => {
    expect(signedComponents(deviation("right", { exo: ">45", hyper: 5 }))).toEqual({
      horizontal: null,
      vertical: 5,
      censored: { horizontal: true, vertical: false },
    });
    expect(signedComponents(deviation("right", { exo: 10, hyper: ">45" }))).toEqual({
      horizontal: -10,
      vertical: null,
      censored: { horizontal: false, vertical: true },
    });
  });

  it("gives no numbers for a photograph that is not readable, and does not call them censored", () => {
    expect(signedComponents({ readable: false, reason: "blurred" })).toEqual({
      horizontal: null,
      vertical: null,
      censored: uncensored,
    });
  });

  it("keeps the horizontal part of a mirrored finding and negates the vertical one", () => {
    fc.assert(
      fc.property(arbitraryFinding, (finding) => {
        const { horizontal, vertical, censored } = signedComponents(finding);
        const negated = vertical === null ? null : 0 - vertical;
        expect(signedComponents(mirrorFinding(finding))).toEqual({ horizontal, vertical: negated, censored });
      }),
    );
  });
});
