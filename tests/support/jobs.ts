import { Logger, runOnce } from "graphile-worker";
import type { Knex } from "knex";
import { databaseEnv } from "@/lib/env";
import type { Jobs } from "@/lib/jobs/enqueue";
import { TASKS } from "@/lib/jobs/tasks";

/** Does the background work that is due, and what comes of it, as the worker would. */
export async function runDueJobs(): Promise<void> {
  const logger = new Logger(() => () => undefined);
  await runOnce({ connectionString: databaseEnv().DATABASE_URL, taskList: TASKS, noHandleSignals: true, logger });
}

export type QueuedJob = { task: keyof Jobs; key: string; runAt: Date; attempts: number; lastError: string | null };

/** What is queued, by key. */
export async function listJobs(db: Knex): Promise<QueuedJob[]> {
  const rows = await db("graphile_worker.jobs").orderBy("key").select();
  return rows.map((row) => ({
    task: row.task_identifier,
    key: row.key,
    runAt: row.run_at,
    attempts: row.attempts,
    lastError: row.last_error,
  }));
}
