import { randomBytes } from "node:crypto";
import { rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { Client } from "pg";
import type { TestProject } from "vitest/node";
import { makeTemporaryFolder, postgresUser } from "../../db/server/postgres-user";
import { type FakeS3Settings, startFakeS3 } from "../../fake-s3/start-fake-s3";
import { testEnv } from "../../lib/env";
import { migrateDatabase } from "../../scripts/application";
import { type DatabaseServer, startDatabaseServer } from "./database-server";

declare module "vitest" {
  interface ProvidedContext {
    services: {
      /** A database to connect to while making and removing others. */
      adminUrl: string;
      /** A migrated database without rows, of which each test file gets a copy. */
      template: string;
      storage: FakeS3Settings;
      /** For logs and the like; gone after the run. */
      folder: string;
    };
  }
}

const TEMPLATE = "evenglint_template";

/** Starts a database server and the S3 stand-in for one run of a project, and returns how to stop them. */
export default async function startServices(project: TestProject): Promise<() => Promise<void>> {
  const runAs = testEnv().TEST_DATABASE === "debian" ? postgresUser() : undefined;
  const folder = makeTemporaryFolder(runAs, [tmpdir(), "/var/tmp", "/tmp"]);
  const started: { stop(): Promise<void> }[] = [];
  const stop = async () => {
    await Promise.all(started.map((service) => service.stop()));
    rmSync(folder, { recursive: true, force: true });
  };
  try {
    const server = await startDatabaseServer(folder);
    started.push(server);
    const key = () => randomBytes(16).toString("hex");
    const keys = { accessKeyId: key(), secretAccessKey: key() };
    const bucket = await startFakeS3(path.join(folder, "bucket"), path.join(folder, "fake-s3.log"), keys);
    started.push(bucket);
    await makeTemplate(server, folder);
    project.provide("services", {
      adminUrl: server.url("postgres"),
      template: TEMPLATE,
      storage: bucket.settings,
      folder,
    });
  } catch (error) {
    await stop();
    throw error;
  }
  return stop;
}

/** In a process of its own: Knex loads the TypeScript migrations by itself, past vitest's transforms. */
async function makeTemplate(server: DatabaseServer, folder: string): Promise<void> {
  const admin = new Client({ connectionString: server.url("postgres") });
  await admin.connect();
  await admin.query(`CREATE DATABASE ${TEMPLATE}`);
  await admin.end();
  await migrateDatabase({ DATABASE_URL: server.url(TEMPLATE) }, { logFile: path.join(folder, "migrate.log") });
}
