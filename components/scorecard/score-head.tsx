"use client";

import { ScoreRule } from "@/components/charts/score-rule";
import { Notice } from "@/components/ui/notice";
import { formatNumber, formatShare } from "@/lib/format/numbers";
import { READINGS_FEW, type Scorecard } from "@/lib/results/schema";

/** The agreement score: direction kappa and the share within tolerance, both with intervals. No composite of them. */
export function ScoreHead({ scorecard }: { scorecard: Scorecard }) {
  const { figures, earlier, round, kappaFloor } = scorecard;
  const { kappa, withinTolerance } = figures;
  return (
    <section aria-label="Agreement score" className="grid gap-4">
      {kappa.ok ? (
        <ScoreRule
          own={{ ...kappa.kappa, label: `R${round.number}` }}
          earlier={earlier.map(({ number, kappa: estimate }) => ({ label: `R${number}`, estimate }))}
          floor={kappaFloor}
          unitLabel={`kappa against the reference, ${kappa.n} cases`}
          isTooFew={kappa.n < READINGS_FEW}
        />
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
