import { multiplesBetween } from "./axis-range";
import { ChartText } from "./chart-text";

type RuleProps = {
  /** Data units to px along the rule. */
  scale: (value: number) => number;
  low: number;
  high: number;
  /** Values with a long tick and a number. */
  ticks: readonly number[];
  /** Distance between short ticks; left out when they would stand closer than 3 px. */
  minorStep?: number;
  format: (value: number) => string;
};

/** The rule as a horizontal axis: a hairline with short and long ticks downwards, numbers below. */
export function RuleAcross({ scale, low, high, ticks, minorStep, format, y }: RuleProps & { y: number }) {
  const short = minorTicks(scale, low, high, minorStep).map((v) => `M${scale(v)} ${y}v4`);
  const long = ticks.map((v) => `M${scale(v)} ${y}v8`);
  return (
    <g>
      <path
        d={`M${scale(low)} ${y}H${scale(high)}${short.join("")}${long.join("")}`}
        stroke="var(--edge)"
        fill="none"
      />
      {ticks.map((value) => (
        <ChartText key={value} x={scale(value)} y={y + 23} face="mono" anchor="middle">
          {format(value)}
        </ChartText>
      ))}
    </g>
  );
}

/** The rule as a vertical axis: ticks and numbers to the left. */
export function RuleUp({ scale, low, high, ticks, minorStep, format, x }: RuleProps & { x: number }) {
  const short = minorTicks(scale, low, high, minorStep).map((v) => `M${x} ${scale(v)}h-3`);
  const long = ticks.map((v) => `M${x} ${scale(v)}h-6`);
  return (
    <g>
      <path
        d={`M${x} ${scale(low)}V${scale(high)}${short.join("")}${long.join("")}`}
        stroke="var(--edge)"
        fill="none"
      />
      {ticks.map((value) => (
        <ChartText key={value} x={x - 10} y={scale(value) + 4.5} face="mono" anchor="end">
          {format(value)}
        </ChartText>
      ))}
    </g>
  );
}

function minorTicks(scale: (value: number) => number, low: number, high: number, step: number | undefined): number[] {
  if (step === undefined || Math.abs(scale(low + step) - scale(low)) < 3) return [];
  return multiplesBetween(low, high, step);
}
