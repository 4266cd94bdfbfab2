import { LANDMARKS_DEFAULT } from "./convention";
import { degreesAtLandmarks } from "./landmarks";

/**
 * mm by which a rotation of the eye moves the reflex from the centre of the pupil and of the limbus, for each sin θ.
 * After Barry & Backes, Invest Ophthalmol Vis Sci 1997; 38: 2597-2607; taken from notes on the paper, not from its text.
 */
export const MEASURED_LEVER_MM = { pupilCentre: 4.884, limbusCentre: 5.243 } as const;

/**
 * What the landmark rule reads on a photograph of an eye that is truly turned by so many degrees (0 to below 90), so
 * that the taught rule can be held against measurement. The turned iris is foreshortened by cos θ, as in a photograph;
 * the eye has no angle kappa. Null where the reflex lies beyond the limbus. Throws RangeError outside 0 to 90.
 */
export function landmarkRuleReading(
  trueDegrees: number,
  {
    pupilMm = LANDMARKS_DEFAULT.pupilMm,
    hvidMm = LANDMARKS_DEFAULT.hvidMm,
  }: { pupilMm?: number; hvidMm?: number } = {},
): number | null {
  if (!(trueDegrees >= 0 && trueDegrees < 90)) {
    throw new RangeError(`A true angle runs from 0° to below 90°: got ${trueDegrees}.`);
  }
  const sine = Math.sin((trueDegrees * Math.PI) / 180);
  const cosine = Math.cos((trueDegrees * Math.PI) / 180);
  // Seen from the side, the pupil lies behind the limbus's plane, so the two centres part.
  const betweenCentresMm = (MEASURED_LEVER_MM.limbusCentre - MEASURED_LEVER_MM.pupilCentre) * sine;
  return degreesAtLandmarks(MEASURED_LEVER_MM.pupilCentre * sine, {
    pupilMarginMm: (pupilMm / 2) * cosine,
    limbusMm: (hvidMm / 2) * cosine - betweenCentresMm,
  });
}
