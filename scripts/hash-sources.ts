import { createHash } from "node:crypto";
import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";

/** What a build is made of. Files beside these (tests, scripts, documents) do not change it. */
const FOLDERS = ["app", "components", "db", "fonts", "lib", "public"];
const FILES = /^(next\.config|postcss\.config|proxy|instrumentation|instrumentation-client)\.(mjs|ts)$/;
const LISTS = ["package.json", "package-lock.json", "tsconfig.json"];

/** One number for all sources of the application; it changes when one of them does, or is renamed, added or removed. */
export function hashSources(root: string): string {
  const top = readdirSync(root, { withFileTypes: true });
  const files = top
    .flatMap((entry) => {
      if (entry.isDirectory()) return FOLDERS.includes(entry.name) ? filesBelow(root, entry.name) : [];
      return FILES.test(entry.name) || LISTS.includes(entry.name) ? [entry.name] : [];
    })
    .sort();
  const hash = createHash("sha256");
  for (const file of files) {
    const content = createHash("sha256")
      .update(readFileSync(path.join(root, file)))
      .digest("hex");
    hash.update(`${content} ${file}\n`);
  }
  return hash.digest("hex");
}

function filesBelow(root: string, folder: string): string[] {
  return readdirSync(path.join(root, folder), { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.relative(root, path.join(entry.parentPath, entry.name)));
}
