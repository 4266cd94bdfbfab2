import { BEYOND_LIMBUS, DEGREES_MAX, type Degrees, type Finding, type Horizontal, type Vertical } from "./finding";
import { findingParts } from "./finding-parts";
import { UNREADABLE_REASON_WORDS } from "./unreadable-reason-words";

const DEVIATIONS: Readonly<Record<Horizontal | Vertical, string>> = {
  eso: "esotropia",
  exo: "exotropia",
  hyper: "hypertropia",
  hypo: "hypotropia",
};

/** What was understood, shown back to the person: "Left eye, exotropia 30°, no vertical part." */
export function describeFinding(finding: Finding): string {
  if (!finding.readable) return `Not readable: ${UNREADABLE_REASON_WORDS[finding.reason]}.`;
  if (finding.eye === "none") return "Neither eye deviates.";
  const { horizontal, vertical } = findingParts(finding);
  const eye = finding.eye === "right" ? "Right eye" : "Left eye";
  const parts = [horizontal, vertical].filter((part) => part !== null).map(describePart);
  const missing = horizontal ? (vertical ? [] : ["no vertical part"]) : ["no horizontal part"];
  return `${[eye, ...parts, ...missing].join(", ")}.`;
}

function describePart({ direction, degrees }: { direction: Horizontal | Vertical; degrees: Degrees }): string {
  const size = degrees === BEYOND_LIMBUS ? `beyond the limbus (>${DEGREES_MAX}°)` : `${degrees}°`;
  return `${DEVIATIONS[direction]} ${size}`;
}
