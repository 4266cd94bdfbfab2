import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  type Answer,
  answer,
  completeDraft,
  type DraftFinding,
  EMPTY_DRAFT,
  fromFinding,
} from "@/lib/desk/draft-finding";
import { ALIGNED, findingFaults, UNREADABLE_REASONS } from "@/lib/reflex/finding";
import { arbitraryDegrees, arbitraryFinding } from "../reflex/arbitrary-finding";
import { deviation } from "../reflex/build-finding";

const arbitraryAnswer: fc.Arbitrary<Answer> = fc.oneof(
  fc.record({ question: fc.constant("eye" as const), value: fc.constantFrom("none", "right", "left") }),
  fc.record({ question: fc.constant("horizontal" as const), value: fc.constantFrom("none", "eso", "exo") }),
  fc.record({ question: fc.constant("vertical" as const), value: fc.constantFrom("none", "hyper", "hypo") }),
  fc.record({ question: fc.constantFrom("horizontalDegrees", "verticalDegrees"), value: arbitraryDegrees }),
  fc.record({ question: fc.constant("readable" as const), value: fc.boolean() }),
  fc.record({ question: fc.constant("reason" as const), value: fc.constantFrom(...UNREADABLE_REASONS) }),
);
const arbitraryStart: fc.Arbitrary<DraftFinding> = fc.oneof(
  fc.constant(EMPTY_DRAFT),
  arbitraryFinding.map((finding) => fromFinding(finding)),
);
const answerAll = (draft: DraftFinding, answers: readonly Answer[]) => answers.reduce(answer, draft);
const findingOf = (draft: DraftFinding) => {
  const completed = completeDraft(draft);
  return "finding" in completed ? completed.finding : null;
};
const missingFrom = (draft: DraftFinding) => {
  const completed = completeDraft(draft);
  return "missing" in completed ? completed.missing : [];
};

describe("answer", () => {
  it("never makes an impossible finding, whatever is answered in whatever order", () => {
    fc.assert(
      fc.property(arbitraryStart, fc.array(arbitraryAnswer, { maxLength: 14 }), (start, answers) => {
        const completed = completeDraft(answerAll(start, answers));
        if ("finding" in completed) expect(findingFaults(completed.finding)).toEqual([]);
        else expect(completed.missing.length).toBeGreaterThan(0);
      }),
      { numRuns: 2000 },
    );
  });
  it("takes an answer given twice as given once, and changes no draft in place", () => {
    fc.assert(
      fc.property(
        arbitraryStart,
        fc.array(arbitraryAnswer, { maxLength: 8 }),
        arbitraryAnswer,
        (start, answers, last) => {
          const draft = answerAll(start, answers);
          const before = structuredClone(draft);
          const once = answer(draft, last);
          expect(draft).toEqual(before);
          expect(answer(once, last)).toEqual(once);
        },
      ),
    );
  });
  it("can reach every finding from any draft, by answering its parts", () => {
    fc.assert(
      fc.property(arbitraryStart, arbitraryFinding, (start, finding) => {
        const answers: Answer[] = finding.readable
          ? [
              { question: "readable", value: true },
              { question: "horizontal", value: finding.horizontal },
              { question: "vertical", value: finding.vertical },
              { question: "eye", value: finding.eye },
            ]
          : [{ question: "reason", value: finding.reason }];
        if (finding.readable && finding.horizontalDegrees !== null) {
          answers.push({ question: "horizontalDegrees", value: finding.horizontalDegrees });
        }
        if (finding.readable && finding.verticalDegrees !== null) {
          answers.push({ question: "verticalDegrees", value: finding.verticalDegrees });
        }
        expect(findingOf(answerAll(start, answers))).toEqual(finding);
      }),
    );
  });

  const start = fromFinding(deviation("left", { exo: 30, hypo: 10 }));
  it("takes directions and degrees away with the eye", () => {
    expect(findingOf(answer(start, { question: "eye", value: "none" }))).toEqual(ALIGNED);
  });
  it("keeps directions and degrees from one eye to the other, and asks for them anew after neither", () => {
    const other = answer(start, { question: "eye", value: "right" });
    expect(findingOf(other)).toEqual(deviation("right", { exo: 30, hypo: 10 }));
    const anew = answer(fromFinding(ALIGNED), { question: "eye", value: "right" });
    expect(missingFrom(anew)).toEqual(["the horizontal part", "the vertical part"]);
  });
  it("takes the degrees away with the direction, and keeps them when it is reversed", () => {
    const without = answer(start, { question: "horizontal", value: "none" });
    expect(findingOf(without)).toEqual(deviation("left", { hypo: 10 }));
    expect(missingFrom(answer(without, { question: "horizontal", value: "eso" }))).toEqual(["the horizontal degrees"]);
    expect(findingOf(answer(start, { question: "horizontal", value: "eso" }))).toEqual(
      deviation("left", { eso: 30, hypo: 10 }),
    );
  });
  it("does not take degrees that no direction is there for", () => {
    const typed = answer(EMPTY_DRAFT, { question: "horizontalDegrees", value: 30 });
    expect(typed).toEqual(EMPTY_DRAFT);
    expect(findingOf(answer(fromFinding(ALIGNED), { question: "verticalDegrees", value: 5 }))).toEqual(ALIGNED);
  });
  it("asks for the eye again when a direction is chosen for aligned eyes", () => {
    const turned = answer(fromFinding(ALIGNED), { question: "horizontal", value: "exo" });
    expect(missingFrom(turned)).toEqual(["which eye deviates", "the horizontal degrees"]);
  });
  it("starts afresh when a photograph becomes readable, or not", () => {
    expect(missingFrom(answer(start, { question: "readable", value: false }))).toEqual(["why it cannot be read"]);
    expect(answer({ isReadable: false, reason: "blurred" }, { question: "readable", value: true })).toEqual(
      EMPTY_DRAFT,
    );
  });
});

describe("completeDraft", () => {
  it("names what is missing in the order in which it is asked", () => {
    expect(missingFrom(EMPTY_DRAFT)).toEqual(["which eye deviates", "the horizontal part", "the vertical part"]);
    const eye = answer(EMPTY_DRAFT, { question: "eye", value: "left" });
    const horizontal = answer(eye, { question: "horizontal", value: "none" });
    const neither = answer(horizontal, { question: "vertical", value: "none" });
    expect(missingFrom(neither)).toEqual(["a direction for that eye"]);
  });
  it("gives a stored finding back as it was", () => {
    fc.assert(
      fc.property(arbitraryFinding, (finding) => {
        expect(findingOf(fromFinding(finding))).toEqual(finding);
      }),
    );
  });
});
