import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ALIGNED, UNREADABLE_REASONS } from "@/lib/reflex/finding";
import { NOTATIONS, shorthand } from "@/lib/reflex/shorthand";
import { arbitraryFinding } from "./arbitrary-finding";
import { deviation } from "./build-finding";

describe("shorthand", () => {
  it.each([
    [deviation("left", { exo: 30 }), "LXT 30°", "LDS 30°"],
    [deviation("right", { eso: 15 }), "RET 15°", "RCS 15°"],
    [deviation("right", { hyper: 15 }), "RHT 15°", "RHT 15°"],
    [deviation("left", { hypo: 15 }), "LHoT 15°", "LHoT 15°"],
    [deviation("left", { exo: 30, hypo: 15 }), "LXT 30° LHoT 15°", "LDS 30° LHoT 15°"],
    [deviation("right", { eso: ">45", hyper: 3 }), "RET >45° RHT 3°", "RCS >45° RHT 3°"],
    [ALIGNED, "ortho", "ortho"],
  ])("writes the trade's form: %o", (finding, tropia, squint) => {
    expect(shorthand(finding, "tropia")).toBe(tropia);
    expect(shorthand(finding, "squint")).toBe(squint);
  });

  it("says not readable with its reason, in words", () => {
    expect(UNREADABLE_REASONS.map((reason) => shorthand({ readable: false, reason }))).toEqual([
      "not readable: blurred",
      "not readable: reflex hidden or doubled",
      "not readable: pupil not visible",
      "not readable: not fixating",
      "not readable: dilated or irregular pupil",
      "not readable: cannot be judged without a cover test",
      "not readable: other",
    ]);
  });

  it("writes two findings alike only if they are the same, in each notation", () => {
    fc.assert(
      fc.property(arbitraryFinding, arbitraryFinding, fc.constantFrom(...NOTATIONS), (first, second, notation) => {
        const isSame = JSON.stringify(first) === JSON.stringify(second);
        expect(shorthand(first, notation) === shorthand(second, notation)).toBe(isSame);
      }),
    );
  });
});
