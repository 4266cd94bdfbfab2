import "server-only";
import knex, { type Knex } from "knex";
import { databaseEnv } from "@/lib/env";

declare global {
  // Survives the module being loaded anew: Next's hot reload, and its separate bundles of one server.
  var evenglintPool: Knex | undefined;
}

/** The pool of connections, opened when first asked for. A transaction has the same type and takes its place. */
export function database(): Knex {
  globalThis.evenglintPool ??= openPool();
  return globalThis.evenglintPool;
}

/** For scripts and tests, which would otherwise wait for the idle connections. */
export async function closeDatabase(): Promise<void> {
  const pool = globalThis.evenglintPool;
  globalThis.evenglintPool = undefined;
  await pool?.destroy();
}

function openPool(): Knex {
  const { DATABASE_URL, DATABASE_POOL_MAX } = databaseEnv();
  return knex({
    client: "pg",
    connection: { connectionString: DATABASE_URL, application_name: "evenglint" },
    pool: { min: 0, max: DATABASE_POOL_MAX },
    acquireConnectionTimeout: 15_000,
  });
}
