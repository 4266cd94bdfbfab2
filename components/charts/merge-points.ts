export type DifferencePoint = { id: string; mean: number; difference: number; label?: string };
export type MergedPoint = { id: string; mean: number; difference: number; count: number; labels: string[] };

/**
 * Readings that fall on the same spot become one point that counts them: drawn over each other, ten readings would look
 * like one. Two are the same when both coordinates agree to a twentieth of a degree. Order of first appearance.
 */
export function mergePoints(points: readonly DifferencePoint[]): MergedPoint[] {
  const merged = new Map<string, MergedPoint>();
  for (const { id, mean, difference, label } of points) {
    const spot = `${Math.round(mean * 20)},${Math.round(difference * 20)}`;
    const found = merged.get(spot);
    if (found) {
      found.count += 1;
      if (label !== undefined) found.labels.push(label);
    } else {
      merged.set(spot, { id, mean, difference, count: 1, labels: label === undefined ? [] : [label] });
    }
  }
  return [...merged.values()];
}

/** Radius in px for a spot of `count` readings, so that area counts; the fullest spot is never larger than 16 px. */
export function spotRadiusPx(count: number, countMax: number): number {
  const one = Math.min(3.6, 16 / Math.sqrt(Math.max(1, countMax)));
  return one * Math.sqrt(count);
}

type HistogramBin = { centre: number; count: number };

/** Differences counted in bins of equal width, one of them centred on zero; empty bins are left out. */
export function binDifferences(differences: readonly number[], widthOfBin: number): HistogramBin[] {
  const counts = new Map<number, number>();
  for (const difference of differences) {
    const bin = Math.round(difference / widthOfBin);
    counts.set(bin, (counts.get(bin) ?? 0) + 1);
  }
  return [...counts].map(([bin, count]) => ({ centre: bin * widthOfBin, count })).sort((a, b) => a.centre - b.centre);
}
