import type { Vector } from "./geometry";
import type { Scene, SceneEye } from "./scene";
import { bell, clamp, hill, smoothStep } from "./shaping";
import { createSkinTexture } from "./skin-texture";

/** Heights of the skin in mm on the corners of the pixels, (width + 1) × (height + 1), row by row. */
export type Relief = {
  columns: number;
  /** The forms of the face, and apart from them the fine texture, because red light sees less of it. */
  form: Float32Array;
  texture: Float32Array;
};

export function raiseRelief(scene: Scene): Relief {
  const columns = scene.width + 1;
  const rows = scene.height + 1;
  const form = new Float32Array(columns * rows);
  const texture = new Float32Array(columns * rows);
  const textureAt = createSkinTexture(scene);
  for (let py = 0; py < rows; py++) {
    for (let px = 0; px < columns; px++) {
      const { x, y } = scene.toFace(px, py);
      const eye = scene.eyeAt(x);
      const n = eye.towardsNose * (x - eye.centreX);
      form[py * columns + px] = formAt(scene, eye, x, n, y);
      texture[py * columns + px] = textureAt(x, n, y);
    }
  }
  return { columns, form, texture };
}

function formAt(scene: Scene, eye: SceneEye, x: number, n: number, y: number): number {
  const { age, epicanthus } = scene.settings;
  const { upper, lower, innerCorner } = eye.lids;
  const fromMiddle = Math.abs(x);
  let z = -0.0058 * Math.max(0, fromMiddle - 20) ** 2;
  z += 3.2 * hill(n + 7, 20, y + 20.5, 6.6) + 2.2 * hill(x, 19, y + 25, 10);
  z += noseAt(x, y, scene.settings.noseWidth);
  z -= 2.5 * hill(n - 14.5, 6.8, y + 9.5, 6.4) + 1.7 * hill(n - 18, 3.6, y - 1.5, 6);
  z += 3.9 * hill(n + 0.2, 11.5, y - 0.2, 8.6);
  z -= 0.9 * hill(n + 18.5, 5, y - 1, 6) - 2.3 * smoothStep(8, 26, y) * hill(fromMiddle - 40, 19, 0, 1);

  // The fold above the upper lid stands out over the crease.
  const upperY = upper.at(n);
  const upright = 1 / Math.sqrt(1 + upper.slope(n) ** 2);
  const ends = smoothStep(-21, -12.5, n) * smoothStep(innerCorner.n + 3.7, innerCorner.n - 2.8, n);
  const aboveCrease = (upperY - eye.platformMm(n) - y) * upright;
  const risen = smoothStep(-0.75, 0.85, aboveCrease);
  z += ends * eye.foldDepth(n) * 1.15 * risen * Math.exp(-(Math.max(0, aboveCrease) ** 1.25) / 7.5);

  // The lower lid: a roll under the lashes, then the groove from the inner corner outwards.
  const belowLower = y - lower.at(n);
  const lowerEnds = smoothStep(-16, -9, n) * smoothStep(15, 8, n);
  z +=
    0.55 * lowerEnds * bell(belowLower - 3.4, 1.5) -
    0.3 * (0.35 + age) * lowerEnds * bell(belowLower - 6.3 - 0.012 * (n - 4) ** 2, 1.3);
  const trough = 8.6 + 0.44 * (13 - n);
  z -= (0.4 + 0.75 * age) * bell((y - trough) * 0.88, 1.9) * smoothStep(17, 12, n) * smoothStep(-12, 4, n);

  if (epicanthus > 0) {
    const dy = y - innerCorner.y + 0.6;
    const past = n - (innerCorner.n + 0.55 - 0.085 * dy * dy);
    z += 1.25 * epicanthus * smoothStep(-1.1, 1.2, past) * Math.exp(-Math.max(0, past) / 4.5) * bell(dy, 2.9);
  }
  return z;
}

/** The nose rises out of the brow and widens downwards. */
function noseAt(x: number, y: number, noseWidth: number): number {
  const down = 0.5 * (y + 7 + Math.sqrt((y + 7) ** 2 + 30));
  const bridge = smoothStep(-20, 6, y);
  return (
    (1.0 + 3.6 * bridge + 0.09 * down) * Math.exp(-((Math.abs(x) / ((7.6 + 0.16 * down) * noseWidth)) ** 2.6)) +
    (1.4 + 3.6 * bridge) * hill(x, (14.5 + 0.14 * down) * noseWidth, 0, 1)
  );
}

/** Where the light comes from, and halfway between it and the camera, as unit vectors. The flash sits a little above. */
const LIGHT = unit(0.02, -0.2, 1);
const HALFWAY = unit(LIGHT[0], LIGHT[1], LIGHT[2] + 1);

function unit(x: number, y: number, z: number): Vector {
  const length = Math.hypot(x, y, z);
  return [x / length, y / length, z / length];
}

/** How squarely the skin faces the light, for red and for the other channels, and the halfway vector; 0 to 1. */
export type Facing = { red: number; green: number; halfway: number };

/** `index` is that of the pixel's top left corner in the relief. */
export function faceLight(relief: Relief, index: number, pxPerMm: number): Facing {
  const { form, texture, columns } = relief;
  const formX = ((form[index + 1] ?? 0) - (form[index] ?? 0)) * pxPerMm;
  const formY = ((form[index + columns] ?? 0) - (form[index] ?? 0)) * pxPerMm;
  const textureX = ((texture[index + 1] ?? 0) - (texture[index] ?? 0)) * pxPerMm;
  const textureY = ((texture[index + columns] ?? 0) - (texture[index] ?? 0)) * pxPerMm;
  // Light scatters in the skin, red the farthest: it sees a smoother surface.
  return {
    red: squareness(formX + 0.35 * textureX, formY + 0.35 * textureY, LIGHT),
    green: squareness(formX + 0.75 * textureX, formY + 0.75 * textureY, LIGHT),
    halfway: squareness(formX + 0.95 * textureX, formY + 0.95 * textureY, HALFWAY),
  };
}

/** The cosine between a direction and the normal of a slope, none of it from behind. */
function squareness(slopeX: number, slopeY: number, direction: Vector): number {
  const length = Math.sqrt(slopeX * slopeX + slopeY * slopeY + 1);
  return clamp((-slopeX * direction[0] + -slopeY * direction[1] + direction[2]) * (1 / length));
}
