import { formatNumber, formatSigned, formatSignedInterval } from "@/lib/format/numbers";
import { type AxisRange, multiplesBetween, paddedAxis } from "./axis-range";
import type { DifferencePoint, MergedPoint } from "./merge-points";
import type { Tip } from "./point-tip";
import type { Interval } from "./types";

/** The mean difference and the two limits, each with its interval; all or none of them are there. */
export type Agreement = { bias: Interval; lower: Interval; upper: Interval };
export type LeftOut = { label: string; count: number };

const intervalEnds = ({ estimate, low, high }: Interval) => [estimate, low ?? estimate, high ?? estimate];

/** The difference axis holds zero, every reading and the bands of the limits. */
export function differenceAxis(points: readonly DifferencePoint[], agreement: Agreement | null): AxisRange {
  const bands = agreement ? [agreement.lower, agreement.bias, agreement.upper].flatMap(intervalEnds) : [];
  const values = [0, -5, 5, ...points.map((point) => point.difference), ...bands];
  return paddedAxis(values, { steps: [5, 10, 20, 40], tickCountMax: 7, padShare: 0.05 });
}

/** The mean axis has its ticks at the landmarks, 15 degrees apart, and ends a little beyond the outermost reading. */
export function meanAxis(points: readonly DifferencePoint[]): AxisRange {
  const means = points.map((point) => point.mean);
  const smallest = Math.min(0, ...means);
  const low = smallest < 0 ? Math.floor((smallest - 3) / 5) * 5 : 0;
  const high = Math.ceil((Math.max(15, ...means) + 3) / 5) * 5;
  return { low, high, ticks: multiplesBetween(low, high, high - low > 120 ? 30 : 15) };
}

export function isOutside({ difference }: { difference: number }, agreement: Agreement | null): boolean {
  return agreement !== null && (difference > agreement.upper.estimate || difference < agreement.lower.estimate);
}

const LABELS_SHOWN = 4;

/** Readings are whole degrees, so their mean may end in a half; nothing finer is ever there to show. */
const digitsOf = (value: number) => (Number.isInteger(value) ? 0 : 1);

export function pointTip(point: MergedPoint, unit: string, agreement: Agreement | null): Tip {
  const lines = [`at a mean of ${formatNumber(point.mean, digitsOf(point.mean))}${unit}`];
  if (point.count > 1) lines.push(`${point.count} readings`);
  if (isOutside(point, agreement)) lines.push("outside the limits");
  lines.push(...point.labels.slice(0, LABELS_SHOWN));
  if (point.labels.length > LABELS_SHOWN) lines.push(`and ${point.labels.length - LABELS_SHOWN} more`);
  return { title: `${formatSigned(point.difference, digitsOf(point.difference))}${unit}`, lines };
}

/** One sentence for the whole figure, for those who do not see it. */
export function describeAgreement(
  points: readonly DifferencePoint[],
  agreement: Agreement | null,
  unit: string,
): string {
  const what = `Differences against means of ${points.length} ${points.length === 1 ? "reading" : "readings"}.`;
  if (!agreement) return what;
  const { bias, lower, upper } = agreement;
  const limits = formatSignedInterval(lower.estimate, upper.estimate);
  const outside = points.filter((point) => isOutside(point, agreement)).length;
  return `${what} Mean difference ${formatSigned(bias.estimate)}${unit}, limits of agreement ${limits}${unit}; ${outside} outside.`;
}

/** What was not drawn, and how often: a figure never hides how many pairs it leaves out. */
export function describeLeftOut(leftOut: readonly LeftOut[]): string | null {
  const some = leftOut.filter(({ count }) => count > 0);
  return some.length === 0 ? null : `Left out: ${some.map(({ label, count }) => `${count} ${label}`).join(", ")}.`;
}
