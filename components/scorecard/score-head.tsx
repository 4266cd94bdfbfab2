"use client";

import { ScoreRule } from "@/components/charts/score-rule";
import { Notice } from "@/components/ui/notice";
import { formatInterval, formatNumber, formatShare } from "@/lib/format/numbers";
import { READINGS_FEW, type Scorecard } from "@/lib/results/schema";

/** The agreement score: direction kappa and the share within tolerance, both with intervals. No composite of them. */
export function ScoreHead({ scorecard }: { scorecard: Scorecard }) {
  const { figures, earlier, round, kappaFloor } = scorecard;
  const { kappa, withinTolerance } = figures;
  return (
    <section aria-label="Agreement score" className="grid gap-4">
      {kappa.ok ? (
        <div className={kappa.n < READINGS_FEW ? "text-ink-3" : undefined}>
          <p className="flex flex-wrap items-end gap-x-4 gap-y-1">
            <span className="font-serif text-score">{formatNumber(kappa.kappa.estimate, 2)}</span>
            <span className="pb-2 text-small text-ink-2">
              kappa against the reference, {kappa.n} cases
              {kappa.kappa.low !== undefined && kappa.kappa.high !== undefined && (
                <>
                  <br />
                  95 % interval {formatInterval(kappa.kappa.low, kappa.kappa.high)}
                </>
              )}
              {kappa.n < READINGS_FEW && (
                <>
                  <br />
                  too few to say
                </>
              )}
            </span>
          </p>
          <ScoreRule
            own={{ ...kappa.kappa, label: `R${round.number}` }}
            earlier={earlier.map(({ number, kappa: estimate }) => ({ label: `R${number}`, estimate }))}
            floor={kappaFloor}
          />
        </div>
      ) : (
        <Notice tone="info" title="No kappa for this round.">
          {kappa.reason}
        </Notice>
      )}
      <p className="border-t border-hair pt-3">
        {withinTolerance.ok ? (
          <>
            <b className="font-mono">{formatShare(withinTolerance.share.estimate)}</b> of {withinTolerance.n} cases read
            with the same direction and within the department’s tolerance in degrees
            {withinTolerance.share.low !== undefined && withinTolerance.share.high !== undefined && (
              <span className="text-ink-2">
                {" "}
                (95 % interval {formatNumber(100 * withinTolerance.share.low, 0)} to{" "}
                {formatShare(withinTolerance.share.high)})
              </span>
            )}
            .
          </>
        ) : (
          withinTolerance.reason
        )}
      </p>
    </section>
  );
}
