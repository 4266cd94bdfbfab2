import "server-only";
import type { Knex } from "knex";
import { appendAudit } from "@/lib/audit/append-audit";
import type { Actor } from "@/lib/auth/actor";
import { conflict, invalidField, notFound } from "@/lib/errors";
import { readingRolesOf } from "@/lib/people/queries";
import { type DraftExaminer, insertDraft, lockRound, replaceDraft, usableCaseIds } from "./queries";
import type { RoundDraft } from "./schema";

export async function createDraft(db: Knex, actor: Actor, title: string, now = new Date()): Promise<string> {
  return db.transaction(async (trx) => {
    const roundId = await insertDraft(trx, { departmentId: actor.departmentId, title, createdBy: actor.id });
    await appendAudit(trx, {
      departmentId: actor.departmentId,
      actorId: actor.id,
      action: "round.drafted",
      targetType: "round",
      targetId: roundId,
      at: now,
    });
    return roundId;
  });
}

/** Stores a draft as the composer has it. Throws not-found, a conflict once published, or invalid for a wrong choice. */
export async function saveDraft(db: Knex, actor: Actor, roundId: string, draft: RoundDraft, now = new Date()) {
  await db.transaction(async (trx) => {
    const round = await lockRound(trx, actor.departmentId, roundId);
    if (!round) throw notFound("round");
    if (round.state !== "draft") throw conflict("round-state", "A published round cannot be composed anew.");
    const usable = await usableCaseIds(
      trx,
      actor.departmentId,
      draft.items.map(({ caseId }) => caseId),
    );
    if (!draft.items.every(({ caseId }) => usable.has(caseId))) {
      throw invalidField("items", "A chosen case is retired or not in this library. Take it out.");
    }
    await replaceDraft(trx, round, draft, await chosenExaminers(trx, actor.departmentId, draft.examinerIds), now);
  });
}

async function chosenExaminers(trx: Knex.Transaction, departmentId: string, ids: string[]): Promise<DraftExaminer[]> {
  const roles = await readingRolesOf(trx, departmentId, ids);
  return ids.map((personId) => {
    const assignedAs = roles.get(personId);
    if (!assignedAs) throw invalidField("examinerIds", "A chosen person cannot read blind here. Take that person out.");
    return { personId, assignedAs };
  });
}
