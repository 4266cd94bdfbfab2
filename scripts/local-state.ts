import { randomBytes, randomUUID } from "node:crypto";
import { existsSync, mkdirSync, readFileSync, renameSync, rmdirSync, writeFileSync } from "node:fs";
import path from "node:path";
import { z } from "zod";
import { makeReachable } from "../db/server/postgres-user";
import type { RunAs } from "../db/server/tied-process";

const LocalState = z.object({
  /** Where the checkout was when this was written, by which a copy of it is told from the original. */
  checkout: z.string(),
  clusterFolder: z.string(),
  databasePassword: z.string(),
  nextauthSecret: z.string(),
  s3AccessKeyId: z.string(),
  s3SecretAccessKey: z.string(),
});
export type LocalState = z.infer<typeof LocalState>;

/** What a checkout's local run keeps from start to start: its secrets, made once at random, and where its data are. */
export function keepLocalState(checkout: string, runAs: RunAs | undefined): LocalState {
  const folder = path.join(checkout, ".local");
  const file = path.join(folder, "state.json");
  mkdirSync(folder, { recursive: true, mode: 0o755 });
  const kept = existsSync(file) ? LocalState.parse(JSON.parse(readFileSync(file, "utf8"))) : undefined;
  if (kept?.checkout === checkout) return kept;
  const secret = () => randomBytes(32).toString("base64url");
  const state: LocalState = {
    databasePassword: secret(),
    nextauthSecret: secret(),
    s3AccessKeyId: secret(),
    s3SecretAccessKey: secret(),
    ...kept,
    checkout,
    clusterFolder: keepsItsCluster(kept, checkout) ? kept.clusterFolder : chooseClusterFolder(folder, runAs),
  };
  writeWhole(file, JSON.stringify(state, null, 2));
  return state;
}

/** A checkout that was moved keeps a cluster outside it; a copy must not share the original's. */
function keepsItsCluster(kept: LocalState | undefined, checkout: string): kept is LocalState {
  if (!kept || kept.clusterFolder.startsWith(`${kept.checkout}/`)) return false;
  return kept.checkout === checkout || !existsSync(path.join(kept.checkout, ".local/state.json"));
}

/** In the checkout, unless PostgreSQL's user cannot get there (below /root, say): then in that user's own home. */
function chooseClusterFolder(folder: string, runAs: RunAs | undefined): string {
  const inside = path.join(folder, "postgres");
  if (makeReachable(inside, runAs)) return inside;
  rmdirSync(inside);
  return path.join("/var/lib/postgresql", `evenglint-${randomUUID()}`);
}

/** A file that is there whole or not at all, and that no other user may read. */
function writeWhole(file: string, content: string): void {
  const unfinished = `${file}.${process.pid}`;
  writeFileSync(unfinished, content, { mode: 0o600 });
  renameSync(unfinished, file);
}
