import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { Composer } from "@/components/rounds/composer";
import { roundHref } from "@/components/rounds/round-table";
import { Page } from "@/components/shell/page";
import { authorizePage } from "@/lib/auth/current-actor";
import { listCaseSummaries } from "@/lib/cases/queries";
import { CaseFilter } from "@/lib/cases/schema";
import { database } from "@/lib/database";
import { pageParams, pageResult } from "@/lib/http/page";
import { listPeople } from "@/lib/people/queries";
import { findRoundDetail } from "@/lib/rounds/queries";
import { RoundParams } from "@/lib/rounds/schema";

export const metadata: Metadata = { title: "Compose a round" };

export default async function ComposePage({ params }: PageProps<"/rounds/[roundId]/compose">) {
  const actor = await authorizePage("rounds.write");
  const { roundId } = pageParams(await params, RoundParams);
  const round = await pageResult(findRoundDetail(database(), actor.departmentId, roundId));
  if (round.state !== "draft") redirect(roundHref(round));
  const [cases, people] = await Promise.all([
    listCaseSummaries(database(), actor.departmentId, CaseFilter.parse({})),
    listPeople(database(), actor.departmentId),
  ]);
  return (
    <Page>
      <Composer round={round} cases={cases} people={people} zone={actor.timeZone} />
    </Page>
  );
}
