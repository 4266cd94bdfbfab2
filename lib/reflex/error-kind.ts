import { BEYOND_LIMBUS, type Degrees, type Finding, type ReadableFinding } from "./finding";
import { findingParts } from "./finding-parts";
import { isPurelyVertical } from "./name-vertical-on-eye";
import { acceptBorderline, componentsWithinTolerance, DEFAULT_TOLERANCE, type Tolerance } from "./tolerance";

/** In the order in which they are looked for: a reading gets the first that fits. Stored results go by these words. */
export const ERROR_KINDS = [
  "not readable against readable",
  "squint called on an aligned pair",
  "squint missed",
  "horizontal direction reversed",
  "vertical direction reversed",
  "other eye",
  "vertical part missed or added",
  "horizontal part missed or added",
  "unit slip",
  "size outside tolerance",
] as const;
export type ErrorKind = (typeof ERROR_KINDS)[number];

/** All but the two about size: the direction was wrong, so these are counted and kept out of size statistics. */
export const BLUNDERS: readonly ErrorKind[] = ERROR_KINDS.filter(
  (kind) => kind !== "unit slip" && kind !== "size outside tolerance",
);

export function isBlunder(kind: ErrorKind | null): boolean {
  return kind !== null && BLUNDERS.includes(kind);
}

/**
 * What is wrong with a reading, or null when it agrees: the same direction label and within tolerance, where a
 * borderline part may be missing and a purely vertical deviation may be named on either eye. So a reading counts
 * towards the agreement score exactly when this is null, and towards size statistics exactly when it is no blunder.
 */
export function errorKind(
  reading: Finding,
  reference: Finding,
  tolerance: Tolerance = DEFAULT_TOLERANCE,
): ErrorKind | null {
  if (!reading.readable || !reference.readable) {
    return reading.readable === reference.readable ? null : "not readable against readable";
  }
  const accepted = acceptBorderline(reading, reference, tolerance);
  return directionError(reading, accepted) ?? sizeError(reading, accepted, tolerance);
}

/**
 * Whether a purely vertical deviation was named on the other eye: left hypo for right hyper. Said beside the reading
 * and no wrong direction, because it depends on which eye fixes and the eyes stand the same.
 */
export function isNamedOnOtherEye(reading: Finding, reference: Finding): boolean {
  if (!reading.readable || !isPurelyVertical(reference) || reading.eye === "none" || reading.eye === reference.eye) {
    return false;
  }
  return findingParts(reading).vertical?.sense === findingParts(reference).vertical?.sense;
}

function directionError(reading: ReadableFinding, reference: ReadableFinding): ErrorKind | null {
  const read = findingParts(reading);
  const assigned = findingParts(reference);
  if (reading.eye !== "none" && reference.eye === "none") return "squint called on an aligned pair";
  if (reading.eye === "none" && reference.eye !== "none") return "squint missed";
  if (read.horizontal && assigned.horizontal && read.horizontal.direction !== assigned.horizontal.direction) {
    return "horizontal direction reversed";
  }
  if (read.vertical && assigned.vertical && read.vertical.sense !== assigned.vertical.sense) {
    return "vertical direction reversed";
  }
  if (reading.eye !== reference.eye && !isNamedOnOtherEye(reading, reference)) return "other eye";
  if ((read.vertical === null) !== (assigned.vertical === null)) return "vertical part missed or added";
  if ((read.horizontal === null) !== (assigned.horizontal === null)) return "horizontal part missed or added";
  return null;
}

/** Only for findings whose direction agrees. A slip of units is one when it explains every part outside tolerance. */
function sizeError(reading: ReadableFinding, reference: ReadableFinding, tolerance: Tolerance): ErrorKind | null {
  const within = componentsWithinTolerance(reading, reference, tolerance);
  if (within.horizontal && within.vertical) return null;
  const slips = [
    within.horizontal ? null : unitSlip(reading.horizontalDegrees, reference.horizontalDegrees),
    within.vertical ? null : unitSlip(reading.verticalDegrees, reference.verticalDegrees),
  ].filter((slip) => slip !== null);
  const [first] = slips;
  return first !== "none" && slips.every((slip) => slip === first) ? "unit slip" : "size outside tolerance";
}

/** Prism dioptres written as degrees come out about twice too large, degrees taken for prism dioptres about half. */
function unitSlip(read: Degrees | null, reference: Degrees | null): "too large" | "too small" | "none" {
  if (read === null || reference === null || read === BEYOND_LIMBUS || reference === BEYOND_LIMBUS) return "none";
  const ratio = read / reference;
  if (ratio >= 1.7 && ratio <= 2.2) return "too large";
  return ratio >= 0.45 && ratio <= 0.58 ? "too small" : "none";
}
