import { spawnSync } from "node:child_process";
import { chownSync, existsSync, mkdirSync, mkdtempSync, readdirSync, rmdirSync, rmSync } from "node:fs";
import path from "node:path";
import type { RunAs } from "./tied-process";

/** PostgreSQL refuses to run as root: then it runs as Debian's user for it, otherwise as whoever we are. */
export function postgresUser(): RunAs | undefined {
  if (process.getuid?.() !== 0) return undefined;
  const idOf = (flag: "-u" | "-g") => Number(spawnSync("id", [flag, "postgres"], { encoding: "utf8" }).stdout.trim());
  const runAs = { uid: idOf("-u"), gid: idOf("-g") };
  if (!runAs.uid || !runAs.gid) throw new Error("There is no user postgres, which Debian's package makes.");
  return runAs;
}

/** Makes a folder for PostgreSQL. Answers false where its user cannot get to it, such as below another's home. */
export function makeReachable(folder: string, runAs: RunAs | undefined): boolean {
  mkdirSync(folder, { recursive: true, mode: 0o755 });
  if (!runAs) return true;
  chownSync(folder, runAs.uid, runAs.gid);
  return spawnSync("test", ["-w", folder, "-a", "-x", folder], { cwd: "/", ...runAs }).status === 0;
}

const TEST_FOLDER = "evenglint-test-";

/**
 * A new folder for the time of a test run, outside the checkout, that PostgreSQL's user can get to. Folders of runs that
 * were killed are removed on the way.
 */
export function makeTemporaryFolder(runAs: RunAs | undefined, places: string[]): string {
  for (const place of places) {
    removeAbandoned(place);
    const folder = mkdtempSync(path.join(place, `${TEST_FOLDER}${process.pid}-`));
    if (makeReachable(folder, runAs)) return folder;
    rmdirSync(folder);
  }
  throw new Error(`PostgreSQL's user can reach none of ${places.join(", ")}.`);
}

function removeAbandoned(place: string): void {
  for (const name of readdirSync(place)) {
    const pid = name.startsWith(TEST_FOLDER) && Number.parseInt(name.slice(TEST_FOLDER.length), 10);
    if (!pid || existsSync(`/proc/${pid}`)) continue;
    try {
      rmSync(path.join(place, name), { recursive: true, force: true });
    } catch {} // another user's, who will remove it
  }
}
