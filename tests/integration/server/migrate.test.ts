import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import knex from "knex";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { releaseAbandonedJobs } from "@/db/server/release-abandoned-jobs";
import { migrateDatabase } from "@/scripts/application";
import { createTestDatabase, type TestDatabase } from "@/tests/support/database";

describe("migrating", { timeout: 120_000 }, () => {
  let database: TestDatabase;
  let db: ReturnType<typeof knex>;
  let folder: string;
  beforeEach(async () => {
    folder = mkdtempSync(path.join(tmpdir(), "evenglint-migrate-"));
    database = await createTestDatabase();
    db = knex({ client: "pg", connection: database.url });
  });
  afterEach(async () => {
    await db.destroy();
    await database.remove();
    rmSync(folder, { recursive: true });
  });
  const migrate = (log = "migrate") =>
    migrateDatabase({ DATABASE_URL: database.url }, { logFile: path.join(folder, log) });

  it("changes nothing in a database that is up to date, twice at once either", async () => {
    const before = await db("knex_migrations").select();
    await Promise.all([migrate("one"), migrate("two")]);
    expect(await db("knex_migrations").select()).toEqual(before);
  });
  // Knex would refuse for ever: "Migration table is already locked".
  it("goes on after a migration that was killed with its lock held", async () => {
    await db("knex_migrations_lock").update({ is_locked: 1 });
    await migrate();
    expect(await db("knex_migrations_lock").select("is_locked")).toEqual([{ is_locked: 0 }]);
  });
  it("says what is wrong with a database that cannot be reached", async () => {
    const nowhere = { DATABASE_URL: "postgres://a:b@127.0.0.1:9/c" };
    await expect(migrateDatabase(nowhere, { logFile: path.join(folder, "log") })).rejects.toThrow("ECONNREFUSED");
  });
  it("frees the jobs that a killed worker held", async () => {
    await db.raw("SELECT graphile_worker.add_job('close-round')");
    await db.raw("UPDATE graphile_worker._private_jobs SET locked_by = 'killed', locked_at = now()");
    await releaseAbandonedJobs(database.url);
    await releaseAbandonedJobs(database.url); // with nothing held any more
    expect(await db("graphile_worker.jobs").select("locked_by")).toEqual([{ locked_by: null }]);
  });
});
