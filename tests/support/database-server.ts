import { randomBytes } from "node:crypto";
import path from "node:path";
import { type Cluster, startCluster } from "../../db/server/cluster";
import { postgresUser } from "../../db/server/postgres-user";
import { testEnv } from "../../lib/env";

/** Only what tests use, whichever server it is. */
export type DatabaseServer = Pick<Cluster, "url" | "stop">;

/** Debian's server, or with TEST_DATABASE=container one in Docker. */
export async function startDatabaseServer(folder: string): Promise<DatabaseServer> {
  if (testEnv().TEST_DATABASE === "container") return startContainer();
  return startCluster({
    folder: path.join(folder, "postgres"),
    runAs: postgresUser(),
    password: randomBytes(16).toString("hex"),
    isDurable: false,
  });
}

export const NO_ENGINE =
  "TEST_DATABASE=container needs a Docker engine, and none answers here: start one, or leave TEST_DATABASE out to use Debian's PostgreSQL.";

async function startContainer(): Promise<DatabaseServer> {
  const { getContainerRuntimeClient } = await import("testcontainers");
  await getContainerRuntimeClient().catch((cause: unknown) => {
    throw new Error(NO_ENGINE, { cause });
  });
  const { PostgreSqlContainer } = await import("@testcontainers/postgresql");
  const container = await new PostgreSqlContainer("postgres:15").start();
  const url = (database: string) => {
    const address = new URL(container.getConnectionUri());
    address.pathname = `/${database}`;
    return address.href;
  };
  const stop = async () => {
    await container.stop();
  };
  return { url, stop };
}
