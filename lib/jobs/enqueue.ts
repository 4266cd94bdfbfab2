import "server-only";
import type { Knex } from "knex";

/** Every kind of background work and what it needs to know. */
export type Jobs = {
  "close-round": { roundId: string };
  "compute-results": { roundId: string; reason: string };
};

/**
 * Adds a job in the caller's transaction: committed with the change that causes it, or not at all.
 * One job is kept for each key; adding it again moves it.
 */
export async function enqueue<Task extends keyof Jobs>(
  trx: Knex.Transaction,
  task: Task,
  payload: Jobs[Task],
  { key, runAt }: { key: string; runAt?: Date },
): Promise<void> {
  await trx.raw(
    "SELECT graphile_worker.add_job(?, payload := ?::json, run_at := ?, job_key := ?, max_attempts := 12)",
    [task, JSON.stringify(payload), runAt ?? null, key],
  );
}
