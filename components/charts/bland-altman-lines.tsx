import { formatNumber, formatSigned } from "@/lib/format/numbers";
import { RuleAcross, RuleUp } from "./axis";
import type { AxisRange } from "./axis-range";
import type { Agreement } from "./bland-altman";
import { ChartText } from "./chart-text";
import { binDifferences, type DifferencePoint } from "./merge-points";
import { spreadLabels } from "./place-labels";
import type { PlotScale } from "./plot";
import type { Interval } from "./types";

type LinesProps = { agreement: Agreement; scale: PlotScale; isTooFew: boolean };

/** Bands of 95 % first, then the mean solid and the limits dashed. Grey when they are too few to say. */
export function AgreementLines({ agreement, scale, isTooFew }: LinesProps) {
  const colour = isTooFew ? "var(--tick)" : "var(--cobalt)";
  const { bias, lower, upper } = agreement;
  const across = `H${scale.right}`;
  return (
    <g pointerEvents="none">
      {(["upper", "lower", "bias"] as const).map((line) => {
        const { low, high } = agreement[line];
        if (low === undefined || high === undefined) return null;
        return (
          <rect
            key={line}
            x={scale.left}
            y={scale.y(high)}
            width={scale.right - scale.left}
            height={Math.max(0, scale.y(low) - scale.y(high))}
            fill={colour}
            fillOpacity={0.1}
          />
        );
      })}
      <path d={`M${scale.left} ${scale.y(bias.estimate)}${across}`} stroke={colour} strokeWidth={2} />
      <path
        d={`M${scale.left} ${scale.y(upper.estimate)}${across}M${scale.left} ${scale.y(lower.estimate)}${across}`}
        stroke={colour}
        strokeWidth={1.6}
        strokeDasharray="8 5"
      />
    </g>
  );
}

type LabelsProps = LinesProps & { unit: string; x: number; isNarrow: boolean };

/** The three figures at their lines; on a narrow figure above the line, inside the plot. */
export function AgreementLabels({ agreement, scale, isTooFew, unit, x, isNarrow }: LabelsProps) {
  const lines: { word: string; line: Interval }[] = [
    { word: "upper", line: agreement.upper },
    { word: "mean", line: agreement.bias },
    { word: "lower", line: agreement.lower },
  ];
  const lift = isNarrow ? 10 : 0;
  const wishes = lines.map(({ line }) => ({ centre: scale.y(line.estimate) - lift, size: 17 }));
  const centres = spreadLabels(wishes, scale.top - 10, scale.bottom + 4, 1);
  const tone = isTooFew ? "hint" : "cobalt";
  return (
    <g pointerEvents="none">
      {lines.map(({ word, line }, i) => (
        <ChartText key={word} x={x} y={(centres[i] ?? 0) + 4.5} anchor="end" tone={tone} hasHalo>
          <tspan className="font-mono">
            {formatSigned(line.estimate)}
            {unit}
          </tspan>{" "}
          {word}
        </ChartText>
      ))}
    </g>
  );
}

type HistogramProps = { points: readonly DifferencePoint[]; scale: PlotScale; x: number; width: number };

/** How often each difference occurs, lying on its side along the difference axis. */
export function DifferenceHistogram({ points, scale, x, width }: HistogramProps) {
  const degreePx = scale.y(0) - scale.y(1);
  // Odd widths hold the same count of whole degrees in every bin; even ones would draw stripes that are not there.
  const binDegrees = degreePx >= 5 ? 1 : degreePx >= 2 ? 3 : 5;
  const bins = binDifferences(
    points.map((point) => point.difference),
    binDegrees,
  );
  const fullest = Math.max(1, ...bins.map((bin) => bin.count));
  const thickness = Math.min(9, Math.max(1.5, degreePx * binDegrees - 2));
  return (
    <g pointerEvents="none">
      {bins.map(({ centre, count }) => (
        <rect
          key={centre}
          x={x}
          y={scale.y(centre) - thickness / 2}
          width={(width * count) / fullest}
          height={thickness}
          fill="var(--ink)"
          fillOpacity={0.3}
        />
      ))}
    </g>
  );
}

type AxesProps = { xAxis: AxisRange; yAxis: AxisRange; xLabel: string; yLabel: string; unit: string; scale: PlotScale };

/** Both rules with their names, the difference above its rule and the mean below, and the line of no difference. */
export function DifferenceAxes({ xAxis, yAxis, xLabel, yLabel, unit, scale }: AxesProps) {
  return (
    <g pointerEvents="none">
      <RuleAcross
        scale={scale.x}
        {...xAxis}
        minorStep={1}
        format={(value) => `${formatNumber(value, 0)}${unit}`}
        y={scale.bottom}
      />
      <path d={`M${scale.left} ${scale.y(0)}H${scale.right}`} stroke="var(--edge)" />
      <RuleUp scale={scale.y} {...yAxis} minorStep={1} format={(value) => formatSigned(value, 0)} x={scale.left} />
      <ChartText x={0} y={12}>
        {yLabel}
      </ChartText>
      <ChartText x={(scale.left + scale.right) / 2} y={scale.bottom + 50} anchor="middle">
        {xLabel}
      </ChartText>
    </g>
  );
}
