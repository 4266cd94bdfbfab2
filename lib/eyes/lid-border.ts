import { mapRgb, mixRgb, type Rgb } from "./colour";
import type { Scene, SceneEye } from "./scene";
import { bell, clamp, smoothStep } from "./shaping";

const WET_PINK: Rgb = [0.62, 0.36, 0.31];

/** The wet borders of the lids over the skin: broad and moist on the lower lid, narrow and dark under the upper. */
export function paintLidBorders(scene: Scene, eye: SceneEye, n: number, y: number, skin: Rgb): Rgb {
  const { upper, lower, innerCorner, outerCorner } = eye.lids;
  if (n <= outerCorner.n - 0.4 || n >= innerCorner.n + 0.4 || Math.abs(y) >= 9) return skin;
  const { depth } = scene.palette;
  const ends =
    smoothStep(outerCorner.n + 0.1, outerCorner.n + 2.8, n) * smoothStep(innerCorner.n - 0.1, innerCorner.n - 2.6, n);
  const tone = mixRgb(scene.lidBorderColour, WET_PINK, 0.4 * (1 - depth));
  let colour = skin;
  const belowLower = (y - lower.at(n)) / Math.sqrt(1 + lower.slope(n) ** 2);
  if (belowLower > -0.1) {
    const width = 0.35 + 0.85 * ends;
    const fade =
      smoothStep(outerCorner.n - 0.1, outerCorner.n + 1.0, n) * smoothStep(innerCorner.n + 0.1, innerCorner.n - 1.0, n);
    const band = smoothStep(width + 0.3, width - 0.25, belowLower);
    const lit =
      (0.72 + 0.2 * smoothStep(0, width, belowLower)) * (0.97 + 0.07 * scene.noise[0].plane(n * 1.7, belowLower * 2));
    const wet = moistureAt(scene, n, belowLower, width);
    colour = mixRgb(
      colour,
      mapRgb(tone, (z) => z * lit + wet * fade),
      0.78 * band * fade,
    );
  }
  const aboveUpper = (upper.at(n) - y) / Math.sqrt(1 + upper.slope(n) ** 2);
  if (aboveUpper > -0.1) {
    const band = smoothStep(0.75, 0.15, aboveUpper) * ends;
    colour = mixRgb(
      colour,
      mapRgb(tone, (z) => z * 0.36),
      0.72 * band,
    );
  }
  return colour;
}

function moistureAt(scene: Scene, n: number, belowLower: number, width: number): number {
  const [, second, third] = scene.noise;
  return (
    (1 - 0.55 * scene.palette.depth) *
    (0.09 *
      bell(belowLower - 0.28 - 0.12 * third.plane(n * 0.9, 7), 0.13) *
      smoothStep(-0.1, 0.6, second.plane(n * 0.5 + 9, belowLower * 1.5)) +
      0.04 * bell(belowLower - width * 0.8, 0.2) * clamp(0.5 + third.plane(n * 2.2, 4)))
  );
}
