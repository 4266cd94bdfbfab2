import type { Rgb } from "./colour";
import { faceLight, type Relief } from "./relief";
import type { Scene, SceneEye } from "./scene";
import { bell, clamp, hill, smoothStep } from "./shaping";
import { pigmentAt } from "./skin-pigment";
import { findSkinPlace, type SkinPlace } from "./skin-place";

/** Skin as it comes out in the flash: its own colour, lit by its relief, dark in its folds, glossy where it is oily. */
export function paintSkin(
  scene: Scene,
  relief: Relief,
  reliefIndex: number,
  eye: SceneEye,
  at: { x: number; n: number; y: number },
): Rgb {
  const place = findSkinPlace(scene, eye, at.x, at.n, at.y);
  const { colour, brow } = pigmentAt(scene, place);
  const facing = faceLight(relief, reliefIndex, scene.pxPerMm);
  const red = ((facing.red + 0.34) / 1.34) ** 1.7;
  const green = ((facing.green + 0.2) / 1.2) ** 1.7;
  const open = 1 - clamp(foldShadowAt(scene, place), 0, 0.85);
  const openRed = open ** 0.86; // blood lets red light into a fold
  const gleam = glossAt(scene, place, brow, facing.halfway) * open;
  return [
    colour[0] * (0.1 + 0.93 * red) * openRed + gleam,
    colour[1] * (0.085 + 0.935 * green) * open + gleam * 0.96,
    colour[2] * (0.085 + 0.935 * green) * open + gleam * 0.93,
  ];
}

/** How much of the light folds and lashes keep off. */
function foldShadowAt(scene: Scene, { eye, n, y, aboveUpper, belowLower, aboveCrease }: SkinPlace): number {
  const { innerCorner, outerCorner } = eye.lids;
  const span = smoothStep(-17.5, -13.0, n) * smoothStep(innerCorner.n + 1.6, innerCorner.n - 1.7, n);
  const vary = 0.75 + 0.5 * scene.noise[1].plane(n * 0.35 + 3, eye.centreX);
  const crease =
    foldEndsAt(eye, n) *
    vary *
    eye.foldDepth(n) *
    (0.3 * bell(aboveCrease + 0.2, 0.17 + 0.08 * vary) +
      0.25 * bell(aboveCrease + 0.5, 0.62) +
      0.1 * bell(aboveCrease - 0.9, 1.6));
  const lashes =
    aboveUpper > -0.3 ? span * (0.62 * bell(aboveUpper - 0.42, 0.42) + 0.2 * bell(aboveUpper - 1.0, 1.3)) : 0;
  const lowerLid =
    belowLower > -0.3 ? span * (0.1 * bell(belowLower - 1.5, 0.45) + 0.05 * bell(belowLower - 2.6, 1.2)) : 0;
  const outerN = n - outerCorner.n;
  const corners =
    0.3 * hill(outerN + 0.7, 1.7, y - outerCorner.y - 0.25 + 0.1 * outerN, 0.9) +
    0.26 * hill(n - innerCorner.n - 0.2, 1.5, y - innerCorner.y, 1.0);
  return crease + lashes + lowerLid + corners;
}

function foldEndsAt(eye: SceneEye, n: number): number {
  const inner = eye.lids.innerCorner.n;
  return smoothStep(-21, -13.0, n) * smoothStep(inner + 3.2, inner - 1.8, n);
}

function glossAt(scene: Scene, place: SkinPlace, brow: number, halfway: number): number {
  const { eye, x, n, y, belowLower, aboveCrease, mottle } = place;
  const oil =
    0.4 +
    0.85 * hill(x, 7, 0, 1) +
    0.55 * hill(n + 6, 12, y + 19.5, 4.5) * (1 - 0.75 * clamp(brow)) +
    0.5 * bell(aboveCrease - 3.2, 2.4) * foldEndsAt(eye, n) +
    0.3 * hill(n + 1, 9, belowLower - 3.0, 1.2) +
    0.25 * smoothStep(8, 18, y);
  const broken = 0.4 + 1.1 * clamp(0.5 + mottle.fine + 0.5 * mottle.grainy);
  return scene.palette.gloss * oil * (0.7 * halfway ** 22 + 0.55 * halfway ** 70 * broken);
}
