import { landmarkDegrees, reflexInEye } from "@/lib/eyes/geometry";
import { completeParameters, type PhotographParameters, type Side } from "@/lib/eyes/parameters";
import { ALIGNED, BEYOND_LIMBUS, DEGREES_MAX, type Degrees, type ReadableFinding } from "@/lib/reflex/finding";

type Deviation = { esoDegrees: number; hyperDegrees: number };

/**
 * What a drawn photograph truly shows by the landmark rule, in whole degrees. The decentration that both eyes share is
 * left out, since it is normal. A deviation to the side and upwards is one turn of the eye: its parts are those of the
 * turn, as in the parameters, and not of two readings along the axes (which differ by a degree or less).
 * Throws RangeError where both eyes deviate: a finding names one.
 */
export function findingShown(parameters: PhotographParameters): ReadableFinding {
  const right = deviationShown(parameters, "right");
  const left = deviationShown(parameters, "left");
  if (!right && !left) return ALIGNED;
  if (right && left) throw new RangeError("Both eyes deviate, but a finding names one.");
  const { esoDegrees, hyperDegrees } = right ?? left ?? { esoDegrees: 0, hyperDegrees: 0 };
  const horizontalDegrees = sizeOf(esoDegrees);
  const verticalDegrees = sizeOf(hyperDegrees);
  return {
    readable: true,
    eye: right ? "right" : "left",
    horizontal: horizontalDegrees === null ? "none" : esoDegrees > 0 ? "eso" : "exo",
    horizontalDegrees,
    vertical: verticalDegrees === null ? "none" : hyperDegrees > 0 ? "hyper" : "hypo",
    verticalDegrees,
  };
}

/** Read off the place of the reflex on the eye, and null where that is the centre of the pupil. */
function deviationShown(parameters: PhotographParameters, side: Side): Deviation | null {
  const settings = completeParameters(parameters);
  const { irisDiameterMm, model } = settings;
  const { n, y } = reflexInEye({ ...settings[side], irisDiameterMm, model, kappaMm: 0 });
  const distanceMm = Math.hypot(n, y);
  if (distanceMm < 1e-9) return null;
  const degrees = landmarkDegrees(distanceMm, settings[side].pupilMm / 2, irisDiameterMm / 2);
  return { esoDegrees: (-n / distanceMm) * degrees, hyperDegrees: (y / distanceMm) * degrees };
}

function sizeOf(signedDegrees: number): Degrees | null {
  const whole = Math.round(Math.abs(signedDegrees));
  if (whole > DEGREES_MAX) return BEYOND_LIMBUS;
  return whole === 0 ? null : whole;
}
