import { BEYOND_LIMBUS, type Degrees, type Finding } from "./finding";
import { findingParts } from "./finding-parts";

export type SignedComponents = {
  /** Degrees, eso +, exo −. Null where there is no number: not readable, or beyond the limbus. */
  horizontal: number | null;
  /** Degrees in the right-over-left sense: right hyper and left hypo +, left hyper and right hypo −. Null likewise. */
  vertical: number | null;
  /** True where a deviation is there but lies beyond the limbus, so that its size is only known to exceed 45°. */
  censored: { horizontal: boolean; vertical: boolean };
};

/**
 * The two signed sizes of a finding, as limits of agreement need them; aligned is 0 on both.
 * The eye is not in them: eso counts the same in either eye, and a vertical deviation the same named on either eye.
 */
export function signedComponents(finding: Finding): SignedComponents {
  if (!finding.readable) {
    return { horizontal: null, vertical: null, censored: { horizontal: false, vertical: false } };
  }
  const { horizontal, vertical } = findingParts(finding);
  return {
    horizontal: horizontal ? signed(horizontal.degrees, horizontal.direction === "eso") : 0,
    vertical: vertical ? signed(vertical.degrees, vertical.sense === "right over left") : 0,
    censored: {
      horizontal: horizontal?.degrees === BEYOND_LIMBUS,
      vertical: vertical?.degrees === BEYOND_LIMBUS,
    },
  };
}

function signed(degrees: Degrees, isPositive: boolean): number | null {
  if (degrees === BEYOND_LIMBUS) return null;
  return isPositive ? degrees : -degrees;
}
