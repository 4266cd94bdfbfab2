import type { Canvas } from "./canvas";
import { mixRgb, type Rgb } from "./colour";
import { drawHair } from "./hair-stroke";
import type { Point } from "./sampled-curve";
import type { Scene, SceneEye } from "./scene";
import { clamp, lerp, smoothStep } from "./shaping";

/** Root, bend and tip in the frame of the eye, mm; full widths in mm; how much each end covers. */
type Hair = {
  path: readonly [Point, Point, Point];
  widthsMm: readonly [root: number, tip: number];
  cover: readonly [root: number, tip: number];
  colour: Rgb;
};
type Pen = (hair: Hair) => void;

/*
 * Each hair asks the eye's random stream for its numbers in the order of its lines, so a line moved changes the face.
 */

/** Brows and lashes of one eye. */
export function growHair(scene: Scene, eye: SceneEye, canvas: Canvas): void {
  const { pxPerMm } = scene;
  const place = ([n, y]: Point) => scene.toPixel(eye.centreX + eye.towardsNose * n, y);
  const pen: Pen = ({ path, widthsMm, cover, colour }) =>
    drawHair(canvas, {
      path: [place(path[0]), place(path[1]), place(path[2])],
      rootWidth: (widthsMm[0] * pxPerMm) / 2,
      tipWidth: (widthsMm[1] * pxPerMm) / 2,
      rootCover: cover[0],
      tipCover: cover[1],
      colour,
    });
  if (scene.settings.brow > 0) growBrow(scene, eye, pen);
  growLowerLashes(scene, eye, pen);
  growUpperLashes(scene, eye, pen);
  growLashLine(scene, eye, pen);
}

/** Many fine hairs, upright at the inner end, then sweeping outwards; two layers meet in the middle. */
function growBrow(scene: Scene, eye: SceneEye, pen: Pen): void {
  const { random } = eye;
  const { brow, browWeight } = scene.settings;
  const count = Math.round(1750 * brow * browWeight);
  for (let i = 0; i < count; i++) {
    const n = lerp(18.5, -28, random.next() ** 0.95);
    const thickness = lerp(3.9, 0.9, smoothStep(-4, -28, n));
    const half = browWeight * thickness * (0.8 + 0.25 * smoothStep(18, 11, n));
    const across = clamp(random.bell() * 0.46, -1.15, 1.15);
    const rootY = eye.browY(n) + across * half + 0.5;
    const upright = smoothStep(2, 18, n);
    const length = random.range(3.2, 6.4) * lerp(1, 0.78, upright) * lerp(1, 0.75, smoothStep(-14, -28, n));
    // Lower hairs lie up and out, upper hairs down and out.
    const lie = across > 0 ? 0.3 : -0.2;
    const angle = lerp(lerp(lie, -0.22, smoothStep(-6, -27, n)), 1.22, upright) + random.bell() * 0.12;
    const dn = -Math.cos(angle) * length;
    const dy = -Math.sin(angle) * length;
    const bend = random.range(-0.1, 0.55) * (0.3 + upright);
    const density = smoothStep(19, 10, n) * smoothStep(-29, -20, n) * (1 - 0.55 * Math.abs(across));
    const rootWidth = random.range(0.06, 0.115);
    const strength = Math.min(0.95, random.range(0.3, 0.8) * (1 + 0.35 * scene.palette.depth));
    pen({
      path: [
        [n, rootY],
        [n + dn * 0.48 + bend * 0.5, rootY + dy * 0.55 - bend * 0.3],
        [n + dn, rootY + dy + bend * 0.4],
      ],
      widthsMm: [rootWidth, 0.02],
      cover: [strength * (0.3 + 0.7 * density), 0.05],
      colour: scene.hairColour,
    });
  }
}

function growLowerLashes(scene: Scene, eye: SceneEye, pen: Pen): void {
  const { random, lids } = eye;
  const colour = mixRgb(scene.lashColour, scene.hairColour, 0.25);
  const count = Math.round(70 * scene.settings.lash);
  for (let i = 0; i < count; i++) {
    const n = lerp(-13.0, 9.8, (i + random.range(-0.6, 0.6)) / count);
    const border = 0.35 + 0.85 * smoothStep(lids.outerCorner.n, lids.outerCorner.n + 2.8, n);
    const rootY = lids.lower.at(n) + border + random.range(-0.12, 0.28);
    const fullLength = random.range(1.4, 3.4) * (0.72 + 0.45 * smoothStep(4, -12, n));
    const length = fullLength * (random.next() < 0.25 ? 0.6 : 1);
    const clump = Math.sin(i * 0.95 + eye.centreX) + 0.5 * Math.sin(i * 2.3);
    const fan = lerp(-0.95, 0.35, smoothStep(-13, 9, n)) + clump * 0.16 + random.bell() * 0.14;
    const drop = random.range(0.78, 0.96);
    pen({
      path: [
        [n, rootY],
        [n + fan * length * 0.18, rootY + length * 0.6],
        [n + fan * length * 0.95, rootY + length * drop],
      ],
      widthsMm: [random.range(0.06, 0.1), 0.015],
      cover: [random.range(0.35, 0.75), 0.25],
      colour,
    });
  }
}

/** They bow down a little over the eye, then curl up in front of the lid, in loose tufts. */
function growUpperLashes(scene: Scene, eye: SceneEye, pen: Pen): void {
  const { random, lids } = eye;
  const { lash } = scene.settings;
  const tufts = Math.round(36 * (0.8 + 0.2 * lash));
  for (let tuft = 0; tuft < tufts; tuft++) {
    const middle = lerp(-14.0, 11.6, (tuft + random.range(0.1, 0.9)) / tufts);
    const outer = smoothStep(1, -13, middle);
    const inner = smoothStep(3, 12, middle);
    const tuftLength = random.range(4.8, 7.0) * (0.72 + 0.42 * outer - 0.3 * inner) * (0.6 + 0.4 * lash);
    const tuftFan = lerp(lerp(0.0, -1.05, outer), 0.62, inner) + random.bell() * 0.14;
    const count = 3 + Math.floor(random.next() * 4 * lash);
    for (let i = 0; i < count; i++) {
      const n = middle + random.range(-0.62, 0.62);
      const rootY = lids.upper.at(n) - 0.4 + random.range(-0.26, 0.16);
      const length = tuftLength * (random.next() < 0.25 ? random.range(0.4, 0.65) : random.range(0.8, 1.08));
      const fan = tuftFan - (n - middle) * 0.22 + random.bell() * 0.07;
      const sag = random.range(0.05, 0.55) * (1 - 0.3 * outer) + 1.4 * clamp(1 - lids.opening);
      const lift = random.range(0.56, 0.7);
      pen({
        path: [
          [n, rootY],
          [n + fan * length * 0.46, rootY + sag],
          [n + fan * length * 0.92, rootY - length * lift * (1 - 0.3 * outer) * lerp(-0.55, 1, clamp(lids.opening))],
        ],
        widthsMm: [random.range(0.1, 0.155), 0.012],
        cover: [random.range(0.75, 0.97), 0.45],
        colour: scene.lashColour,
      });
    }
  }
}

/** A close row of short ones makes the lash line. */
function growLashLine(scene: Scene, eye: SceneEye, pen: Pen): void {
  const { random, lids } = eye;
  for (let i = 0; i < 120; i++) {
    const n = lerp(-14.1, 12, (i + random.next()) / 120);
    const rootY = lids.upper.at(n) - 0.36 + random.range(-0.22, 0.12);
    const fan = lerp(-0.9, 0.6, smoothStep(-13, 12, n)) + random.bell() * 0.2;
    const length = random.range(0.7, 1.6);
    pen({
      path: [
        [n, rootY],
        [n + fan * length * 0.5, rootY + 0.15],
        [n + fan * length, rootY - length * 0.35],
      ],
      widthsMm: [0.1, 0.03],
      cover: [random.range(0.4, 0.75), 0.2],
      colour: scene.lashColour,
    });
  }
}
