import type { Rgb } from "./colour";
import type { Scene } from "./scene";
import { bell, hill, lerp, smoothStep } from "./shaping";
import type { SkinPlace } from "./skin-place";

/** The colour of the skin itself, and how much brow shades it (0 to about 1). */
export type Pigment = { colour: Rgb; brow: number };

/** Absorption of each channel by blood and by pigment, set by eye. */
const BLOOD = [-0.1, -0.62, -0.5] as const;
const MELANIN = [-0.55, -0.82, -1.05] as const;

/** Blood and pigment gather by region: lids, corners, the hollow under the eye, cheek and nose. */
export function pigmentAt(scene: Scene, place: SkinPlace): Pigment {
  const { settings, palette } = scene;
  const { eye, x, n, y, aboveUpper, belowLower, mottle } = place;
  const { broad, patchy, fine, grainy } = mottle;
  const { innerCorner, outerCorner } = eye.lids;
  const onUpperLid =
    Math.exp(-(((n + 0.4) / 15) ** 4)) * (y < place.upperY + 1 ? Math.exp(-((Math.max(0, aboveUpper) / 6.0) ** 2)) : 0);
  const onLowerLid =
    Math.exp(-(((n + 0.2) / 14.5) ** 4)) *
    (y > place.lowerY - 1 ? Math.exp(-((Math.max(0, belowLower) / 4.6) ** 2)) : 0);
  const atInner = hill(n - innerCorner.n - 0.6, 3.6, y - innerCorner.y, 3.4);
  const atOuter = hill(n - outerCorner.n + 1.0, 3.0, y - outerCorner.y - 0.5, 2.4);
  const underEye =
    smoothStep(0.8, 3.6, belowLower) * (1 - smoothStep(5.0, 13 + 3 * broad, belowLower)) * bell(n - 4.5, 8.8);
  const socket = hill(n - 13, 6.0, y + 8, 5.5);
  const cheek = smoothStep(8, 24, y) * hill(Math.abs(x) - 37, 18, 0, 1);
  const nose = hill(x, 9, 0, 1) * smoothStep(0, 22, y);

  let blood =
    0.2 * onUpperLid +
    0.22 * onLowerLid +
    0.26 * atInner +
    0.24 * atOuter +
    0.24 * cheek +
    0.16 * nose +
    0.1 * socket +
    0.12 * underEye;
  blood = blood * (1 + 0.45 * patchy) + 0.1 * broad + 0.12 * patchy + 0.08 * fine + 0.04 * grainy;
  let melanin =
    0.12 * onUpperLid +
    0.06 * onLowerLid +
    (0.11 + 0.22 * settings.age) * underEye +
    0.2 * socket +
    0.1 * atInner +
    0.12 * atOuter;
  melanin = melanin * (1 + 0.4 * patchy) + 0.05 * broad + 0.06 * patchy + 0.04 * fine + 0.02 * grainy;
  if (settings.freckles > 0) {
    const onFace = Math.max(cheek, nose, hill(x, 16, y - 6, 16));
    melanin += frecklesAt(scene, place, Math.max(onUpperLid, onLowerLid), onFace);
  }
  blood += 0.3 * lidVesselsAt(scene, place, Math.max(onUpperLid, onLowerLid));
  const brow = browShadeAt(scene, place);
  blood *= palette.blood;
  melanin = melanin * palette.pigment + (0.3 + 0.55 * palette.depth) * brow;
  const base = scene.skinColour;
  const colour: Rgb = [
    base[0] * Math.exp(BLOOD[0] * blood + MELANIN[0] * melanin),
    base[1] * Math.exp(BLOOD[1] * blood + MELANIN[1] * melanin),
    base[2] * Math.exp(BLOOD[2] * blood + MELANIN[2] * melanin),
  ];
  return { colour, brow };
}

function frecklesAt(scene: Scene, { u, v }: SkinPlace, onLids: number, onFace: number): number {
  const [first, second, third] = scene.noise;
  const where =
    (0.35 + smoothStep(-0.3, 0.35, second.plane(u * 0.07, v * 0.07))) * (1 - 0.8 * onLids) * (0.5 + 0.5 * onFace);
  const spots = (perMm: number, radius: number, offset: number) => {
    const { nearest } = first.cells(u * perMm + offset + 0.22 * third.plane(u * 1.3, v * 1.3), v * perMm - offset);
    const chance =
      third.plane(Math.round(u * perMm) * 3.7, Math.round(v * perMm) * 3.1 + offset) +
      0.25 * second.plane(u * 0.4, v * 0.4);
    return smoothStep(radius, radius * 0.25, nearest) * smoothStep(-0.15, 0.35, chance);
  };
  return scene.settings.freckles * where * (0.62 * spots(0.5, 0.26, 3) + 0.45 * spots(0.95, 0.24, 11));
}

/** A few small vessels show through thin fair lids. */
function lidVesselsAt(scene: Scene, { x, y, mottle }: SkinPlace, onLids: number): number {
  const [first, , third] = scene.noise;
  const line = third.plane(x * 0.3 + 0.9 * first.plane(x * 0.25, y * 0.25), y * 0.3);
  return bell(line, 0.016) * onLids * smoothStep(-0.1, 0.35, mottle.broad + 0.15);
}

function browShadeAt(scene: Scene, { eye, n, y, mottle }: SkinPlace): number {
  const height = lerp(3.6, 1.3, smoothStep(-4, -28, n));
  return (
    scene.settings.brow *
    Math.exp(-(((y - eye.browY(n)) / height) ** 2)) *
    smoothStep(18.5, 12, n) *
    smoothStep(-28, -20, n) *
    (0.8 + 0.5 * mottle.fine)
  );
}
