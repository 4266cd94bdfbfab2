import type { Metadata } from "next";
import { Page, PageHead } from "@/components/shell/page";
import { ButtonLink } from "@/components/ui/button";
import { DataTable } from "@/components/ui/data-table";
import { Time } from "@/components/ui/time";
import { AUDIT_ACTION_WORDS } from "@/lib/audit/action-words";
import { listAuditEvents } from "@/lib/audit/queries";
import { AuditFilter } from "@/lib/audit/schema";
import { authorizePage } from "@/lib/auth/current-actor";
import { database } from "@/lib/database";

export const metadata: Metadata = { title: "Log" };

const COLUMNS = [
  { key: "at", head: "When" },
  { key: "action", head: "What", phone: "end" as const },
  { key: "target", head: "Of", phone: "plain" as const },
  { key: "actor", head: "Who", phone: "plain" as const },
];

export default async function LogPage({ searchParams }: PageProps<"/log">) {
  const actor = await authorizePage("audit.read");
  const { before } = AuditFilter.catch({}).parse(await searchParams);
  const events = await listAuditEvents(database(), actor.departmentId, before);
  const oldest = events.at(-1);
  return (
    <Page>
      <PageHead title="Log" lede="Who did what. Entries can be added and read, never changed." />
      <DataTable
        caption="Audit trail, newest first"
        isCaptionHidden
        columns={COLUMNS}
        empty="Nothing has happened yet."
        rows={events.map(({ id, at, actor: who, action, target }) => ({
          id,
          cells: {
            at: <Time iso={at} zone={actor.timeZone} />,
            action: AUDIT_ACTION_WORDS[action] ?? action,
            target,
            actor: who ?? "the program, by itself",
          },
        }))}
      />
      {oldest && (
        <ButtonLink href={`/log?before=${oldest.id}`} className="mt-5">
          Earlier entries
        </ButtonLink>
      )}
    </Page>
  );
}
