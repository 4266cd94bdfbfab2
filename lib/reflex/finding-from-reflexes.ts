import { type Convention, DEFAULT_CONVENTION } from "./convention";
import { degreesFromDisplacement } from "./displacement";
import { ALIGNED, BEYOND_LIMBUS, DEGREES_MAX, type Degrees, type Eye, type Finding } from "./finding";

/** Where a reflex lies from the centre it is measured from, in mm: nasal +, temporal −; up +, down −. */
export type Decentration = { nasal: number; up: number };
export type Decentrations = Readonly<Record<Eye, Decentration>>;

export type ReflexOptions = {
  convention?: Convention;
  /** Normal nasal decentration (angle kappa) of both eyes. Common practice, no source: 0.5 mm. */
  normalNasalMm?: number;
  /** The eye known to fix; without it, the eye whose reflex lies nearer its normal place. */
  fixingEye?: Eye;
  /** Eyes this far from their normal place do not look at the light. Our judgement, no source: 1 mm. */
  fixingWithinMm?: number;
  /** How much nearer the fixing eye's reflex must lie for the eye to be told. Our judgement, no source: 0.05 mm. */
  decidedByMm?: number;
};

/**
 * The finding that two measured reflexes give. The deviating eye's reflex is held against the fixing eye's, as the test
 * is taught, and not against an ideal place (common practice, no source); so equal decentration is aligned. The normal
 * place only tells which eye fixes. Each part is converted by itself and rounded to whole degrees; under a half is none.
 *
 * Not readable when the eyes differ and no fixing eye can be told: `not-fixating` when neither lies near its normal
 * place, `needs-cover-test` when both lie equally near. Throws RangeError for measures that are no numbers.
 */
export function findingFromReflexes(reflexes: Decentrations, options: ReflexOptions = {}): Finding {
  const convention = options.convention ?? DEFAULT_CONVENTION;
  const fixingEye = options.fixingEye ?? nearerEye(reflexes, options);
  const finding = deviationOf(otherEye(fixingEye), reflexes, convention);
  if (finding === null) return ALIGNED;
  if (options.fixingEye) return finding;
  const { fixingWithinMm = 1, decidedByMm = 0.05 } = options;
  const distance = distancesMm(reflexes, options);
  if (distance[fixingEye] > fixingWithinMm) return { readable: false, reason: "not-fixating" };
  const isDecided = distance[otherEye(fixingEye)] - distance[fixingEye] > decidedByMm;
  return isDecided ? finding : { readable: false, reason: "needs-cover-test" };
}

/** The deviation of one eye against its fellow, or null when there is none. Reflex temporal = eso, below = hyper. */
function deviationOf(eye: Eye, reflexes: Decentrations, convention: Convention): Finding | null {
  const fellow = reflexes[otherEye(eye)];
  const nasalMm = reflexes[eye].nasal - fellow.nasal;
  const upMm = reflexes[eye].up - fellow.up;
  const horizontalDegrees = sizeOf(nasalMm, convention);
  const verticalDegrees = sizeOf(upMm, convention);
  if (horizontalDegrees === null && verticalDegrees === null) return null;
  return {
    readable: true,
    eye,
    horizontal: horizontalDegrees === null ? "none" : nasalMm < 0 ? "eso" : "exo",
    horizontalDegrees,
    vertical: verticalDegrees === null ? "none" : upMm < 0 ? "hyper" : "hypo",
    verticalDegrees,
  };
}

function sizeOf(mm: number, convention: Convention): Degrees | null {
  const degrees = degreesFromDisplacement(Math.abs(mm), convention);
  if (degrees === null) return BEYOND_LIMBUS;
  const whole = Math.round(degrees);
  if (whole > DEGREES_MAX) return BEYOND_LIMBUS;
  return whole === 0 ? null : whole;
}

function nearerEye(reflexes: Decentrations, options: ReflexOptions): Eye {
  const distance = distancesMm(reflexes, options);
  return distance.left < distance.right ? "left" : "right";
}

/** How far each reflex lies from its normal place. */
function distancesMm(reflexes: Decentrations, { normalNasalMm = 0.5 }: ReflexOptions): Record<Eye, number> {
  const distance = ({ nasal, up }: Decentration) => Math.hypot(nasal - normalNasalMm, up);
  return { right: distance(reflexes.right), left: distance(reflexes.left) };
}

function otherEye(eye: Eye): Eye {
  return eye === "right" ? "left" : "right";
}
