import type { Canvas, PixelPoint } from "./canvas";
import type { Rgb } from "./colour";
import { clamp, lerp } from "./shaping";

export type HairStroke = {
  /** Root, bend and tip of a quadratic curve, px. */
  path: readonly [PixelPoint, PixelPoint, PixelPoint];
  /** Half widths in px, and how much each end covers. */
  rootWidth: number;
  tipWidth: number;
  rootCover: number;
  tipCover: number;
  colour: Rgb;
};

type Station = { x: number; y: number; width: number; cover: number };

/** Draws one tapered hair with a round brush. Its parts are merged first, so that overlaps do not darken it. */
export function drawHair(canvas: Canvas, stroke: HairStroke): void {
  const stations = placeStations(stroke);
  const box = boundingBox(canvas, stations);
  if (box.right < box.left || box.bottom < box.top) return;
  const columns = box.right - box.left + 1;
  const cover = new Float32Array(columns * (box.bottom - box.top + 1));
  let from: Station | undefined;
  for (const to of stations) {
    if (from) coverSegment(cover, box, columns, from, to);
    from = to;
  }
  const { light } = canvas;
  for (let y = box.top; y <= box.bottom; y++) {
    for (let x = box.left; x <= box.right; x++) {
      const share = cover[(y - box.top) * columns + x - box.left] ?? 0;
      if (share <= 0) continue;
      const offset = (y * canvas.width + x) * 3;
      light[offset] = lerp(light[offset] ?? 0, stroke.colour[0], share);
      light[offset + 1] = lerp(light[offset + 1] ?? 0, stroke.colour[1], share);
      light[offset + 2] = lerp(light[offset + 2] ?? 0, stroke.colour[2], share);
    }
  }
}

function placeStations(stroke: HairStroke): Station[] {
  const [root, bend, tip] = stroke.path;
  const length = Math.hypot(bend[0] - root[0], bend[1] - root[1]) + Math.hypot(tip[0] - bend[0], tip[1] - bend[1]);
  const count = Math.max(6, Math.min(48, Math.ceil(length / 3)));
  return Array.from({ length: count + 1 }, (_, i) => {
    const t = i / count;
    const u = 1 - t;
    return {
      x: u * u * root[0] + 2 * u * t * bend[0] + t * t * tip[0],
      y: u * u * root[1] + 2 * u * t * bend[1] + t * t * tip[1],
      width: lerp(stroke.rootWidth, stroke.tipWidth, t ** 1.25),
      cover: lerp(stroke.rootCover, stroke.tipCover, t),
    };
  });
}

type Box = { left: number; right: number; top: number; bottom: number };

function boundingBox(canvas: Canvas, stations: readonly Station[]): Box {
  const edge = (pick: (station: Station) => number, choose: (...values: number[]) => number) =>
    choose(...stations.map(pick));
  return {
    left: Math.max(0, Math.floor(edge((s) => s.x - s.width - 1, Math.min))),
    right: Math.min(canvas.width - 1, Math.ceil(edge((s) => s.x + s.width + 1, Math.max))),
    top: Math.max(0, Math.floor(edge((s) => s.y - s.width - 1, Math.min))),
    bottom: Math.min(canvas.height - 1, Math.ceil(edge((s) => s.y + s.width + 1, Math.max))),
  };
}

function coverSegment(cover: Float32Array, box: Box, columns: number, from: Station, to: Station): void {
  const dx = to.x - from.x;
  const dy = to.y - from.y;
  const squared = dx * dx + dy * dy || 1e-9;
  const reach = Math.max(from.width, to.width) + 1;
  const left = Math.max(box.left, Math.floor(Math.min(from.x, to.x) - reach));
  const right = Math.min(box.right, Math.ceil(Math.max(from.x, to.x) + reach));
  const top = Math.max(box.top, Math.floor(Math.min(from.y, to.y) - reach));
  const bottom = Math.min(box.bottom, Math.ceil(Math.max(from.y, to.y) + reach));
  for (let y = top; y <= bottom; y++) {
    for (let x = left; x <= right; x++) {
      const t = clamp(((x - from.x) * dx + (y - from.y) * dy) / squared);
      const distance = Math.hypot(x - from.x - dx * t, y - from.y - dy * t);
      const width = lerp(from.width, to.width, t);
      const share = lerp(from.cover, to.cover, t) * clamp(width - distance + 0.5) * Math.min(1, width * 2);
      const i = (y - box.top) * columns + x - box.left;
      if (share > (cover[i] ?? 0)) cover[i] = share;
    }
  }
}
