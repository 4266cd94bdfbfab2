import { spawn } from "node:child_process";
import { once } from "node:events";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { askHolder, takeLock, waitForLock } from "@/scripts/lock.mjs";

describe("takeLock", () => {
  let folder = "";
  beforeEach(() => {
    folder = mkdtempSync(path.join(tmpdir(), "evenglint-lock-"));
  });
  afterEach(() => rmSync(folder, { recursive: true }));

  it("is given to one at a time, and tells others what its holder says", async () => {
    let state = "starting";
    const lock = await takeLock("run", folder, () => ({ state }));
    expect(await takeLock("run", folder)).toBeNull();
    expect(await askHolder("run", folder)).toEqual({ pid: process.pid, state: "starting" });
    state = "running";
    expect(await askHolder("run", folder)).toEqual({ pid: process.pid, state: "running" });
    await lock?.release();
    expect(await askHolder("run", folder)).toBeNull();
    const again = await takeLock("run", folder);
    expect(again).not.toBeNull();
    await again?.release();
  });
  it("keeps other names and other folders free", async () => {
    const other = mkdtempSync(path.join(tmpdir(), "evenglint-lock-"));
    const locks = [await takeLock("run", folder), await takeLock("build", folder), await takeLock("run", other)];
    expect(locks).not.toContain(null);
    for (const lock of locks) await lock?.release();
    rmSync(other, { recursive: true });
  });
  it("is free again when its holder was killed", async () => {
    const script = `import { takeLock } from "./scripts/lock.mjs";
      await takeLock("run", ${JSON.stringify(folder)}); console.log("taken"); setInterval(() => {}, 1000);`;
    const holder = spawn(process.execPath, ["--input-type=module", "-e", script]);
    await once(holder.stdout, "data");
    expect(await takeLock("run", folder)).toBeNull();
    const waiting = waitForLock("run", folder);
    holder.kill("SIGKILL");
    const lock = await waiting;
    expect(await askHolder("run", folder)).toEqual({ pid: process.pid });
    await lock.release();
  });
});
