import { BEYOND_LIMBUS, DEGREES_MAX, type Degrees, type Finding } from "./finding";
import { findingParts } from "./finding-parts";

/** The ordered scale of sizes for weighted kappa: the landmarks in degrees, and beyond the limbus. */
export const STEPS = [0, 15, 30, 45, BEYOND_LIMBUS] as const;
export type Step = (typeof STEPS)[number];

/**
 * The step nearest to a size in degrees, from 0 (no deviation) to 45, or beyond the limbus; half-way goes to the larger
 * step. Throws RangeError for a number that is no size: below 0, above 45, not finite.
 */
export function stepOf(degrees: Degrees | 0): Step {
  if (degrees === BEYOND_LIMBUS) return BEYOND_LIMBUS;
  if (!(degrees >= 0 && degrees <= DEGREES_MAX)) {
    throw new RangeError(`A size runs from 0 to ${DEGREES_MAX} degrees, or is >45: got ${degrees}.`);
  }
  if (degrees < 7.5) return 0;
  if (degrees < 22.5) return 15;
  return degrees < 37.5 ? 30 : 45;
}

/**
 * The step of a whole finding: its larger part decides when it has two, since that is the deviation one sees first.
 * Aligned is 0. Null when not readable.
 */
export function stepOfFinding(finding: Finding): Step | null {
  if (!finding.readable) return null;
  const { horizontal, vertical } = findingParts(finding);
  const steps = [stepOf(horizontal?.degrees ?? 0), stepOf(vertical?.degrees ?? 0)];
  return STEPS.findLast((step) => steps.includes(step)) ?? 0;
}
