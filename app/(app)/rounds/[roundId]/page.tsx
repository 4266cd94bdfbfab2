import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { RoundMonitor } from "@/components/rounds/round-monitor";
import { roundHref } from "@/components/rounds/round-table";
import { WindowRule } from "@/components/rounds/window-rule";
import { Page, PageHead } from "@/components/shell/page";
import { Crumb } from "@/components/ui/crumb";
import { authorizePage } from "@/lib/auth/current-actor";
import { database } from "@/lib/database";
import { pageParams, pageResult } from "@/lib/http/page";
import { findProgress, findRoundDetail } from "@/lib/rounds/queries";
import { RoundParams } from "@/lib/rounds/schema";

export const metadata: Metadata = { title: "Follow a round" };

export default async function RoundPage({ params }: PageProps<"/rounds/[roundId]">) {
  const actor = await authorizePage("rounds.read");
  const { roundId } = pageParams(await params, RoundParams);
  const round = await pageResult(findRoundDetail(database(), actor.departmentId, roundId));
  if (round.state !== "open") redirect(roundHref(round));
  const progress = await pageResult(findProgress(database(), actor.departmentId, roundId));
  const { opensAt, closesAt, number } = round;
  return (
    <Page>
      <PageHead
        crumb={<Crumb steps={[{ label: "Rounds", href: "/rounds" }, { label: `Round ${number}` }]} />}
        title={round.title}
        lede={`Open for reading. ${round.readingCount} of ${round.itemCount * round.examinerCount} readings in; ${round.submittedCount} of ${round.examinerCount} examiners have handed in.`}
      />
      {opensAt && closesAt && (
        <div className="mt-2 mb-9">
          <WindowRule opensAt={opensAt} closesAt={closesAt} now={new Date().toISOString()} zone={actor.timeZone} />
        </div>
      )}
      <RoundMonitor round={round} initial={progress} zone={actor.timeZone} />
    </Page>
  );
}
