const STEPS = [1, 2, 5, 6, 8, 10, 12, 15, 20, 25, 50];
const LABELS_MAX = 5;

/**
 * Which positions of 1 to `count` carry their number: the first, the last, and round steps between.
 * A step that divides the count is preferred, so that the last label closes an even scale.
 */
export function progressLabels(count: number): number[] {
  const fitting = STEPS.filter((step) => count / step <= LABELS_MAX);
  const even = fitting.find((step) => count % step === 0 && count / step >= 3);
  const step = even ?? fitting[0] ?? Math.ceil(count / LABELS_MAX);
  const inner = Array.from({ length: Math.floor(count / step) }, (_, index) => (index + 1) * step);
  // A number too close to either end would run into the label there.
  const spaced = inner.filter((position) => position - 1 >= step / 2 && count - position >= step / 2);
  return [...new Set([1, ...spaced, count])].filter((position) => position <= count);
}
