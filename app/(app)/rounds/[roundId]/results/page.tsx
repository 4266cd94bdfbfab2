import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { ResultsView } from "@/components/results/results-view";
import { RoundStateTag } from "@/components/rounds/round-state-tag";
import { Page, PageHead } from "@/components/shell/page";
import { Crumb } from "@/components/ui/crumb";
import { Time } from "@/components/ui/time";
import { authorizePage } from "@/lib/auth/current-actor";
import { can } from "@/lib/auth/permissions";
import { database } from "@/lib/database";
import { pageParams, pageResult } from "@/lib/http/page";
import { loadRoundResults } from "@/lib/results/load-round-results";
import { findRoundDetail } from "@/lib/rounds/queries";
import { RoundParams } from "@/lib/rounds/schema";

export const metadata: Metadata = { title: "Results" };

export default async function ResultsPage({ params }: PageProps<"/rounds/[roundId]/results">) {
  const actor = await authorizePage("results.read");
  const { roundId } = pageParams(await params, RoundParams);
  const round = await pageResult(findRoundDetail(database(), actor.departmentId, roundId));
  const canRelease = can(actor, "rounds.advance");
  if (canRelease && (round.state === "draft" || round.state === "open")) redirect(`/rounds/${roundId}`);
  const results = await pageResult(loadRoundResults(database(), actor, roundId).then((found) => ({ found })));
  const back = canRelease ? { label: "Rounds", href: "/rounds" } : { label: "Drift", href: "/drift" };
  return (
    <Page>
      <PageHead
        isTitle
        crumb={<Crumb steps={[back, { label: `Round ${round.number}` }]} />}
        title={round.title}
        lede={
          round.closedAt && (
            <>
              Closed <Time iso={round.closedAt} zone={actor.timeZone} />
            </>
          )
        }
        actions={<RoundStateTag state={round.state} />}
      />
      <ResultsView roundId={roundId} initial={results.found} canRelease={canRelease} />
    </Page>
  );
}
