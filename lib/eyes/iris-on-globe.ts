import { mixRgb, type Rgb, scaleRgb } from "./colour";
import type { GlobePlace } from "./globe";
import type { Scene } from "./scene";
import { smoothStep } from "./shaping";

const PUPIL_DARK: Rgb = [0.003, 0.0026, 0.003];
const PUPIL_GLOW: Rgb = [0.014, 0.005, 0.004];

/** Lays iris and pupil over the sclera, in the shade of the lid and under a thin veil of light on the cornea. */
export function paintIris(scene: Scene, place: GlobePlace, sclera: Rgb): Rgb {
  const { eye, irisN, irisY, irisRadius, around, lidShade, squareness } = place;
  const limbusMm = scene.settings.irisDiameterMm / 2;
  const facesCamera = eye.rotation[2][2] > 0.15;
  if (!facesCamera || irisRadius >= limbusMm + 0.9) return sclera;
  const [first] = scene.noise;
  // A little light comes out on the far side of the bowl of the iris.
  const bowl = 0.94 + 0.1 * smoothStep(-4, 5.5, irisY);
  const shade = bowl * lidShade * (0.8 + 0.2 * smoothStep(0.3, 0.9, squareness));
  let colour = scaleRgb(scaleRgb(eye.iris(irisN, irisY), shade), 0.92);

  const pupilRadius = eye.settings.pupilMm / 2;
  const angle = Math.atan2(irisY, irisN);
  const wobble = 0.035 * first.space(Math.cos(angle) * 2.2, Math.sin(angle) * 2.2, eye.centreX);
  const inPupil = smoothStep(pupilRadius + 0.06 + wobble, pupilRadius - 0.07 + wobble, irisRadius);
  const glow = 0.5 * smoothStep(0, pupilRadius, Math.hypot(irisN - 0.3, irisY + 0.2));
  colour = mixRgb(colour, mixRgb(PUPIL_DARK, PUPIL_GLOW, glow), inPupil);

  const veil = 0.0012 + 0.014 * smoothStep(1, -5, irisY) * smoothStep(limbusMm, 3, irisRadius) * (1 - 0.8 * inPupil);
  colour = [colour[0] + veil * 0.9 * lidShade, colour[1] + veil * lidShade, colour[2] + veil * 1.12 * lidShade];
  const uneven = 0.09 * first.space(Math.cos(around) * 5, Math.sin(around) * 5, 2);
  const beyondLimbus = irisRadius - limbusMm + uneven + (Math.abs(irisY) > 3.6 ? -0.08 : 0);
  return mixRgb(sclera, colour, smoothStep(0.5, -0.42, beyondLimbus));
}
