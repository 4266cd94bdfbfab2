import "server-only";
import type { Knex } from "knex";
import { appendAudit } from "@/lib/audit/append-audit";
import type { Actor } from "@/lib/auth/actor";
import { conflict, notFound } from "@/lib/errors";
import { enqueue } from "@/lib/jobs/enqueue";
import { publish, removePictures } from "./publish";
import { hasResults, lockRound, lockRoundById, type Round, readClock, setRoundState } from "./queries";
import type { RoundState } from "./schema";

const NEXT: Partial<Record<RoundState, RoundState>> = { draft: "open", open: "closed", closed: "released" };

type Options = { now?: Date; random?: () => number };

/**
 * Moves a round one step (draft, open, closed, released), with its audit entry and jobs, or not at all: if anything
 * fails no picture stays behind either.
 * Throws not-found (another department's too), a conflict for any other step, or invalid when a draft is not complete.
 */
export async function advanceRound(
  db: Knex,
  actor: Actor,
  roundId: string,
  to: "open" | "closed" | "released",
  { now = new Date(), random = Math.random }: Options = {},
): Promise<void> {
  const pictureKeys: string[] = [];
  try {
    await db.transaction(async (trx) => {
      const round = await lockRound(trx, actor.departmentId, roundId);
      if (!round) throw notFound("round");
      if (NEXT[round.state] !== to) {
        throw conflict("round-state", `The round is ${round.state}. It cannot become ${to}.`);
      }
      if (to === "open") await publish(trx, round, { now, random, pictureKeys });
      if (to === "closed") await close(trx, round, now);
      if (to === "released") await release(trx, round, now);
      await appendAudit(trx, { ...auditOf(round, actor.id, to), at: now });
    });
  } catch (error) {
    await removePictures(db, pictureKeys).catch(() => undefined); // the first failure is the one to tell
    throw error;
  }
}

/**
 * For the job queue: closes a round whose time has come, by the database's clock unless a time is given. The queue goes
 * by that clock: a machine behind it would find the round not due, and the job would be gone. A round closed already is
 * left alone, so it may run again.
 */
export async function closeWhenDue(db: Knex, roundId: string, at?: Date): Promise<void> {
  await db.transaction(async (trx) => {
    const round = await lockRoundById(trx, roundId);
    const now = at ?? (await readClock(trx));
    if (round?.state !== "open" || !round.closesAt || round.closesAt > now) return;
    await close(trx, round, now);
    await appendAudit(trx, { ...auditOf(round, null, "closed"), at: now });
  });
}

async function close(trx: Knex.Transaction, round: Round, now: Date): Promise<void> {
  await setRoundState(trx, round.id, "closed", now);
  await enqueue(trx, "compute-results", { roundId: round.id, reason: "closed" }, { key: `results:${round.id}` });
}

async function release(trx: Knex.Transaction, round: Round, now: Date): Promise<void> {
  if (!(await hasResults(trx, round.id))) {
    throw conflict("results-pending", "The results are still being computed. Try again in a moment.");
  }
  await setRoundState(trx, round.id, "released", now);
}

function auditOf(round: Round, actorId: string | null, to: RoundState) {
  return {
    departmentId: round.departmentId,
    actorId,
    action: `round.${to}`,
    targetType: "round" as const,
    targetId: round.id,
  };
}
