/** One level stretch of a limit line, in px along x and data units along y. */
export type Stretch = { from: number; to: number; value: number };

/**
 * A limit that may differ from point to point, as level stretches. Each point's limit holds half way to its neighbours,
 * and to the edges of the plot at the ends; equal neighbours join; a point without a limit leaves a gap.
 * `xs` are the places of the points in px, in rising order, paired with `limits`.
 */
export function steppedLimits(
  xs: readonly number[],
  limits: readonly (number | undefined)[],
  from: number,
  to: number,
): Stretch[] {
  const bounds = columnBounds(xs, from, to);
  const stretches: Stretch[] = [];
  limits.forEach((value, i) => {
    const bound = bounds[i];
    if (value === undefined || !bound) return;
    const last = stretches.at(-1);
    if (last && last.to === bound.from && last.value === value) last.to = bound.to;
    else stretches.push({ ...bound, value });
  });
  return stretches;
}

/** The column of the plot that belongs to each point: half way to its neighbours. */
export function columnBounds(xs: readonly number[], from: number, to: number): { from: number; to: number }[] {
  return xs.map((x, i) => {
    const [before, after] = [xs[i - 1], xs[i + 1]];
    return { from: before === undefined ? from : (before + x) / 2, to: after === undefined ? to : (x + after) / 2 };
  });
}

/** SVG path of level stretches; neighbours that meet are joined by an upright, so that a step reads as one line. */
export function steppedPath(stretches: readonly Stretch[], y: (value: number) => number): string {
  let path = "";
  let end: number | null = null;
  for (const { from, to, value } of stretches) {
    const at = y(value).toFixed(1);
    path += end === from ? `V${at}H${to.toFixed(1)}` : `M${from.toFixed(1)} ${at}H${to.toFixed(1)}`;
    end = to;
  }
  return path;
}
