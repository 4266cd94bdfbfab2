import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { ReadingDesk } from "@/components/desk/reading-desk";
import { authorizePage } from "@/lib/auth/current-actor";
import { database } from "@/lib/database";
import { openSheet } from "@/lib/desk/open-sheet";
import { DeskParams } from "@/lib/desk/schema";
import { pageParams, pageResult } from "@/lib/http/page";

export const metadata: Metadata = { title: "Reading desk" };

export default async function ReadingDeskPage({ params }: PageProps<"/desk/[roundId]">) {
  const actor = await authorizePage("desk.use");
  const { roundId } = pageParams(await params, DeskParams);
  const sheet = await pageResult(openSheet(database(), actor, roundId));
  if (sheet.state !== "open") redirect(`/desk/${roundId}/check`);
  return <ReadingDesk initial={sheet} zone={actor.timeZone} />;
}
