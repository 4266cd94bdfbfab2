import { locateEyes } from "./geometry";
import { createEyeRandom, shapeLids } from "./lids";
import { completeParameters, type PhotographParameters, type Side } from "./parameters";

/** How far from the nearer lid margin a point lies, mm; negative where a lid covers it. */
export type LidClearanceMm = { reflex: number; pupilCentre: number };

/** Whether an eye can be read at all: a reflex (about half a millimetre in radius) behind a lid is not there to be seen. */
export function measureLidClearance(parameters: PhotographParameters, side: Side): LidClearanceMm {
  const settings = completeParameters(parameters);
  const eye = locateEyes(settings)[side];
  const { upper, lower, innerCorner, outerCorner } = shapeLids(settings, side, createEyeRandom(settings.seed, side));
  const clearance = ({ x, y }: { x: number; y: number }) => {
    const n = eye.towardsNose * (x - eye.centreX);
    return Math.min(
      (y - upper.at(n)) / Math.hypot(1, upper.slope(n)),
      (lower.at(n) - y) / Math.hypot(1, lower.slope(n)),
      innerCorner.n - n,
      n - outerCorner.n,
    );
  };
  return { reflex: clearance(eye.reflex), pupilCentre: clearance(eye.pupilCentre) };
}
