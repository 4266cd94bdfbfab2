import type { Metadata } from "next";
import { CheckSheet } from "@/components/desk/check-sheet";
import { Page, PageHead } from "@/components/shell/page";
import { Crumb } from "@/components/ui/crumb";
import { authorizePage } from "@/lib/auth/current-actor";
import { database } from "@/lib/database";
import { openSheet } from "@/lib/desk/open-sheet";
import { DeskParams } from "@/lib/desk/schema";
import { pageParams, pageResult } from "@/lib/http/page";

export const metadata: Metadata = { title: "Check and hand in" };

export default async function CheckPage({ params }: PageProps<"/desk/[roundId]/check">) {
  const actor = await authorizePage("desk.use");
  const { roundId } = pageParams(await params, DeskParams);
  const sheet = await pageResult(openSheet(database(), actor, roundId));
  return (
    <Page>
      <PageHead
        crumb={<Crumb steps={[{ label: "Desk", href: "/desk" }, { label: `Round ${sheet.number}` }]} />}
        title={sheet.title}
      />
      <CheckSheet initial={sheet} zone={actor.timeZone} />
    </Page>
  );
}
