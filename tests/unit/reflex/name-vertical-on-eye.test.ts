import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ALIGNED } from "@/lib/reflex/finding";
import { nameVerticalOnEye } from "@/lib/reflex/name-vertical-on-eye";
import { signedComponents } from "@/lib/reflex/signed-components";
import { arbitraryFinding } from "./arbitrary-finding";
import { deviation } from "./build-finding";

describe("nameVerticalOnEye", () => {
  it("names right hyper as left hypo and left hyper as right hypo", () => {
    expect(nameVerticalOnEye(deviation("right", { hyper: 15 }), "left")).toEqual(deviation("left", { hypo: 15 }));
    expect(nameVerticalOnEye(deviation("left", { hyper: 15 }), "right")).toEqual(deviation("right", { hypo: 15 }));
  });

  it("leaves a deviation with a horizontal part, and the aligned and unreadable, as they are", () => {
    for (const finding of [
      deviation("right", { eso: 15 }),
      deviation("right", { exo: 15, hyper: 5 }),
      ALIGNED,
      { readable: false, reason: "blurred" } as const,
    ]) {
      expect(nameVerticalOnEye(finding, "left")).toEqual(finding);
    }
  });

  it("never changes a signed component", () => {
    fc.assert(
      fc.property(arbitraryFinding, fc.constantFrom("right" as const, "left" as const), (finding, eye) => {
        expect(signedComponents(nameVerticalOnEye(finding, eye))).toEqual(signedComponents(finding));
      }),
    );
  });
});
