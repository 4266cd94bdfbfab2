/** An axis in data units: its two ends and the values that get a labelled tick. */
export type AxisRange = { low: number; high: number; ticks: number[] };

/**
 * The kappa axis. It runs from 0.2 to 1, and starts lower, in steps of 0.2, when a value would sit on or under its end.
 * Interval ends do not count: they are clipped with an arrow, so that one wide interval does not flatten the rest.
 */
export function kappaAxis(values: readonly number[]): AxisRange {
  const lowest = Math.min(1, ...values);
  const stepsDown = Math.max(0, Math.ceil((0.2 - (lowest - 0.03)) / 0.2 - 1e-9));
  const low = tidy(0.2 - 0.2 * stepsDown);
  return { low, high: 1, ticks: multiplesBetween(low, 1, 0.2) };
}

type Padding = {
  /** Candidate distances between ticks, smallest first; the first that gives few enough ticks is taken. */
  steps: readonly number[];
  tickCountMax: number;
  /** Room beyond the outermost value, as a share of their spread. */
  padShare?: number;
  /** A bound of the scale itself, such as 1 for kappa: no room is added beyond it. */
  highest?: number;
};

/** An axis that holds every value with a little room at both ends, and round ticks. */
export function paddedAxis(
  values: readonly number[],
  { steps, tickCountMax, padShare = 0.08, highest }: Padding,
): AxisRange {
  const smallestStep = steps[0] ?? 1;
  const min = values.length > 0 ? Math.min(...values) : 0;
  const max = values.length > 0 ? Math.max(...values) : smallestStep;
  const pad = Math.max((max - min) * padShare, smallestStep / 2);
  const low = min - pad;
  const high = highest !== undefined && max <= highest ? Math.min(highest, max + pad) : max + pad;
  const step = steps.find((s) => multiplesBetween(low, high, s).length <= tickCountMax) ?? high - low;
  return { low, high, ticks: multiplesBetween(low, high, step) };
}

/** Every multiple of `step` from low to high, both ends included, free of binary dust such as 0.30000000000000004. */
export function multiplesBetween(low: number, high: number, step: number): number[] {
  const first = Math.ceil(low / step - 1e-9);
  const last = Math.floor(high / step + 1e-9);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, i) => tidy((first + i) * step));
}

function tidy(value: number): number {
  const rounded = Number(value.toFixed(6));
  return rounded === 0 ? 0 : rounded;
}
