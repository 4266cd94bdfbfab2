import { mkdirSync, mkdtempSync, renameSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { hashSources } from "@/scripts/hash-sources";

describe("hashSources", () => {
  let root = "";
  const write = (file: string, content: string) => {
    mkdirSync(path.dirname(path.join(root, file)), { recursive: true });
    writeFileSync(path.join(root, file), content);
  };
  beforeEach(() => {
    root = mkdtempSync(path.join(tmpdir(), "evenglint-sources-"));
    write("app/rounds/page.tsx", "a page");
    write("lib/round.ts", "a rule");
    write("package-lock.json", "{}");
  });
  afterEach(() => rmSync(root, { recursive: true }));

  it("stays the same while the sources do", () => {
    const before = hashSources(root);
    write("app/rounds/page.tsx", "a page");
    expect(hashSources(root)).toBe(before);
  });
  it.each(["app/rounds/page.tsx", "lib/round.ts", "package-lock.json", "next.config.mjs", "proxy.ts", "public/a.svg"])(
    "changes with %s",
    (file) => {
      const before = hashSources(root);
      write(file, "something else");
      expect(hashSources(root)).not.toBe(before);
    },
  );
  it("changes when a file is renamed or removed", () => {
    const before = hashSources(root);
    renameSync(path.join(root, "lib/round.ts"), path.join(root, "lib/item.ts"));
    const renamed = hashSources(root);
    rmSync(path.join(root, "lib/item.ts"));
    expect(new Set([before, renamed, hashSources(root)]).size).toBe(3);
  });
  it("tells where one file ends and the next begins", () => {
    write("lib/a.ts", "one");
    write("lib/b.ts", "two");
    const before = hashSources(root);
    write("lib/a.ts", "two");
    write("lib/b.ts", "one");
    expect(hashSources(root)).not.toBe(before);
  });
  it("does not change with tests, documents and what a build itself makes", () => {
    const before = hashSources(root);
    for (const file of ["tests/unit/a.test.ts", "README.md", ".next/app.js", "node_modules/a/index.js"])
      write(file, "x");
    expect(hashSources(root)).toBe(before);
  });
});
