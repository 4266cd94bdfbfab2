import { randomUUID } from "node:crypto";
import type { Knex } from "knex";
import { Client } from "pg";
import { afterAll, beforeAll, inject } from "vitest";
import { closeDatabase, database } from "@/lib/database";
import { changeEnv } from "@/lib/env";
import { makeBucket } from "./bucket";

/**
 * Gives the test file a migrated database of its own and a bucket of its own, both empty; they are what the
 * application's own code finds. Call it at the top of the file; the answer gives the pool once the tests run.
 */
export function useDatabase(): () => Knex {
  let made: TestDatabase | undefined;
  beforeAll(async () => {
    made = await createTestDatabase();
    const bucket = await makeBucket(inject("services").storage);
    changeEnv({ ...testSettings(), DATABASE_URL: made.url, S3_BUCKET: bucket });
  });
  afterAll(async () => {
    await closeDatabase();
    await made?.remove();
  });
  return database;
}

export type TestDatabase = { url: string; remove(): Promise<void> };

export async function createTestDatabase(): Promise<TestDatabase> {
  const { adminUrl, template } = inject("services");
  const name = `test_${randomUUID().replaceAll("-", "")}`;
  await administer(`CREATE DATABASE ${name} TEMPLATE ${template}`);
  const url = new URL(adminUrl);
  url.pathname = `/${name}`;
  return { url: url.href, remove: () => administer(`DROP DATABASE ${name} WITH (FORCE)`) };
}

/** Settings for the application under test, but for its database. */
export function testSettings(): Record<string, string> {
  return {
    ...inject("services").storage,
    NEXTAUTH_SECRET: "for tests only, and at least 32 characters long",
    NEXTAUTH_URL: "http://localhost:3000",
  };
}

async function administer(statement: string): Promise<void> {
  const client = new Client({ connectionString: inject("services").adminUrl });
  await client.connect();
  try {
    await client.query(statement);
  } finally {
    await client.end();
  }
}
