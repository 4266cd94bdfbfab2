import { existsSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { runTied } from "../db/server/tied-process";
import { inheritedEnv } from "../lib/env";
import { hashSources } from "./hash-sources";
import { askHolder, waitForLock } from "./lock.mjs";
import { newLog, ROOT } from "./paths";

/** In the build's own folder, so that both disappear together. Written last: a build that was cut short has none. */
const MARKER = path.join(ROOT, ".next/evenglint-sources");

function isCurrent(sources: string): boolean {
  return existsSync(MARKER) && readFileSync(MARKER, "utf8") === sources;
}

/** Builds the application for production when its sources have changed since the last build. */
export async function buildApplication(): Promise<void> {
  if (isCurrent(hashSources(ROOT))) return;
  const lock = await waitForLock("build", ROOT, () => console.log("Waiting for another build"));
  try {
    const sources = hashSources(ROOT);
    if (isCurrent(sources)) return;
    await refuseWhileServed();
    console.log("Building the application, which takes a minute or so");
    rmSync(MARKER, { force: true });
    await runTied({
      name: "The build",
      command: [process.execPath, path.join(ROOT, "node_modules/next/dist/bin/next"), "build"],
      cwd: ROOT,
      env: inheritedEnv({ NODE_ENV: "production" }),
      output: { logFile: newLog("build") },
    });
    // Of the sources as they were before: a change while it built makes the next start build again.
    writeFileSync(MARKER, sources);
  } finally {
    await lock.release();
  }
}

/** A build replaces files that a running application still reads. */
async function refuseWhileServed(): Promise<void> {
  const holder = await askHolder("run", ROOT);
  if (holder && holder.pid !== process.pid && holder.mode === "start") {
    throw new Error(
      `The sources have changed, and the application is running from the build of the old ones (process ${holder.pid}). Stop it first.`,
    );
  }
}
