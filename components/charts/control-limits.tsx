import { ChartText, type Tone } from "./chart-text";
import type { ControlPoint } from "./control-point";
import { spreadLabels } from "./place-labels";
import type { PlotScale } from "./plot";
import { columnBounds, steppedLimits, steppedPath } from "./stepped-limits";

type LimitKey = "lowerWarning" | "upperWarning" | "lowerAction" | "upperAction";
const LIMITS: readonly { key: LimitKey; word: string; tone: Tone; isAction: boolean }[] = [
  { key: "upperAction", word: "action", tone: "oxide", isAction: true },
  { key: "upperWarning", word: "warning", tone: "tawny", isAction: false },
  { key: "lowerWarning", word: "warning", tone: "tawny", isAction: false },
  { key: "lowerAction", word: "action", tone: "oxide", isAction: true },
];

type LimitsProps = { points: readonly ControlPoint[]; xs: readonly number[]; centre?: number; scale: PlotScale };

/** The zone without a reason to act, the centre and the limits. Limits step where they change from round to round. */
export function ControlLimits({ points, xs, centre, scale }: LimitsProps) {
  return (
    <g pointerEvents="none">
      <QuietZone points={points} xs={xs} scale={scale} />
      {centre !== undefined && (
        <path d={`M${scale.left} ${scale.y(centre)}H${scale.right}`} stroke="var(--ink)" strokeWidth={1.2} />
      )}
      {LIMITS.map(({ key, isAction }) => (
        <path
          key={key}
          d={steppedPath(
            steppedLimits(
              xs,
              points.map((point) => point[key]),
              scale.left,
              scale.right,
            ),
            scale.y,
          )}
          fill="none"
          stroke={isAction ? "var(--oxide)" : "var(--tawny)"}
          strokeWidth={isAction ? 1.6 : 1.3}
          strokeDasharray={isAction ? undefined : "7 5"}
        />
      ))}
    </g>
  );
}

/** Between the warning limits; where one side has no limit, up to the edge of the plot. */
function QuietZone({ points, xs, scale }: Omit<LimitsProps, "centre">) {
  const columns = columnBounds(xs, scale.left, scale.right);
  const path = points.map(({ lowerWarning, upperWarning }, i) => {
    const column = columns[i];
    if (!column || (lowerWarning === undefined && upperWarning === undefined)) return "";
    const top = upperWarning === undefined ? scale.top : scale.y(upperWarning);
    const bottom = lowerWarning === undefined ? scale.bottom : scale.y(lowerWarning);
    return `M${column.from} ${top}H${column.to}V${bottom}H${column.from}z`;
  });
  return <path d={path.join("")} fill="var(--verdi)" fillOpacity={0.07} shapeRendering="crispEdges" />;
}

type LabelsProps = Omit<LimitsProps, "xs"> & {
  centreLabel: string;
  format: (value: number) => string;
  hasWords: boolean;
};

/** The newest limits at the right of their lines; words only where there is room for them. */
export function LimitLabels({ points, centre, centreLabel, scale, format, hasWords }: LabelsProps) {
  const labels = LIMITS.flatMap(({ key, word, tone }) => {
    const value = points.findLast((point) => point[key] !== undefined)?.[key];
    return value === undefined ? [] : [{ key: String(key), value, word, tone }];
  });
  if (centre !== undefined) labels.push({ key: "centre", value: centre, word: centreLabel, tone: "ink" });
  const centres = spreadLabels(
    labels.map(({ value }) => ({ centre: scale.y(value), size: 17 })),
    scale.top - 10,
    scale.bottom + 10,
    1,
  );
  return (
    <g pointerEvents="none">
      {labels.map(({ key, value, word, tone }, i) => (
        <ChartText key={key} x={scale.right + 10} y={(centres[i] ?? 0) + 4.5} tone={tone}>
          <tspan className="font-mono">{format(value)}</tspan>
          {hasWords && ` ${word}`}
        </ChartText>
      ))}
    </g>
  );
}
