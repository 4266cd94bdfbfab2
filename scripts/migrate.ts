import { runMigrations } from "graphile-worker";
import knex from "knex";
import { Client } from "pg";
import { knexSettings } from "../knexfile";
import { databaseEnv, SettingsError } from "../lib/env";

/** Any number will do, as long as nothing else asks the database for this one. */
const MIGRATION_LOCK = 7_314_001;

/**
 * Brings the database to the newest shape: the job queue's own tables, then ours. Two at once take turns.
 *
 * Knex keeps its lock in a table row, which a killed migration leaves behind locked for ever. The lock that counts is
 * therefore the server's advisory lock, which ends with its connection; whoever holds it may clear Knex's row.
 */
async function migrate(databaseUrl: string): Promise<string[]> {
  const guard = new Client({ connectionString: databaseUrl, application_name: "evenglint-migrate" });
  await guard.connect();
  try {
    await guard.query("SELECT pg_advisory_lock($1)", [MIGRATION_LOCK]);
    await runMigrations({ connectionString: databaseUrl });
    const db = knex(knexSettings(databaseUrl));
    try {
      await db.migrate.forceFreeMigrationsLock();
      const [, names]: [number, string[]] = await db.migrate.latest();
      return names;
    } finally {
      await db.destroy();
    }
  } finally {
    await guard.end();
  }
}

try {
  const names = await migrate(databaseEnv().DATABASE_URL);
  console.log(names.length === 0 ? "The database is up to date." : `Migrated:\n  ${names.join("\n  ")}`);
} catch (error) {
  console.error(error instanceof SettingsError ? error.message : error);
  process.exitCode = 1;
}
