import type { Eye, Finding, Horizontal, Vertical } from "./finding";
import { findingParts, type VerticalSense } from "./finding-parts";

type DirectionWords = Horizontal | Vertical | `${Horizontal}+${Vertical}`;
export type DirectionLabel = "aligned" | `${"R" | "L"} ${DirectionWords}` | "not readable";

const DIRECTION_WORDS: readonly DirectionWords[] = [
  "eso",
  "exo",
  "hyper",
  "hypo",
  "eso+hyper",
  "eso+hypo",
  "exo+hyper",
  "exo+hypo",
];

/** Every label there is, in the order tables show them. Stored results go by these words: never rename one. */
export const DIRECTION_LABELS: readonly DirectionLabel[] = [
  "aligned",
  ...DIRECTION_WORDS.map((words): DirectionLabel => `R ${words}`),
  ...DIRECTION_WORDS.map((words): DirectionLabel => `L ${words}`),
  "not readable",
];

export const HORIZONTAL_DIRECTIONS = ["eso", "none", "exo"] as const;
export const VERTICAL_DIRECTIONS = ["right over left", "none", "left over right"] as const;
export const DEVIATING_EYES = ["right", "none", "left"] as const;

/** Eye, horizontal and vertical direction as one nominal category, for unweighted kappa. */
export function directionLabel(finding: Finding): DirectionLabel {
  if (!finding.readable) return "not readable";
  const { horizontal, vertical } = findingParts(finding);
  const side = finding.eye === "right" ? "R" : "L";
  if (horizontal && vertical) return `${side} ${horizontal.direction}+${vertical.direction}`;
  if (horizontal) return `${side} ${horizontal.direction}`;
  if (vertical) return `${side} ${vertical.direction}`;
  return "aligned";
}

/** Sub-scale of the label. Null when not readable: a missing reading there, since no direction was given. */
export function horizontalDirection(finding: Finding): Horizontal | "none" | null {
  return finding.readable ? (findingParts(finding).horizontal?.direction ?? "none") : null;
}

/** Sub-scale of the label, in the right-over-left sense, so that it does not matter on which eye it was named. */
export function verticalDirection(finding: Finding): VerticalSense | "none" | null {
  return finding.readable ? (findingParts(finding).vertical?.sense ?? "none") : null;
}

/** Sub-scale of the label, as named. A purely vertical deviation may be named on either eye: see `nameVerticalOnEye`. */
export function deviatingEye(finding: Finding): Eye | "none" | null {
  return finding.readable ? finding.eye : null;
}
