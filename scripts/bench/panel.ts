import { directionLabel } from "@/lib/reflex/direction-label";
import { ALIGNED, type Finding, type ReadableFinding } from "@/lib/reflex/finding";
import { signedComponents } from "@/lib/reflex/signed-components";
import { STEPS, stepOfFinding } from "@/lib/reflex/step";
import { seededRandom } from "@/lib/statistics/random";

/** A made-up round: what each examiner read of each case, and the references. The same seed gives the same round. */
export type Panel = {
  examinerCount: number;
  caseCount: number;
  references: Finding[];
  /** Cases × examiners; null where nothing was read. */
  readings: (Finding | null)[][];
  /** The same as direction labels, positions of steps, and signed horizontal degrees. */
  labels: (string | null)[][];
  steps: (number | null)[][];
  degrees: (number | null)[][];
};

/** One reading in thirty is missing and one in six is wrong, so that every branch of the statistics has work to do. */
export function makePanel(examinerCount: number, caseCount: number, seed = 1): Panel {
  const random = seededRandom(seed);
  const references = Array.from({ length: caseCount }, () => makeFinding(random));
  const readings = references.map((reference) =>
    Array.from({ length: examinerCount }, () => {
      if (random() < 1 / 30) return null;
      return random() < 1 / 6 ? makeFinding(random) : misjudge(reference, random);
    }),
  );
  const mapAll = <Out>(map: (finding: Finding) => Out) =>
    readings.map((row) => row.map((finding) => finding && map(finding)));
  return {
    examinerCount,
    caseCount,
    references,
    readings,
    labels: mapAll(directionLabel),
    steps: mapAll((finding) => {
      const step = stepOfFinding(finding);
      return step === null ? null : STEPS.indexOf(step);
    }),
    degrees: mapAll((finding) => signedComponents(finding).horizontal),
  };
}

function makeFinding(random: () => number): Finding {
  const kind = random();
  if (kind < 0.05) return { readable: false, reason: "blurred" };
  if (kind < 0.25) return ALIGNED;
  const isCombined = kind > 0.85;
  return {
    readable: true,
    eye: random() < 0.5 ? "right" : "left",
    horizontal: random() < 0.5 ? "eso" : "exo",
    horizontalDegrees: 5 + Math.floor(random() * 40),
    vertical: isCombined ? "hyper" : "none",
    verticalDegrees: isCombined ? 3 + Math.floor(random() * 12) : null,
  };
}

/** The reference with some degrees more or less. */
function misjudge(reference: Finding, random: () => number): Finding {
  if (!reference.readable || typeof reference.horizontalDegrees !== "number") return reference;
  const degrees = reference.horizontalDegrees + Math.round((random() - 0.5) * 10);
  const misjudged: ReadableFinding = { ...reference, horizontalDegrees: Math.min(45, Math.max(1, degrees)) };
  return misjudged;
}
