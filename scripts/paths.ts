import { existsSync, mkdirSync, renameSync } from "node:fs";
import path from "node:path";

export const ROOT = path.resolve(import.meta.dirname, "..");

/** Everything that a checkout keeps for itself: cluster, bucket, logs, secrets. Ignored by git. */
export const LOCAL = path.join(ROOT, ".local");

/** A new log. The one before is kept beside it, for whoever asks why it ended. */
export function newLog(name: string): string {
  const folder = path.join(LOCAL, "logs");
  mkdirSync(folder, { recursive: true });
  const file = path.join(folder, `${name}.log`);
  if (existsSync(file)) renameSync(file, path.join(folder, `${name}.previous.log`));
  return file;
}
