import { mapRgb, mixRgb, type Rgb, scaleRgb } from "./colour";
import type { GlobePlace } from "./globe";
import type { Scene } from "./scene";
import { bell, smoothStep } from "./shaping";

const FOLD_PINK: Rgb = [0.6, 0.33, 0.275];
const CARUNCLE_PINK: Rgb = [0.62, 0.27, 0.215];

/** The pink fold (plica) and the caruncle at the inner corner. */
export function paintInnerCorner(scene: Scene, place: GlobePlace, under: Rgb): Rgb {
  const { eye, n, y, lidShade } = place;
  const { depth } = scene.palette;
  const [first, , third] = scene.noise;
  const { innerCorner } = eye.lids;
  const bow = 0.11 * (y - innerCorner.y) ** 2;
  const pastFold = n - (innerCorner.n - 4.3 + bow + 0.25 * first.plane(y * 0.9, eye.centreX));
  const fold = smoothStep(-0.9, 1.1, pastFold);
  if (fold <= 0) return under;
  const mottle = first.octaves(n * 1.3, y * 1.3, 3);
  const lit = 0.35 + 0.65 * lidShade;
  const pink = mapRgb(FOLD_PINK, (q) => q * (0.7 + 0.2 * mottle) * lit * (1 - 0.3 * depth));
  const colour = scaleRgb(mixRgb(under, pink, 0.66 * fold), 1 - 0.16 * bell(pastFold + 0.1, 0.28));
  const centre = { n: innerCorner.n - 1.9, y: innerCorner.y + 0.02 };
  const distance = Math.hypot((n - centre.n) / 1.75, y - centre.y) + 0.1 * third.plane(n * 1.5, y * 1.5);
  const caruncle = smoothStep(1.15, 0.45, distance);
  return caruncle > 0 ? mixRgb(colour, caruncleAt(scene, n, y, y - centre.y, distance), 0.85 * caruncle) : colour;
}

function caruncleAt(scene: Scene, n: number, y: number, belowCentre: number, distance: number): Rgb {
  const { depth } = scene.palette;
  const [, second, third] = scene.noise;
  const dome = Math.sqrt(Math.max(0, 1 - Math.min(1, distance * distance)));
  const lumps = second.plane(n * 2.1, y * 2.1);
  const wet = smoothStep(0.15, 0.6, third.plane(n * 2.6, y * 2.6)) * dome * bell(belowCentre + 0.3, 0.3);
  return mapRgb(CARUNCLE_PINK, (q) => q * (0.66 + 0.36 * dome + 0.16 * lumps) * (1 - 0.34 * depth) + 0.24 * wet);
}
