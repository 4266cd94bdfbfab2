import "server-only";
import type { Knex } from "knex";
import { appendAudit } from "@/lib/audit/append-audit";
import type { Actor } from "@/lib/auth/actor";
import { notFound } from "@/lib/errors";
import { enqueue } from "@/lib/jobs/enqueue";
import { publishedRoundsWithCase } from "@/lib/results/queries";
import { insertReference, lockCase, updateCaseRow } from "./queries";
import type { CaseChange, ReferenceRevision } from "./schema";

/** Changes note, anchor or retirement. Retired cases stay in the rounds they were in. */
export async function changeCase(db: Knex, actor: Actor, caseId: string, change: CaseChange, now = new Date()) {
  await db.transaction(async (trx) => {
    if ((await lockCase(trx, actor.departmentId, caseId)) === null) throw notFound("case");
    await updateCaseRow(trx, caseId, change, now);
    await appendAudit(trx, { ...auditOf(actor, caseId, "case.changed"), detail: { ...change }, at: now });
  });
}

/**
 * Gives a case a new reference. The old revision stays, and results computed with it stay too; closed rounds that show
 * the case get a new revision of their results (for rounds still open the job finds nothing to do).
 */
export async function reviseReference(
  db: Knex,
  actor: Actor,
  caseId: string,
  revision: ReferenceRevision,
  now = new Date(),
): Promise<number> {
  return db.transaction(async (trx) => {
    const current = await lockCase(trx, actor.departmentId, caseId);
    if (current === null) throw notFound("case");
    const next = current + 1;
    await insertReference(trx, { caseId, revision: next, ...revision, createdBy: actor.id });
    await appendAudit(trx, {
      ...auditOf(actor, caseId, "case.reference-revised"),
      detail: { revision: next, reason: revision.reason },
      at: now,
    });
    for (const roundId of await publishedRoundsWithCase(trx, caseId)) {
      const reason = `reference of a case revised: ${revision.reason}`;
      await enqueue(trx, "compute-results", { roundId, reason }, { key: `results:${roundId}` });
    }
    return next;
  });
}

function auditOf(actor: Actor, caseId: string, action: string) {
  return {
    departmentId: actor.departmentId,
    actorId: actor.id,
    action,
    targetType: "case" as const,
    targetId: caseId,
  };
}
