import type { Scene } from "./scene";
import { bell, smoothStep } from "./shaping";

/** The skin is drawn on axes turned against the face, so that no pattern runs level. */
export function acrossSkin(x: number, y: number): readonly [u: number, v: number] {
  return [x * 0.82 + y * 0.57, -x * 0.57 + y * 0.82];
}

/** Fine relief in mm. Skin is a net of furrows: nearly even on the cheek, drawn out into lines on the lids. */
export function createSkinTexture(scene: Scene): (x: number, n: number, y: number) => number {
  const { age } = scene.settings;
  const { depth } = scene.palette;
  const [first, second, third] = scene.noise;

  return (x, n, y) => {
    const onLid = Math.exp(-(((n + 0.5) / 14) ** 4) - ((y + 0.5) / 9.5) ** 4);
    const [u, v] = acrossSkin(x, y);
    const coarse = first.cells(u * 1.7 + 0.5 * second.plane(u, v), v * 1.7);
    const net = smoothStep(0.0, 0.32, coarse.second - coarse.nearest);
    const fine = third.cells(v * 3.1 + 9, u * 3.1);
    const fineNet = smoothStep(0, 0.35, fine.second - fine.nearest);
    const pores = -smoothStep(0.26, 0.06, coarse.nearest) * smoothStep(0, 0.3, second.plane(u * 0.4, v * 0.4) + 0.2);
    const bend = 2.2 * second.plane(x * 0.1, y * 0.16);
    const line = first.cells(x * 0.5 + bend * 0.3, (y + bend) * 2.0);
    const lines = smoothStep(0, 0.4, line.second - line.nearest);
    const fineLine = third.cells(x * 1.1 + 3, (y + bend * 0.7) * 3.4);
    const fineLines = smoothStep(0, 0.4, fineLine.second - fineLine.nearest);
    const crowsFeet =
      n < -15
        ? bell(second.plane(x * 0.1, y * 0.55 - n * 0.02), 0.08) * smoothStep(-15.5, -21, n) * bell(y - 1.5, 6)
        : 0;
    const waves = first.octaves(u * 0.55, v * 0.55, 3);
    return (
      (1 - 0.35 * depth) * onLid * (0.01 + 0.024 * age) * (lines + 0.7 * fineLines) +
      (1 - 0.4 * depth) * (1 - 0.72 * onLid) * (0.011 + 0.013 * age) * (net * 0.8 + fineNet * 0.5 + 1.3 * pores) +
      0.055 * (1 - 0.5 * onLid) * waves -
      0.09 * Math.max(0, age - 0.2) * crowsFeet
    );
  };
}
