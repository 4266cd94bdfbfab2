"use client";

import { formatInterval, formatNumber } from "@/lib/format/numbers";
import { RuleAcross } from "./axis";
import { multiplesBetween } from "./axis-range";
import { ChartFrame } from "./chart-frame";
import { ChartText } from "./chart-text";
import { Dot, intervalPath, OpenDot } from "./marks";
import { keepReadable } from "./place-labels";
import type { Interval } from "./types";
import type { ChartBox } from "./use-chart-box";

type ScoreRuleProps = {
  own: Interval & { label: string };
  /** Earlier rounds, oldest first. */
  earlier: { label: string; estimate: number }[];
  floor?: number;
  /** What the figure is, in words. */
  unitLabel?: string;
  isTooFew?: boolean;
};

const [HEIGHT_PX, MARK_Y, AXIS_Y] = [118, 62, 86];

/** The score of a round in large figures, and on the rule with its interval, the rounds before it and the floor. */
export function ScoreRule({
  own,
  earlier,
  floor,
  unitLabel = "kappa against the reference",
  isTooFew,
}: ScoreRuleProps) {
  const hasInterval = own.low !== undefined && own.high !== undefined;
  const interval = hasInterval ? `95 % interval ${formatInterval(own.low ?? 0, own.high ?? 0)}` : "no interval";
  const before = describeBefore(own.estimate, earlier.at(-1));
  return (
    <div>
      <p className="mb-1 flex flex-wrap items-baseline gap-x-3.5 gap-y-1">
        <span className={isTooFew ? "font-serif text-score text-ink-3" : "font-serif text-score"}>
          {formatNumber(own.estimate, 2)}
        </span>
        <span className="max-w-[44ch] text-table text-ink-2">
          {unitLabel}, {interval}
          {isTooFew && <b className="block text-ink-2">Too few to say</b>}
          {before && <span className="block">{before}</span>}
        </span>
      </p>
      <ChartFrame heightPx={HEIGHT_PX}>
        {(box) => <ScoreDrawing own={own} earlier={earlier} floor={floor} isTooFew={isTooFew} box={box} />}
      </ChartFrame>
    </div>
  );
}

/** What came before, without a word on whether the difference means anything: that is what the interval is for. */
function describeBefore(estimate: number, last: { label: string; estimate: number } | undefined): string | null {
  if (!last) return null;
  const [now, then] = [formatNumber(estimate, 2), formatNumber(last.estimate, 2)];
  if (now === then) return `as in ${last.label}`;
  return `${estimate > last.estimate ? "up" : "down"} from ${then} in ${last.label}`;
}

type DrawingProps = Omit<ScoreRuleProps, "unitLabel"> & { box: ChartBox };

function ScoreDrawing({ own, earlier, floor, isTooFew, box }: DrawingProps) {
  const estimates = [own, ...earlier].map(({ estimate }) => estimate);
  const low = Math.min(0, ...estimates.map((estimate) => Math.floor(estimate * 4) / 4));
  const [left, right] = [16, box.width - 16];
  const x = (value: number) => left + ((right - left) * (value - low)) / (1 - low);
  const rounds = [...earlier, own];
  const kept = keepReadable(
    rounds.map((each) => ({ centre: x(each.estimate), size: box.measure(each.label, 14, "sans", 600) })),
  );
  const floorText = floor === undefined ? "" : `needed to read alone ${formatNumber(floor, 2)}`;
  const floorHalf = box.measure(floorText, 13) / 2;
  const said = rounds.map((each) => `${each.label} ${formatNumber(each.estimate, 2)}`).join(", ");
  return (
    <svg width={box.width} height={HEIGHT_PX} role="img" aria-label={`Score by round: ${said}. ${floorText}`}>
      {floor !== undefined && (
        <g>
          <path d={`M${x(floor)} 24V${AXIS_Y}`} stroke="var(--tawny)" strokeWidth={1.5} strokeDasharray="6 4" />
          <ChartText
            x={Math.max(floorHalf, Math.min(box.width - floorHalf, x(floor)))}
            y={16}
            tone="tawny"
            anchor="middle"
          >
            {floorText}
          </ChartText>
        </g>
      )}
      <RuleAcross
        scale={x}
        low={low}
        high={1}
        ticks={multiplesBetween(low, 1, 0.25)}
        minorStep={0.05}
        format={(value) => formatNumber(value, 2)}
        y={AXIS_Y}
      />
      {own.low !== undefined && own.high !== undefined && (
        <path
          d={intervalPath(x(own.low), x(own.high), MARK_Y, { left, right })}
          stroke={isTooFew ? "var(--tick)" : "var(--brass)"}
          strokeWidth={2}
          fill="none"
        />
      )}
      {earlier.map(({ label, estimate }) => (
        <OpenDot key={label} x={x(estimate)} y={MARK_Y} r={5} colour="var(--brass)" />
      ))}
      {isTooFew ? (
        <OpenDot x={x(own.estimate)} y={MARK_Y} r={8} colour="var(--tick)" />
      ) : (
        <Dot x={x(own.estimate)} y={MARK_Y} r={9} colour="var(--brass-dot)" />
      )}
      {rounds.map((each, i) =>
        kept[i] ? (
          <ChartText
            key={each.label}
            x={x(each.estimate)}
            y={MARK_Y - 16}
            size={each === own ? 14 : 13}
            tone={each === own ? "ink" : "quiet"}
            isStrong={each === own}
            anchor="middle"
            hasHalo
          >
            {each.label}
          </ChartText>
        ) : null,
      )}
    </svg>
  );
}
