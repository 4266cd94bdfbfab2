"use client";

import { ConfusionTable } from "@/components/charts/confusion-table";
import { DegreesPlot } from "@/components/results/degrees-plot";
import { PageHead } from "@/components/shell/page";
import { Crumb } from "@/components/ui/crumb";
import { Figure } from "@/components/ui/figure";
import { Standfirst } from "@/components/ui/standfirst";
import type { Scorecard } from "@/lib/results/schema";
import { ScoreHead } from "./score-head";
import { ScoredCases } from "./scored-cases";
import { scorecardStandfirst } from "./standfirst-text";

/** One person's own results: the score with its interval, case by case, and nobody else. */
export function ScorecardView({ scorecard }: { scorecard: Scorecard }) {
  const { round, figures } = scorecard;
  return (
    <div className="grid gap-9">
      <div className="grid items-start gap-x-11 gap-y-6 border-b border-edge pb-6 lg:grid-cols-[minmax(0,1fr)_minmax(0,1fr)]">
        <div>
          <PageHead
            isTitle
            crumb={<Crumb steps={[{ label: "Desk", href: "/desk" }, { label: `Round ${round.number}` }]} />}
            title="Your scorecard"
            lede={round.title}
          />
          <Standfirst>{scorecardStandfirst(scorecard)}</Standfirst>
        </div>
        <ScoreHead scorecard={scorecard} />
      </div>
      <ScoredCases cases={scorecard.cases} />
      <DegreesPlot label="Fig. 1" whose="you" component="size" figures={[figures]} limits={figures.size.limits} />
      <div className="grid items-start gap-11 lg:grid-cols-2">
        <DegreesPlot
          label="Fig. 2"
          whose="you"
          component="horizontal"
          figures={[figures]}
          limits={figures.horizontal.limits}
        />
        <DegreesPlot
          label="Fig. 3"
          whose="you"
          component="vertical"
          figures={[figures]}
          limits={figures.vertical.limits}
        />
      </div>
      <Figure
        label="Table 1"
        caption={`What you read, for each reference: ${figures.readCount} readings. Framed: agreement.`}
      >
        <ConfusionTable {...figures.confusion} rowTitle="Reference" columnTitle="read as" />
      </Figure>
      <p className="max-w-read text-small text-ink-2">
        A score describes readings of this set under these conditions, not work in the clinic. The test gives a rough
        estimate; measurement is by cover tests with prisms.
      </p>
    </div>
  );
}
