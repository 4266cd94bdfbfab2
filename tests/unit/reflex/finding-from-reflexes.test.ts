import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Convention } from "@/lib/reflex/convention";
import { displacementFromDegrees } from "@/lib/reflex/displacement";
import { ALIGNED, type ReadableFinding } from "@/lib/reflex/finding";
import { type Decentration, type Decentrations, findingFromReflexes } from "@/lib/reflex/finding-from-reflexes";
import { mirrorFinding } from "@/lib/reflex/mirror-finding";
import { arbitraryDeviation } from "./arbitrary-finding";
import { deviation } from "./build-finding";

const sevenPerMm: Convention = { kind: "perMm", degreesPerMm: 7 };
const normal: Decentration = { nasal: 0.5, up: 0 };

describe("findingFromReflexes", () => {
  // Temporal = eso, nasal = exo, below = hyper, above = hypo.
  it.each<[string, Decentrations, ReadableFinding]>([
    ["temporal: eso", { right: normal, left: { nasal: -1.5, up: 0 } }, deviation("left", { eso: 14 })],
    ["nasal: exo", { right: { nasal: 2.5, up: 0 }, left: normal }, deviation("right", { exo: 14 })],
    ["below: hyper", { right: { nasal: 0.5, up: -1 }, left: normal }, deviation("right", { hyper: 7 })],
    ["above: hypo", { right: normal, left: { nasal: 0.5, up: 1 } }, deviation("left", { hypo: 7 })],
    ["nasal and above", { right: normal, left: { nasal: 3.5, up: 2 } }, deviation("left", { exo: 21, hypo: 14 })],
  ])("reads a reflex that lies %s", (_place, reflexes, finding) => {
    expect(findingFromReflexes(reflexes, { convention: sevenPerMm })).toEqual(finding);
  });

  it("reads the same decentration in both eyes as aligned: angle kappa, nasal, none or temporal", () => {
    for (const nasal of [0.5, 0.9, 0, -0.4]) {
      const same = { nasal, up: 0 };
      expect(findingFromReflexes({ right: same, left: same })).toEqual(ALIGNED);
    }
  });

  it("holds the deviating eye against its fellow, so that the size does not hang on the normal figure", () => {
    const reflexes = { right: { nasal: 0.8, up: 0.1 }, left: { nasal: -1.2, up: 0.1 } };
    expect(findingFromReflexes(reflexes, { convention: sevenPerMm })).toEqual(deviation("left", { eso: 14 }));
  });

  it("takes the eye nearer its normal place as the fixing one, allowing for normal decentration", () => {
    const reflexes = { right: { nasal: 0, up: 0 }, left: { nasal: 0.8, up: 0 } };
    expect(findingFromReflexes(reflexes, { convention: sevenPerMm })).toEqual(deviation("right", { eso: 6 }));
    expect(findingFromReflexes(reflexes, { convention: sevenPerMm, normalNasalMm: 0 })).toEqual(
      deviation("left", { exo: 6 }),
    );
  });

  it("takes the eye that is known to fix, whatever the places say", () => {
    const reflexes = { right: normal, left: { nasal: 0.5, up: 1 } };
    expect(findingFromReflexes(reflexes, { convention: sevenPerMm, fixingEye: "left" })).toEqual(
      deviation("right", { hyper: 7 }),
    );
  });

  it("says that a cover test must decide when both eyes lie equally near", () => {
    const undecided = { readable: false, reason: "needs-cover-test" };
    expect(findingFromReflexes({ right: { nasal: 0.5, up: 0.5 }, left: { nasal: 0.5, up: -0.5 } })).toEqual(undecided);
    expect(findingFromReflexes({ right: { nasal: 1, up: 0 }, left: { nasal: 0.02, up: 0 } })).toEqual(undecided);
    expect(
      findingFromReflexes({ right: { nasal: 1, up: 0 }, left: { nasal: 0.02, up: 0 } }, { decidedByMm: 0.01 }),
    ).toEqual(deviation("right", { exo: 7 }));
  });

  it("says that the eyes do not look at the light when both reflexes lie far off in different places", () => {
    const lookingAside = { right: { nasal: 2.2, up: 0 }, left: { nasal: -1.4, up: 0 } };
    expect(findingFromReflexes(lookingAside)).toEqual({ readable: false, reason: "not-fixating" });
    expect(findingFromReflexes(lookingAside, { fixingWithinMm: 1.8 })).toMatchObject({ eye: "left" });
  });

  it("reads beyond the limbus as that, by the landmark rule and where 45° is passed", () => {
    const far = { right: normal, left: { nasal: -5.6, up: 0 } };
    expect(findingFromReflexes(far)).toEqual(deviation("left", { eso: ">45" }));
    expect(findingFromReflexes(far, { convention: { kind: "perMm", degreesPerMm: 12 } })).toEqual(
      deviation("left", { eso: ">45" }),
    );
    expect(findingFromReflexes(far, { convention: sevenPerMm })).toEqual(deviation("left", { eso: 43 }));
  });

  it("goes by the landmark rule unless told otherwise", () => {
    expect(findingFromReflexes({ right: normal, left: { nasal: 2.5, up: 0 } })).toEqual(deviation("left", { exo: 15 }));
  });

  it("gives back every finding from the place where its convention puts the reflex", () => {
    const conventions: Convention[] = [
      { kind: "landmarks" },
      sevenPerMm,
      { kind: "perMm", degreesPerMm: 12 },
      { kind: "schematicEye" },
    ];
    fc.assert(
      fc.property(arbitraryDeviation, fc.constantFrom(...conventions), (finding, convention) => {
        const mm = (degrees: ReadableFinding["horizontalDegrees"]) =>
          degrees === ">45" ? 6.5 : (displacementFromDegrees(degrees ?? 0, convention) ?? Number.NaN);
        const displaced = {
          nasal: normal.nasal + mm(finding.horizontalDegrees) * (finding.horizontal === "eso" ? -1 : 1),
          up: normal.up + mm(finding.verticalDegrees) * (finding.vertical === "hyper" ? -1 : 1),
        };
        const isRight = finding.eye === "right";
        const reflexes = { right: isRight ? displaced : normal, left: isRight ? normal : displaced };
        expect(findingFromReflexes(reflexes, { convention })).toEqual(finding);
      }),
    );
  });

  it("mirrors with the photograph", () => {
    const place = fc.record({
      nasal: fc.double({ min: -4, max: 4, noNaN: true }),
      up: fc.double({ min: -4, max: 4, noNaN: true }),
    });
    fc.assert(
      fc.property(place, place, (right, left) => {
        const mirrored = findingFromReflexes({ right: left, left: right });
        expect(mirrored).toEqual(mirrorFinding(findingFromReflexes({ right, left })));
      }),
    );
  });

  it("throws on measures that are no numbers", () => {
    expect(() => findingFromReflexes({ right: normal, left: { nasal: Number.NaN, up: 0 } })).toThrow(RangeError);
  });
});
