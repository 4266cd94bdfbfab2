import { type Canvas, createCanvas, setPixel } from "./canvas";
import { mixRgb, type Rgb } from "./colour";
import { paintGlobe } from "./globe";
import { growHair } from "./hair";
import { takePhotograph } from "./lens-and-grain";
import { paintLidBorders } from "./lid-border";
import { completeParameters, type PhotographParameters } from "./parameters";
import { type Relief, raiseRelief } from "./relief";
import { type Scene, type SceneEye, setScene } from "./scene";
import { clamp } from "./shaping";
import { paintSkin } from "./skin";
import { findTruthInPixels, type PhotographTruth } from "./truth-in-pixels";

export type DrawnPhotograph = {
  width: number;
  height: number;
  /** RGB bytes, row by row. */
  data: Uint8Array<ArrayBuffer>;
  truth: PhotographTruth;
};

/**
 * Draws a pair of eyes as in a flash photograph, point by point: skin as a lit relief, an eye turned about its centre,
 * hair as strokes, lens and grain at the end. The same parameters give the same bytes.
 *
 * Takes tens of seconds at full size; use `renderPhotograph` wherever anything else must go on meanwhile.
 */
export function drawPhotograph(parameters: PhotographParameters): DrawnPhotograph {
  const settings = completeParameters(parameters);
  const scene = setScene(settings);
  const relief = raiseRelief(scene);
  const canvas = createCanvas(scene.width, scene.height);
  paintFace(scene, relief, canvas);
  growHair(scene, scene.eyes.right, canvas);
  growHair(scene, scene.eyes.left, canvas);
  return {
    width: settings.width,
    height: settings.height,
    data: takePhotograph(canvas, settings, scene.palette.depth),
    truth: findTruthInPixels(parameters),
  };
}

function paintFace(scene: Scene, relief: Relief, canvas: Canvas): void {
  for (let py = 0; py < scene.height; py++) {
    for (let px = 0; px < scene.width; px++) {
      const { x, y } = scene.toFace(px + 0.5, py + 0.5);
      setPixel(canvas, px, py, paintPoint(scene, relief, py * relief.columns + px, x, y));
    }
  }
}

function paintPoint(scene: Scene, relief: Relief, reliefIndex: number, x: number, y: number): Rgb {
  const eye = scene.eyeAt(x);
  const n = eye.towardsNose * (x - eye.centreX);
  const open = opennessAt(scene, eye, n, y);
  if (open >= 1) return paintGlobe(scene, eye, n, y);
  const bare = paintSkin(scene, relief, reliefIndex, eye, { x, n, y });
  const skin = paintLidBorders(scene, eye, n, y, bare);
  return open > 0 ? mixRgb(skin, paintGlobe(scene, eye, n, y), open) : skin;
}

/** 1 between the lids, 0 on them, and between the two on the edge. */
function opennessAt(scene: Scene, eye: SceneEye, n: number, y: number): number {
  const { upper, lower, innerCorner, outerCorner } = eye.lids;
  if (n <= outerCorner.n || n >= innerCorner.n || y <= -8 || y >= 8) return 0;
  const pixelMm = 1 / scene.pxPerMm;
  const belowUpper = (y - upper.at(n)) / Math.sqrt(1 + upper.slope(n) ** 2);
  const aboveLower = (lower.at(n) - y) / Math.sqrt(1 + lower.slope(n) ** 2);
  return shareInside(belowUpper, pixelMm) * shareInside(aboveLower, pixelMm);
}

/** How much of a pixel lies inside an edge that is so far away. */
function shareInside(mm: number, pixelMm: number): number {
  return clamp(0.5 + mm / (1.6 * pixelMm));
}
