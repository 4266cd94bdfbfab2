export function clamp(x: number, low = 0, high = 1): number {
  return x < low ? low : Math.min(x, high);
}

/** 0 at `from`, 1 at `to` (which may lie below `from`), with level ends. */
export function smoothStep(from: number, to: number, x: number): number {
  const t = clamp((x - from) / (to - from));
  return t * t * (3 - 2 * t);
}

export function lerp(from: number, to: number, t: number): number {
  return from + (to - from) * t;
}

/** e to the −x. Most hills and bells are far away from most pixels: what is lost in rounding need not be computed. */
function decay(x: number): number {
  return x > 40 ? 0 : Math.exp(-x);
}

/** A bell of height 1 about 0. */
export function bell(x: number, spread: number): number {
  return decay((x * x) / (2 * spread * spread));
}

/** A round hill of height 1 over the plane, with its own width along each axis. */
export function hill(dx: number, widthX: number, dy: number, widthY: number): number {
  return decay((dx / widthX) ** 2 + (dy / widthY) ** 2);
}

/** The value on the straight lines between knots that rise in x; level before the first and after the last. */
export function followKnots(knots: readonly (readonly [x: number, y: number])[], x: number): number {
  let before: readonly [number, number] | undefined;
  for (const knot of knots) {
    if (x <= knot[0]) {
      if (!before) return knot[1];
      return before[1] + ((x - before[0]) / (knot[0] - before[0])) * (knot[1] - before[1]);
    }
    before = knot;
  }
  return before ? before[1] : 0;
}
