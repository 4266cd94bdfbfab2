import type { Degrees, Finding, Horizontal, Vertical } from "./finding";
import { findingParts } from "./finding-parts";
import { UNREADABLE_REASON_WORDS } from "./unreadable-reason-words";

/** `tropia`: LXT, RET; `squint`: LDS, RCS (divergent, convergent squint). The department chooses. */
export const NOTATIONS = ["tropia", "squint"] as const;
export type Notation = (typeof NOTATIONS)[number];

/** Letters after R or L. The squint form has none of its own for vertical deviations: common practice, no source. */
export const DIRECTION_LETTERS: Readonly<Record<Notation, Readonly<Record<Horizontal | Vertical, string>>>> = {
  tropia: { eso: "ET", exo: "XT", hyper: "HT", hypo: "HoT" },
  squint: { eso: "CS", exo: "DS", hyper: "HT", hypo: "HoT" },
};

export const ALIGNED_SHORTHAND = "ortho";
export const UNREADABLE_SHORTHAND = "not readable";

/**
 * A finding as the trade writes it: `LXT 30°`, `RHT 15°`, `LXT 30° LHoT 15°`, `RET >45°`, `ortho`, and
 * `not readable: blurred`, which has no short form. Always in degrees; `parseShorthand` reads every form back.
 */
export function shorthand(finding: Finding, notation: Notation = "tropia"): string {
  if (!finding.readable) return `${UNREADABLE_SHORTHAND}: ${UNREADABLE_REASON_WORDS[finding.reason]}`;
  const { horizontal, vertical } = findingParts(finding);
  const side = finding.eye === "left" ? "L" : "R";
  const letters = DIRECTION_LETTERS[notation];
  const parts = [horizontal, vertical].filter((part) => part !== null);
  if (parts.length === 0) return ALIGNED_SHORTHAND;
  return parts.map(({ direction, degrees }) => `${side}${letters[direction]} ${sizeText(degrees)}`).join(" ");
}

/** `30°` or `>45°`. */
export function sizeText(degrees: Degrees): string {
  return `${degrees}°`;
}
