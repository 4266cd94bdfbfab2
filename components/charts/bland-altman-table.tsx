import { formatNumber, formatSigned, formatSignedInterval } from "@/lib/format/numbers";
import { isOutside, type LeftOut } from "./bland-altman";
import { ChartTable } from "./chart-table";
import type { DifferencePoint } from "./merge-points";
import type { Interval } from "./types";

type BlandAltmanTableProps = {
  points: DifferencePoint[];
  bias?: Interval;
  lower?: Interval;
  upper?: Interval;
  unit: "°";
  xLabel: string;
  yLabel: string;
  leftOut?: LeftOut[];
};

/** The same figures as BlandAltmanPlot: the mean and the limits, what was left out, then every reading. */
export function BlandAltmanTable({
  points,
  bias,
  lower,
  upper,
  unit,
  xLabel,
  yLabel,
  leftOut = [],
}: BlandAltmanTableProps) {
  const agreement = bias && lower && upper ? { bias, lower, upper } : null;
  const figures = [
    { id: "upper", name: "Upper limit", interval: upper },
    { id: "bias", name: "Mean difference", interval: bias },
    { id: "lower", name: "Lower limit", interval: lower },
  ].flatMap(({ id, name, interval }) => (interval ? [{ id, cells: [name, ...intervalCells(interval, unit)] }] : []));
  const counts = leftOut.map(({ label, count }) => ({ id: label, cells: [label, String(count)] }));
  const readings = points.map((point, i) => ({
    id: point.id,
    cells: [
      point.label ?? `Reading ${i + 1}`,
      `${formatNumber(point.mean, 1)}${unit}`,
      `${formatSigned(point.difference, 1)}${unit}`,
      isOutside(point, agreement) ? "outside the limits" : "",
    ],
  }));
  const [mean, difference] = [
    { label: xLabel, isNumber: true },
    { label: yLabel, isNumber: true },
  ];
  return (
    <div className="grid gap-6">
      {figures.length > 0 && (
        <ChartTable
          caption="Mean difference and limits of agreement"
          columns={[
            { label: "Figure" },
            { label: "Estimate", isNumber: true },
            { label: "95 % interval", isNumber: true },
          ]}
          rows={figures}
        />
      )}
      {counts.length > 0 && (
        <ChartTable
          caption="Left out"
          columns={[{ label: "Why" }, { label: "Readings", isNumber: true }]}
          rows={counts}
        />
      )}
      <ChartTable
        caption="Every reading drawn"
        columns={[{ label: "Reading" }, mean, difference, { label: "Note" }]}
        rows={readings}
      />
    </div>
  );
}

function intervalCells({ estimate, low, high }: Interval, unit: string): string[] {
  const ends = low === undefined || high === undefined ? "none" : `${formatSignedInterval(low, high)}${unit}`;
  return [`${formatSigned(estimate)}${unit}`, ends];
}
