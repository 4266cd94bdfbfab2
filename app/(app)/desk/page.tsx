import type { Metadata } from "next";
import { DeskRounds } from "@/components/desk/desk-rounds";
import { Page, PageHead } from "@/components/shell/page";
import { authorizePage } from "@/lib/auth/current-actor";
import { database } from "@/lib/database";
import { listDeskRounds } from "@/lib/desk/queries";

export const metadata: Metadata = { title: "Desk" };

/** Rounds that wait for me, and the earlier ones with their scorecards. */
export default async function DeskPage() {
  const actor = await authorizePage("desk.use");
  const rounds = await listDeskRounds(database(), actor, new Date());
  return (
    <Page>
      <PageHead title="Desk" />
      <DeskRounds rounds={rounds} zone={actor.timeZone} />
    </Page>
  );
}
