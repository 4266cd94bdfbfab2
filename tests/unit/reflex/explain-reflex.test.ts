import { describe, expect, it } from "vitest";
import { explainReflex } from "@/lib/reflex/explain-reflex";
import { ALIGNED, UNREADABLE_REASONS } from "@/lib/reflex/finding";
import { deviation } from "./build-finding";

describe("explainReflex", () => {
  // Temporal = eso, nasal = exo, below = hyper, above = hypo: the eye turns against its reflex.
  it.each([
    [deviation("left", { eso: 15 }), "The reflex lies to the temple in the left eye, so that eye turns in."],
    [deviation("right", { exo: 15 }), "The reflex lies to the nose in the right eye, so that eye turns out."],
    [
      deviation("right", { hyper: 15 }),
      "The reflex lies below the pupil centre in the right eye, so that eye turns up.",
    ],
    [
      deviation("left", { exo: 30, hypo: 15 }),
      "The reflex lies to the nose and above the pupil centre in the left eye, so that eye turns out and down.",
    ],
    [ALIGNED, "The reflex lies in the same place in both eyes, so neither eye deviates."],
  ])("gives the sign and the turn", (finding, sentence) => {
    expect(explainReflex(finding)).toBe(sentence);
  });

  it("gives each reason for not reading a sentence of its own", () => {
    const sentences = UNREADABLE_REASONS.map((reason) => explainReflex({ readable: false, reason }));
    expect(new Set(sentences).size).toBe(UNREADABLE_REASONS.length);
    for (const sentence of sentences) expect(sentence).toMatch(/^[A-Z].*\.$/);
  });
});
