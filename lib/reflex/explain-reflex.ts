import type { Finding, Horizontal, UnreadableReason, Vertical } from "./finding";
import { findingParts } from "./finding-parts";

/** The eye turns against its reflex. */
const REFLEX_AND_TURN: Readonly<Record<Horizontal | Vertical, { reflex: string; turn: string }>> = {
  eso: { reflex: "to the temple", turn: "in" },
  exo: { reflex: "to the nose", turn: "out" },
  hyper: { reflex: "below the pupil centre", turn: "up" },
  hypo: { reflex: "above the pupil centre", turn: "down" },
};

const WHY_UNREADABLE: Readonly<Record<UnreadableReason, string>> = {
  blurred: "The photograph is blurred, so the place of the reflex cannot be told.",
  "reflex-hidden": "A reflex is hidden or doubled, so the two eyes cannot be compared.",
  "pupil-not-visible": "A pupil cannot be seen, so the reflex has nothing to be placed against.",
  "not-fixating": "The eyes do not look at the light, so the reflexes do not show how they stand.",
  "irregular-pupil": "A pupil is dilated or irregular, so its centre and margin cannot be trusted.",
  "needs-cover-test": "The reflexes alone do not decide this pair: a cover test must.",
  other: "The photograph cannot be read.",
};

/** One sentence of why a finding is what it is: "The reflex lies to the temple in the left eye, so that eye turns in." */
export function explainReflex(finding: Finding): string {
  if (!finding.readable) return WHY_UNREADABLE[finding.reason];
  const { horizontal, vertical } = findingParts(finding);
  const signs = [horizontal, vertical].filter((part) => part !== null).map((part) => REFLEX_AND_TURN[part.direction]);
  if (signs.length === 0) return "The reflex lies in the same place in both eyes, so neither eye deviates.";
  const reflex = signs.map((sign) => sign.reflex).join(" and ");
  const turn = signs.map((sign) => sign.turn).join(" and ");
  return `The reflex lies ${reflex} in the ${finding.eye} eye, so that eye turns ${turn}.`;
}
