import type { Metadata } from "next";
import { DriftBoardView } from "@/components/drift/drift-board-view";
import { Page } from "@/components/shell/page";
import { authorizePage } from "@/lib/auth/current-actor";
import { database } from "@/lib/database";
import { loadDriftBoard } from "@/lib/drift/load-drift-board";

export const metadata: Metadata = { title: "Drift board" };

export default async function DriftPage() {
  const actor = await authorizePage("drift.read");
  const board = await loadDriftBoard(database(), actor.departmentId);
  return (
    <Page>
      <DriftBoardView initial={board} />
    </Page>
  );
}
