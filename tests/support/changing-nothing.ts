import type { Knex } from "knex";
import { expect } from "vitest";
import { listObjectKeys } from "./bucket";

/** Runs what must change nothing, and holds every row, every queued job and every stored object to that. */
export async function changingNothing<Value>(db: Knex, act: () => Promise<Value>): Promise<Value> {
  const before = await takeStock(db);
  const value = await act();
  expect(await takeStock(db)).toEqual(before);
  return value;
}

/** What is kept: a digest of the rows of each table, and the keys of the objects. */
async function takeStock(db: Knex): Promise<Record<string, unknown>> {
  const tables = await db("pg_tables")
    .where({ schemaname: "public" })
    .orWhere({ schemaname: "graphile_worker", tablename: "_private_jobs" })
    .select("schemaname", "tablename");
  const digests: Record<string, unknown> = {};
  for (const { schemaname, tablename } of tables) {
    const { rows } = await db.raw("SELECT md5(string_agg(kept::text, chr(10) ORDER BY kept::text)) FROM ??.?? kept", [
      schemaname,
      tablename,
    ]);
    digests[tablename] = rows[0].md5;
  }
  return { ...digests, objects: (await listObjectKeys()).sort() };
}
