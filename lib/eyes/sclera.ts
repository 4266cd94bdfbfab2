import { mixRgb, type Rgb, scaleRgb } from "./colour";
import type { GlobePlace } from "./globe";
import type { Scene } from "./scene";
import { bell, clamp, lerp, smoothStep } from "./shaping";

const FAIR_WHITE: Rgb = [0.8, 0.772, 0.74];
const DEEP_WHITE: Rgb = [0.5, 0.45, 0.385];
const BLOOD: Rgb = [0.68, 0.44, 0.37];
const BLUISH: Rgb = [0.6, 0.64, 0.71];
const PIGMENT: Rgb = [0.46, 0.32, 0.18];
const VESSEL: Rgb = [0.47, 0.125, 0.1];

/** The white of the eye: redder far out, bluish near the limbus, pigmented in deep skins, with vessels, and in shade. */
export function paintSclera(scene: Scene, place: GlobePlace): Rgb {
  const { n, globeN, globeY, around, fromAxisDegrees, irisRadius, lidShade, eye } = place;
  const { depth } = scene.palette;
  const [first, second] = scene.noise;
  const broad = first.octaves(globeN * 0.35 + 20, globeY * 0.35 + around, 3);
  const fine = second.octaves(globeN * 1.4, globeY * 1.4 + 7, 3);
  let colour = mixRgb(FAIR_WHITE, DEEP_WHITE, 0.66 * depth);
  const redness = clamp(0.1 + 0.36 * smoothStep(42, 78, fromAxisDegrees) + 0.13 * broad + 0.06 * fine);
  colour = mixRgb(colour, BLOOD, redness * (0.85 - 0.25 * depth));
  colour = mixRgb(colour, BLUISH, 0.2 * smoothStep(42, 29, fromAxisDegrees) + 0.05 * clamp(broad));
  const pigment = 0.18 * depth * clamp(0.4 + broad * 1.6) * smoothStep(60, 34, fromAxisDegrees);
  colour = mixRgb(colour, PIGMENT, pigment);
  const vessel = eye.vessels(around < 0 ? around + 2 * Math.PI : around, fromAxisDegrees);
  colour = mixRgb(colour, VESSEL, lerp(0.66, 0.36, depth) * clamp(vessel));
  const limbusMm = scene.settings.irisDiameterMm / 2;
  colour = scaleRgb(colour, 1 - 0.22 * bell(Math.max(0, irisRadius - limbusMm), 0.75));

  const roundness = 0.36 + 0.64 * smoothStep(-0.05, 1.0, place.squareness);
  const corner = 1 - 0.24 * smoothStep(9.5, 14.6, Math.abs(n)) - 0.08 * smoothStep(6, 12, Math.abs(n));
  const shade = lidShade * roundness * corner * (1 + 0.02 * fine);
  // Shade in the corners is warm, because light comes back from the lids.
  return [colour[0] * shade ** 0.72, colour[1] * shade ** 0.98, colour[2] * shade ** 1.03];
}
