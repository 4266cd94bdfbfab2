import { clamp } from "./shaping";

export type Point = readonly [x: number, y: number];

export type SampledCurve = { at(x: number): number; slope(x: number): number };

type Knot = { x: number; y: number; slope: number };

/** A smooth curve through points that rise in x, kept as a table because it is asked for at every pixel. */
export function sampleCurve(points: readonly Point[], from: number, to: number, step = 0.02): SampledCurve {
  const knots = points.map((point, i) => withSlope(point, points[i - 1], points[i + 1]));
  const count = Math.ceil((to - from) / step) + 2;
  const table = Float64Array.from({ length: count }, (_, i) => followCubics(knots, from + i * step));
  const at = (x: number) => {
    const place = clamp((x - from) / step, 0, count - 1.001);
    const i = place | 0;
    const left = table[i] ?? 0;
    const right = table[i + 1] ?? 0;
    return left + (right - left) * (place - i);
  };
  return { at, slope: (x) => (at(x + 0.05) - at(x - 0.05)) / 0.1 };
}

function withSlope(point: Point, before: Point | undefined, after: Point | undefined): Knot {
  const [x, y] = point;
  if (before && after) {
    const width = x - before[0];
    const nextWidth = after[0] - x;
    const slope = (rise(before, point) * nextWidth + rise(point, after) * width) / (width + nextWidth);
    return { x, y, slope };
  }
  return { x, y, slope: before ? rise(before, point) : after ? rise(point, after) : 0 };
}

function rise(from: Point, to: Point): number {
  return (to[1] - from[1]) / (to[0] - from[0]);
}

/** Hermite cubics between the knots, straight beyond the ends. */
function followCubics(knots: readonly Knot[], x: number): number {
  let before: Knot | undefined;
  for (const knot of knots) {
    if (!before && x <= knot.x) return knot.y + knot.slope * (x - knot.x);
    if (before && x <= knot.x) return cubic(before, knot, x);
    before = knot;
  }
  return before ? before.y + before.slope * (x - before.x) : 0;
}

function cubic(from: Knot, to: Knot, x: number): number {
  const h = to.x - from.x;
  const t = (x - from.x) / h;
  const t2 = t * t;
  const t3 = t2 * t;
  return (
    (2 * t3 - 3 * t2 + 1) * from.y +
    (t3 - 2 * t2 + t) * h * from.slope +
    (-2 * t3 + 3 * t2) * to.y +
    (t3 - t2) * h * to.slope
  );
}
