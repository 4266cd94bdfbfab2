import type { Rgb } from "./colour";
import { EYE_MODEL, throughIrisPlane } from "./geometry";
import { paintInnerCorner } from "./inner-corner";
import { paintIris } from "./iris-on-globe";
import { paintReflex } from "./reflex";
import type { Scene, SceneEye } from "./scene";
import { paintSclera } from "./sclera";
import { clamp } from "./shaping";
import { paintTears } from "./tears";

/** A point of the open eye: where it lies as seen, on the turned globe and on the turned iris plane, and how lids shade it. */
export type GlobePlace = {
  eye: SceneEye;
  n: number;
  y: number;
  /** On the globe, fixed to the eye: mm across the axis, radians around it, degrees from it. */
  globeN: number;
  globeY: number;
  around: number;
  fromAxisDegrees: number;
  /** On the iris plane, and the distance from its centre. */
  irisN: number;
  irisY: number;
  irisRadius: number;
  aboveLower: number;
  /** Light that the lids let through; and how squarely the globe faces the camera, 0 to 1. */
  lidShade: number;
  squareness: number;
};

/** Beyond this the sphere would fold over; the outline is held there (far in the corners). */
const RADIUS_SQUARED_MAX = 142.5;

function findGlobePlace(eye: SceneEye, n: number, y: number): GlobePlace {
  const { globeRadiusMm } = EYE_MODEL;
  const { upper, lower } = eye.lids;
  const squared = n * n + y * y;
  const held = squared > RADIUS_SQUARED_MAX ? Math.sqrt(RADIUS_SQUARED_MAX / squared) : 1;
  const gx = n * held;
  const gy = y * held;
  const gz = Math.sqrt(globeRadiusMm * globeRadiusMm - Math.min(squared, RADIUS_SQUARED_MAX));
  const [r0, r1, r2] = eye.rotation;
  const globeN = r0[0] * gx + r1[0] * gy + r2[0] * gz;
  const globeY = r0[1] * gx + r1[1] * gy + r2[1] * gz;
  const globeZ = r0[2] * gx + r1[2] * gy + r2[2] * gz;
  const onIris = throughIrisPlane(eye.rotation, n, y);
  const belowUpper = (y - upper.at(n)) / Math.sqrt(1 + upper.slope(n) ** 2);
  const aboveLower = (lower.at(n) - y) / Math.sqrt(1 + lower.slope(n) ** 2);
  return {
    eye,
    n,
    y,
    globeN,
    globeY,
    around: Math.atan2(globeY, globeN),
    fromAxisDegrees: (Math.acos(clamp(globeZ / globeRadiusMm, -1, 1)) * 180) / Math.PI,
    irisN: onIris.n,
    irisY: onIris.y,
    irisRadius: Math.hypot(onIris.n, onIris.y),
    aboveLower,
    lidShade:
      (1 - 0.62 * Math.exp(-Math.max(0, belowUpper) / 1.35)) * (1 - 0.2 * Math.exp(-Math.max(0, aboveLower) / 0.8)),
    squareness: clamp(gz / globeRadiusMm),
  };
}

/** The open eye, from the back to the front: sclera, iris and pupil, inner corner, tears, reflex. */
export function paintGlobe(scene: Scene, eye: SceneEye, n: number, y: number): Rgb {
  const place = findGlobePlace(eye, n, y);
  let colour = paintSclera(scene, place);
  colour = paintIris(scene, place, colour);
  colour = paintInnerCorner(scene, place, colour);
  colour = paintTears(scene, place, colour);
  return paintReflex(scene, place, colour);
}
