import { Client } from "pg";

/**
 * Frees the jobs that a killed worker still holds, which the queue itself would do only after four hours. For a database
 * that no worker is using: one at work would see its job done twice.
 */
export async function releaseAbandonedJobs(databaseUrl: string): Promise<void> {
  const client = new Client({ connectionString: databaseUrl });
  await client.connect();
  try {
    await client.query(`
      SELECT graphile_worker.force_unlock_workers(array_agg(DISTINCT locked_by))
      FROM graphile_worker.jobs WHERE locked_by IS NOT NULL HAVING count(*) > 0
    `);
  } finally {
    await client.end();
  }
}
