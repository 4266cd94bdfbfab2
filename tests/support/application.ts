import path from "node:path";
import { inject } from "vitest";
import { freePort } from "../../db/server/free-port";
import { stopTied, type TiedProcess } from "../../db/server/tied-process";
import { seedDatabase, startWeb, startWorker, waitUntilAnswering } from "../../scripts/application";
import { buildApplication } from "../../scripts/build-application";
import { createTestDatabase, testSettings } from "./database";

export type TestApplication = {
  /** Without a slash at its end. */
  address: string;
  databaseUrl: string;
  stop(): Promise<void>;
};

/**
 * Starts the production build with its worker, on a free port and a database of its own: migrated and empty, or filled
 * with the demo. For beforeAll of a browser test; the build is made when the sources have changed since the last one.
 */
export async function startApplication({ hasDemo = false } = {}): Promise<TestApplication> {
  await buildApplication();
  const { folder } = inject("services");
  const database = await createTestDatabase();
  const port = await freePort();
  const address = `http://localhost:${port}`;
  const settings = { ...testSettings(), DATABASE_URL: database.url, NEXTAUTH_URL: address };
  const output = (name: string) => ({ logFile: path.join(folder, `${name}-${port}.log`) });
  const running: TiedProcess[] = [];
  const stop = async () => {
    for (const tied of running.toReversed()) await stopTied(tied);
    await database.remove();
  };
  try {
    if (hasDemo) await seedDatabase(settings, output("seed"));
    running.push(startWorker(settings, output("worker")));
    const web = startWeb("start", port, settings, output("web"));
    running.push(web);
    await waitUntilAnswering(web, port);
  } catch (error) {
    await stop();
    throw error;
  }
  return { address, databaseUrl: database.url, stop };
}
