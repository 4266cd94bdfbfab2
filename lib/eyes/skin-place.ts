import type { Scene, SceneEye } from "./scene";
import { acrossSkin } from "./skin-texture";

/** A point of the skin with what its colour, light and shadow all ask about. Distances in mm, square to the lid. */
export type SkinPlace = {
  eye: SceneEye;
  x: number;
  n: number;
  y: number;
  u: number;
  v: number;
  upperY: number;
  lowerY: number;
  aboveUpper: number;
  belowLower: number;
  aboveCrease: number;
  mottle: { broad: number; patchy: number; fine: number; grainy: number };
};

export function findSkinPlace(scene: Scene, eye: SceneEye, x: number, n: number, y: number): SkinPlace {
  const [first, second, third] = scene.noise;
  const { upper, lower } = eye.lids;
  const upperY = upper.at(n);
  const lowerY = lower.at(n);
  const uprightUpper = 1 / Math.sqrt(1 + upper.slope(n) ** 2);
  const uprightLower = 1 / Math.sqrt(1 + lower.slope(n) ** 2);
  const [u, v] = acrossSkin(x, y);
  return {
    eye,
    x,
    n,
    y,
    u,
    v,
    upperY,
    lowerY,
    aboveUpper: (upperY - y) * uprightUpper,
    belowLower: (y - lowerY) * uprightLower,
    aboveCrease: (upperY - eye.platformMm(n) - y) * uprightUpper,
    mottle: {
      broad: second.octaves(u * 0.11, v * 0.11, 4),
      patchy: third.octaves(u * 0.42, v * 0.42, 4),
      fine: first.octaves(u * 1.7, v * 1.7, 3),
      grainy: second.plane(u * 5.5, v * 5.5),
    },
  };
}
