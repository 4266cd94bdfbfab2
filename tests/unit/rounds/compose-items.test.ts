import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { countKind, setRepeats, toggleCase } from "@/lib/rounds/compose-items";
import { RoundDraft } from "@/lib/rounds/schema";
import { seededRandom } from "@/lib/statistics/random";

type Items = Parameters<typeof toggleCase>[0];

const caseIds = Array.from({ length: 8 }, (_, index) => `00000000-0000-4000-8000-00000000000${index}`);
const firsts = (count: number): Items => caseIds.slice(0, count).map((caseId) => ({ caseId, kind: "first" }));

type Step = { toggle: number } | { kind: "repeat" | "mirrored"; wanted: number };
const arbitraryStep: fc.Arbitrary<Step> = fc.oneof(
  fc.record({ toggle: fc.nat(7) }),
  fc.record({ kind: fc.constantFrom("repeat" as const, "mirrored" as const), wanted: fc.nat(12) }),
);

describe("composing the items of a round", () => {
  it("makes nothing that a draft would not take, whatever is chosen in whatever order", () => {
    fc.assert(
      fc.property(fc.array(arbitraryStep, { maxLength: 20 }), fc.nat(), (steps, seed) => {
        const random = seededRandom(seed);
        const items = steps.reduce<Items>(
          (before, step) =>
            "toggle" in step
              ? toggleCase(before, caseIds[step.toggle] ?? "")
              : setRepeats(before, step.kind, step.wanted, random),
          [],
        );
        const draft = { title: "t", instructions: "", opensAt: null, closesAt: null, items, examinerIds: [] };
        expect(RoundDraft.safeParse(draft).error).toBeUndefined();
        for (const kind of ["repeat", "mirrored"] as const) {
          const repeated = items.filter((item) => item.kind === kind).map(({ caseId }) => caseId);
          expect(new Set(repeated).size).toBe(repeated.length); // no case twice in one kind
        }
      }),
    );
  });
  it("takes a case out together with its repeats, and back in without them", () => {
    const [first = "", second = ""] = caseIds;
    const items: Items = [...firsts(2), { caseId: first, kind: "repeat" }, { caseId: first, kind: "mirrored" }];
    const without = toggleCase(items, first);
    expect(without).toEqual([{ caseId: second, kind: "first" }]);
    expect(toggleCase(without, first)).toEqual([
      { caseId: second, kind: "first" },
      { caseId: first, kind: "first" },
    ]);
  });
});

describe("setRepeats", () => {
  it("gives as many as wanted, of cases without any, and no more than there are such cases", () => {
    fc.assert(
      fc.property(fc.nat(8), fc.nat(12), fc.nat(12), fc.nat(), (cases, repeats, mirrored, seed) => {
        const random = seededRandom(seed);
        const some = setRepeats(firsts(cases), "repeat", repeats, random);
        expect(countKind(some, "repeat")).toBe(Math.min(repeats, cases));
        const both = setRepeats(some, "mirrored", mirrored, random);
        expect(countKind(both, "mirrored")).toBe(Math.min(mirrored, cases - countKind(some, "repeat")));
        expect(countKind(both, "first")).toBe(cases);
      }),
    );
  });
  it("keeps the repeats already chosen as far as the number allows", () => {
    const four = setRepeats(firsts(8), "repeat", 4, seededRandom(1));
    const six = setRepeats(four, "repeat", 6, seededRandom(2));
    expect(six).toEqual(expect.arrayContaining(four));
    expect(setRepeats(six, "repeat", 4, seededRandom(3))).toEqual(four);
    expect(setRepeats(six, "repeat", 0, seededRandom(3))).toEqual(firsts(8));
  });
  it("draws every case in time, by the random numbers alone", () => {
    const drawn = (seed: number) => setRepeats(firsts(8), "repeat", 1, seededRandom(seed)).at(-1)?.caseId;
    expect(drawn(5)).toBe(drawn(5));
    expect(new Set(Array.from({ length: 200 }, (_, seed) => drawn(seed))).size).toBe(8);
  });
});
