import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { checkNode, manualInstallMessage, missingDebianPackages, nodePackagesAreCurrent } from "@/scripts/setup.mjs";

describe("checkNode", () => {
  it.each(["20.19.0", "20.20.2"])("accepts Node.js %s", (version) => expect(() => checkNode(version)).not.toThrow());
  it.each(["18.20.4", "20.18.3", "22.11.0"])("says which one is needed on Node.js %s", (version) => {
    expect(() => checkNode(version)).toThrow(
      `Evenglint needs Node.js 20, version 20.19 or later; this is Node.js ${version}.`,
    );
  });
});

describe("missingDebianPackages", () => {
  it("names the packages whose program is not there", () => {
    const isThere = (file: string) => file === "/usr/bin/chromium";
    expect(missingDebianPackages(["postgresql-15", "chromium"], isThere)).toEqual(["postgresql-15"]);
  });
  it("leads to a message that can be copied into a terminal", () => {
    expect(manualInstallMessage(["postgresql-15", "chromium"], "").split("\n")).toContain(
      "  sudo apt-get update && sudo apt-get install -y --no-install-recommends postgresql-15 chromium",
    );
  });
});

describe("nodePackagesAreCurrent", () => {
  let root = "";
  const write = (file: string, packages: object) => {
    mkdirSync(path.dirname(path.join(root, file)), { recursive: true });
    writeFileSync(path.join(root, file), JSON.stringify({ packages }));
  };
  const wanted = {
    "": { name: "here" },
    "node_modules/knex": { version: "3.3.0" },
    "node_modules/other-platform": { version: "1.0.0", optional: true },
  };
  beforeEach(() => {
    root = mkdtempSync(path.join(tmpdir(), "evenglint-packages-"));
    write("package-lock.json", wanted);
  });
  afterEach(() => rmSync(root, { recursive: true }));

  it("is false before anything is installed, or when an installation did not get to its end", () => {
    expect(nodePackagesAreCurrent(root)).toBe(false);
    mkdirSync(path.join(root, "node_modules/knex"), { recursive: true });
    expect(nodePackagesAreCurrent(root)).toBe(false);
  });
  it("is true when everything is there that this platform needs", () => {
    write("node_modules/.package-lock.json", { "node_modules/knex": { version: "3.3.0" } });
    expect(nodePackagesAreCurrent(root)).toBe(true);
  });
  it("is false once package-lock.json asks for another version or one more package", () => {
    write("node_modules/.package-lock.json", { "node_modules/knex": { version: "3.3.0" } });
    write("package-lock.json", { ...wanted, "node_modules/knex": { version: "3.4.0" } });
    expect(nodePackagesAreCurrent(root)).toBe(false);
    write("package-lock.json", { ...wanted, "node_modules/pg": { version: "8.0.0" } });
    expect(nodePackagesAreCurrent(root)).toBe(false);
  });
});
