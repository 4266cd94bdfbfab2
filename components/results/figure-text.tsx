import type { ReactNode } from "react";
import { formatInterval, formatNumber, formatShare, formatSigned, formatSignedInterval } from "@/lib/format/numbers";
import { type ExaminerFigures, READINGS_FEW } from "@/lib/results/schema";
import type { Estimate } from "@/lib/statistics";

type Kappa = ExaminerFigures["stepsLinear"];
type Share = ExaminerFigures["withinTolerance"];
type Limits = ExaminerFigures["horizontal"]["limits"];

/** A figure with its interval under it; a reason where there is none, and greyed where too few readings stand behind it. */
function FigureText({ result, figure, interval }: { result: { n: number }; figure: string; interval?: ReactNode }) {
  const isTooFew = result.n < READINGS_FEW;
  return (
    <span className={isTooFew ? "text-ink-3" : undefined}>
      <span className="block whitespace-nowrap">{figure}</span>
      <span className="block text-note whitespace-nowrap text-ink-2">
        {isTooFew ? `too few to say (${result.n})` : interval}
      </span>
    </span>
  );
}

function Reason({ children }: { children: string }) {
  return <span className="font-sans text-note text-ink-2">{children}</span>;
}

function ends({ low, high }: Estimate, format: (low: number, high: number) => string): string | undefined {
  return low === undefined || high === undefined ? undefined : format(low, high);
}

export function KappaText({ result }: { result: Kappa }) {
  if (!result.ok) return <Reason>{result.reason}</Reason>;
  return (
    <FigureText
      result={result}
      figure={formatNumber(result.kappa.estimate, 2)}
      interval={ends(result.kappa, formatInterval)}
    />
  );
}

export function ShareText({ result }: { result: Share }) {
  if (!result.ok) return <Reason>{result.reason}</Reason>;
  const interval = ends(result.share, (low, high) => `${formatNumber(100 * low, 0)} to ${formatShare(high)}`);
  return <FigureText result={result} figure={formatShare(result.share.estimate)} interval={interval} />;
}

export function BiasText({ limits }: { limits: Limits }) {
  if (!limits.ok) return <Reason>{limits.reason}</Reason>;
  const interval = ends(limits.bias, (low, high) => formatSignedInterval(low, high));
  return <FigureText result={limits} figure={`${formatSigned(limits.bias.estimate)}°`} interval={interval} />;
}

export function LimitsText({ limits }: { limits: Limits }) {
  if (!limits.ok) return <Reason>{limits.reason}</Reason>;
  const one = (limit: Estimate) => ends(limit, (low, high) => formatSignedInterval(low, high));
  return (
    <FigureText
      result={limits}
      figure={`${formatSignedInterval(limits.lower.estimate, limits.upper.estimate)}°`}
      interval={
        <>
          {one(limits.lower)}
          <br />
          {one(limits.upper)}
        </>
      }
    />
  );
}
