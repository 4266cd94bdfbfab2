import path from "node:path";
import { ensureDatabase, startCluster } from "../db/server/cluster";
import { postgresUser } from "../db/server/postgres-user";
import { startFakeS3 } from "../fake-s3/start-fake-s3";
import { launchEnv } from "../lib/env";
import { keepLocalState } from "./local-state";
import { LOCAL, newLog, ROOT } from "./paths";
import type { Service } from "./services";

export type LocalServices = {
  /** For the processes to start. */
  settings: Record<string, string>;
  /** Whether the database is the one made here, which nobody else uses. */
  hasOwnDatabase: boolean;
};

/**
 * Starts what the settings do not point elsewhere: PostgreSQL unless DATABASE_URL is set, the S3 stand-in unless
 * S3_ENDPOINT is. Each service is handed over as soon as it runs, so that a stop in between ends it too.
 */
export async function startLocalServices(onService: (service: Service) => void): Promise<LocalServices> {
  const wanted = launchEnv();
  const hasOwnDatabase = wanted.DATABASE_URL === undefined;
  const runAs = hasOwnDatabase ? postgresUser() : undefined;
  const state = keepLocalState(ROOT, runAs);
  const settings: Record<string, string> = {};
  if (hasOwnDatabase) {
    console.log(`Starting PostgreSQL, with its data in ${state.clusterFolder}`);
    const cluster = await startCluster({
      folder: state.clusterFolder,
      runAs,
      password: state.databasePassword,
      isDurable: true,
    });
    onService(cluster);
    await ensureDatabase(cluster, "evenglint");
    settings.DATABASE_URL = cluster.url("evenglint");
  }
  if (wanted.S3_ENDPOINT === undefined) {
    const keys = { accessKeyId: state.s3AccessKeyId, secretAccessKey: state.s3SecretAccessKey };
    const bucket = await startFakeS3(path.join(LOCAL, "bucket"), newLog("fake-s3"), keys);
    onService(bucket);
    Object.assign(settings, bucket.settings);
  }
  if (wanted.NEXTAUTH_SECRET === undefined) settings.NEXTAUTH_SECRET = state.nextauthSecret;
  return { settings, hasOwnDatabase };
}
