import type { Metadata } from "next";
import { ScorecardView } from "@/components/scorecard/scorecard-view";
import { Page } from "@/components/shell/page";
import { authorizePage } from "@/lib/auth/current-actor";
import { database } from "@/lib/database";
import { pageParams, pageResult } from "@/lib/http/page";
import { loadScorecard } from "@/lib/results/load-scorecard";
import { RoundParams } from "@/lib/rounds/schema";

export const metadata: Metadata = { title: "Your scorecard" };

export default async function ScorecardPage({ params }: PageProps<"/scorecards/[roundId]">) {
  const actor = await authorizePage("scorecards.read");
  const { roundId } = pageParams(await params, RoundParams);
  const scorecard = await pageResult(loadScorecard(database(), actor, roundId));
  return (
    <Page>
      <ScorecardView scorecard={scorecard} />
    </Page>
  );
}
