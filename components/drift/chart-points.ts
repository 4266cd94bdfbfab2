import type { DriftBoard, DriftChart } from "@/lib/drift/schema";
import { formatSigned } from "@/lib/format/numbers";

/** A chart's points with the names and dates of their rounds, as the drawing takes them. */
export function chartPoints(chart: DriftChart, rounds: DriftBoard["rounds"]) {
  return chart.points.flatMap((point) => {
    const round = rounds.find(({ id }) => id === point.roundId);
    if (!round) return [];
    const { n, state, reason, value } = point;
    const { lowerWarning, upperWarning, lowerAction, upperAction } = point;
    const limits = { lowerWarning, upperWarning, lowerAction, upperAction };
    const interval = value && { value: value.estimate, low: value.low, high: value.high };
    return [
      { id: point.roundId, label: `R${round.number}`, at: round.closedAt, n, state, reason, ...interval, ...limits },
    ];
  });
}

/** Limits of agreement round by round, as text for the table beside a chart of bias. */
export function limitsText({ lower, upper }: DriftChart["points"][number]): string {
  return lower && upper ? `${formatSigned(lower.estimate)} to ${formatSigned(upper.estimate)}°` : "–";
}
