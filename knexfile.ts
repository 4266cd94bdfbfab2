import path from "node:path";
import type { Knex } from "knex";

/** Knex's settings for migrations. They are TypeScript, so whatever loads them runs through tsx. */
export function knexSettings(databaseUrl: string): Knex.Config {
  return {
    client: "pg",
    connection: { connectionString: databaseUrl, application_name: "evenglint-migrate" },
    pool: { min: 0, max: 2 },
    migrations: { directory: path.join(import.meta.dirname, "db/migrations"), loadExtensions: [".ts"] },
  };
}
