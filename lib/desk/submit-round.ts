import "server-only";
import type { Knex } from "knex";
import { appendAudit } from "@/lib/audit/append-audit";
import { conflict, notFound } from "@/lib/errors";
import { listUnreadPlaces, lockAssignment, markSubmitted, type Reader } from "./queries";
import { requireOpenWindow } from "./window";

/** Hands in a round; readings cannot be changed after. Throws a conflict while cases are unread or outside the window. */
export async function submitRound(db: Knex, reader: Reader, roundId: string, now = new Date()): Promise<void> {
  await db.transaction(async (trx) => {
    const assignment = await lockAssignment(trx, reader, roundId);
    if (!assignment) throw notFound("round");
    if (assignment.submittedAt) return; // handed in already; the answer was lost
    requireOpenWindow(assignment, now);
    const unread = await listUnreadPlaces(trx, assignment.id);
    if (unread.length > 0) {
      throw conflict("readings-missing", `Not read yet: ${unread.map((place) => `case ${place}`).join(", ")}.`);
    }
    await markSubmitted(trx, assignment.id, now);
    await appendAudit(trx, {
      departmentId: reader.departmentId,
      actorId: reader.id,
      action: "round.submitted",
      targetType: "assignment",
      targetId: assignment.id,
      at: now,
    });
  });
}
