import type { Metadata } from "next";
import { NewRoundForm } from "@/components/rounds/new-round-form";
import { RoundTable } from "@/components/rounds/round-table";
import { Page, PageHead } from "@/components/shell/page";
import { authorizePage } from "@/lib/auth/current-actor";
import { database } from "@/lib/database";
import { listRoundSummaries } from "@/lib/rounds/queries";

export const metadata: Metadata = { title: "Rounds" };

export default async function RoundsPage() {
  const actor = await authorizePage("rounds.read");
  const rounds = await listRoundSummaries(database(), actor.departmentId);
  return (
    <Page>
      <PageHead title="Rounds" actions={<NewRoundForm nextNumber={(rounds[0]?.number ?? 0) + 1} />} />
      <RoundTable rounds={rounds} zone={actor.timeZone} />
    </Page>
  );
}
