import { BEYOND_LIMBUS, type Degrees, type Eye, type Finding } from "./finding";
import { LANDMARK_DEGREES, mmAtLandmarks } from "./landmarks";

/**
 * Radii of the rings of the reading map, in mm from the pupil centre, and the degrees the landmark rule gives them:
 * pupil margin 15, midway between margin and limbus 30, limbus 45. Common practice, no source: a pupil of 3.5 mm and
 * an iris of 11.7 mm across; the landmark rule itself is taught, not measured. Beyond the limbus, `drawnMax` is the
 * farthest a dot may lie without touching the edge of the drawn sclera.
 */
export const READING_MAP_MM = { pupil: 1.75, midway: 3.8, limbus: 5.85, drawnMax: 8.4, sclera: 9.2 } as const;

/** Where an eye that fixes shows its reflex: slightly nasal, by angle kappa. Common practice, no source. */
const NORMAL_NASAL_MM = 0.5;

/** `>45` is censored. It is drawn on the sclera, in the middle of the strip outside the limbus, and never counted from. */
const BEYOND_LIMBUS_DRAWN_DEGREES = 60;

const SCLERA_MM_PER_DEGREE = 2.4 / 15;

/** mm from the pupil centre as the viewer sees it: x to the viewer's right, y downwards. */
export type MapPoint = { x: number; y: number };

/** How far from the pupil centre the map draws a reflex at so many degrees: by the landmark rule, then onto the sclera. */
export function landmarkDistanceMm(degrees: number): number {
  const { pupil: pupilMarginMm, limbus: limbusMm, drawnMax } = READING_MAP_MM;
  const onIrisMm = mmAtLandmarks(degrees, { pupilMarginMm, limbusMm });
  return onIrisMm ?? Math.min(drawnMax, limbusMm + (degrees - LANDMARK_DEGREES.limbus) * SCLERA_MM_PER_DEGREE);
}

/**
 * Where a finding says the reflex of one eye lies. The reflex moves against the eye: eso to the temple, exo to the
 * nose, hyper below the pupil centre, hypo above. The eye that does not deviate shows its normal nasal place.
 * `null` when the finding is not readable: there is no place to draw.
 */
export function readingMapPosition(finding: Finding, side: Eye): MapPoint | null {
  if (!finding.readable) return null;
  const nasal = side === "right" ? 1 : -1; // facing the patient, the nose lies to the viewer's right of the right eye
  if (finding.eye !== side) return { x: nasal * NORMAL_NASAL_MM, y: 0 };
  const across = finding.horizontal === "none" ? 0 : drawnDegrees(finding.horizontalDegrees);
  const down = finding.vertical === "none" ? 0 : drawnDegrees(finding.verticalDegrees);
  const total = Math.hypot(across, down);
  if (total === 0) return { x: nasal * NORMAL_NASAL_MM, y: 0 };
  const mm = landmarkDistanceMm(total);
  const toNose = finding.horizontal === "exo" ? nasal : -nasal;
  const toChin = finding.vertical === "hyper" ? 1 : -1;
  return { x: across === 0 ? 0 : (toNose * across * mm) / total, y: down === 0 ? 0 : (toChin * down * mm) / total };
}

/** Both eyes of a readable finding when neither deviates; otherwise only the eye it names: the other one says nothing. */
export function eyesOnMap(finding: Finding): readonly Eye[] {
  if (!finding.readable) return [];
  return finding.eye === "none" ? ["right", "left"] : [finding.eye];
}

/**
 * A small, repeatable shift that keeps equal readings from hiding each other. The same seed and index always give the
 * same shift, so a map looks the same on screen, in print and on the next visit.
 */
export function jitterMm(seed: number, index: number, reachMm = 0.45): MapPoint {
  const angle = 2 * Math.PI * hashToUnit(seed, 2 * index);
  const radius = reachMm * Math.sqrt(hashToUnit(seed, 2 * index + 1));
  return { x: radius * Math.cos(angle), y: radius * Math.sin(angle) };
}

/** An even spread over 0 to 1 from two whole numbers (the finalizer of MurmurHash3, public domain). */
function hashToUnit(seed: number, index: number): number {
  let h = Math.imul(seed ^ 0x9e3779b9, 0x85ebca6b) ^ Math.imul(index + 1, 0xc2b2ae35);
  h = Math.imul(h ^ (h >>> 16), 0x85ebca6b);
  h = Math.imul(h ^ (h >>> 13), 0xc2b2ae35);
  return ((h ^ (h >>> 16)) >>> 0) / 4294967296;
}

function drawnDegrees(degrees: Degrees | null): number {
  if (degrees === null) return 0;
  return degrees === BEYOND_LIMBUS ? BEYOND_LIMBUS_DRAWN_DEGREES : degrees;
}
