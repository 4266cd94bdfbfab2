import { ALIGNED, BEYOND_LIMBUS, type Degrees, type Finding, type ReadableFinding } from "./finding";
import { type FindingParts, findingParts } from "./finding-parts";

/** How far a reading may lie from its reference; sizes in degrees. A department may set its own. */
export type Tolerance = {
  /** Allowed either way while the reference is at most `absoluteUpToDegrees`, 0 (no deviation) included. */
  absoluteDegrees: number;
  absoluteUpToDegrees: number;
  /** Allowed either way above that, as a share of the reference. */
  relative: number;
  /** A reference part below this is borderline: a reading without that part is accepted. */
  borderlineHorizontalDegrees: number;
  borderlineVerticalDegrees: number;
};

/** Common practice, no source. */
export const DEFAULT_TOLERANCE: Tolerance = {
  absoluteDegrees: 5,
  absoluteUpToDegrees: 20,
  relative: 0.25,
  borderlineHorizontalDegrees: 5,
  borderlineVerticalDegrees: 3,
};

export type ComponentsWithin = { horizontal: boolean; vertical: boolean };

/**
 * Whether a reading lies within tolerance of its reference: both signed components must, so the eye does not matter
 * here and the direction does. Beyond the limbus equals only beyond the limbus in the same direction. Two unreadable
 * findings agree whatever their reasons; an unreadable one and a readable one never do.
 */
export function isWithinTolerance(
  reading: Finding,
  reference: Finding,
  tolerance: Tolerance = DEFAULT_TOLERANCE,
): boolean {
  if (!reading.readable || !reference.readable) return reading.readable === reference.readable;
  const within = componentsWithinTolerance(reading, reference, tolerance);
  return within.horizontal && within.vertical;
}

/** The same for each component apart, of two readable findings. */
export function componentsWithinTolerance(
  reading: ReadableFinding,
  reference: ReadableFinding,
  tolerance: Tolerance = DEFAULT_TOLERANCE,
): ComponentsWithin {
  const readSizes = signedSizes(findingParts(reading));
  const referenceSizes = signedSizes(findingParts(acceptBorderline(reading, reference, tolerance)));
  return {
    horizontal: isSizeWithin(readSizes.horizontal, referenceSizes.horizontal, tolerance),
    vertical: isSizeWithin(readSizes.vertical, referenceSizes.vertical, tolerance),
  };
}

/**
 * The reference as it may be held against this reading: without each borderline part that the reading has not either,
 * so that `aligned` is accepted for a borderline deviation, and a missed borderline part beside a clear one too.
 */
export function acceptBorderline(
  reading: ReadableFinding,
  reference: ReadableFinding,
  tolerance: Tolerance = DEFAULT_TOLERANCE,
): ReadableFinding {
  const { horizontal, vertical } = findingParts(reference);
  const dropsHorizontal =
    reading.horizontal === "none" && isBelow(horizontal?.degrees, tolerance.borderlineHorizontalDegrees);
  const dropsVertical = reading.vertical === "none" && isBelow(vertical?.degrees, tolerance.borderlineVerticalDegrees);
  const accepted: ReadableFinding = {
    ...reference,
    ...(dropsHorizontal ? { horizontal: "none", horizontalDegrees: null } : {}),
    ...(dropsVertical ? { vertical: "none", verticalDegrees: null } : {}),
  };
  return accepted.horizontal === "none" && accepted.vertical === "none" ? ALIGNED : accepted;
}

function isBelow(degrees: Degrees | undefined, limit: number): boolean {
  return degrees !== undefined && degrees !== BEYOND_LIMBUS && degrees < limit;
}

/** Beyond the limbus becomes an infinite size with its sign: equal to itself only, and outside every tolerance. */
function signedSizes({ horizontal, vertical }: FindingParts): { horizontal: number; vertical: number } {
  const size = (degrees: Degrees) => (degrees === BEYOND_LIMBUS ? Number.POSITIVE_INFINITY : degrees);
  return {
    horizontal: horizontal ? size(horizontal.degrees) * (horizontal.direction === "eso" ? 1 : -1) : 0,
    vertical: vertical ? size(vertical.degrees) * (vertical.sense === "right over left" ? 1 : -1) : 0,
  };
}

function isSizeWithin(read: number, reference: number, tolerance: Tolerance): boolean {
  if (!Number.isFinite(read) || !Number.isFinite(reference)) return read === reference;
  const size = Math.abs(reference);
  const allowed = size <= tolerance.absoluteUpToDegrees ? tolerance.absoluteDegrees : tolerance.relative * size;
  return Math.abs(read - reference) <= allowed;
}
