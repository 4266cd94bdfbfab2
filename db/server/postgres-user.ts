import { spawnSync } from "node:child_process";
import { chownSync, mkdirSync, mkdtempSync } from "node:fs";
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

/** A new folder for the time of a test run, outside the checkout, that PostgreSQL's user can get to. */
export function makeTemporaryFolder(runAs: RunAs | undefined, places: string[]): string {
  for (const place of places) {
    const folder = mkdtempSync(path.join(place, "evenglint-test-"));
    if (makeReachable(folder, runAs)) return folder;
  }
  throw new Error(`PostgreSQL's user can reach none of ${places.join(", ")}.`);
}
