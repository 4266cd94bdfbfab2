import { spawn } from "node:child_process";
import { cpSync, existsSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { Client } from "pg";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { type Cluster, type ClusterOptions, ensureDatabase, startCluster } from "@/db/server/cluster";
import { makeTemporaryFolder, postgresUser } from "@/db/server/postgres-user";
import { testEnv } from "@/lib/env";

/** What a person's data go through when starts are killed. Debian's server itself, so not where it may be absent. */
describe.skipIf(testEnv().TEST_DATABASE === "container")("startCluster", { timeout: 120_000 }, () => {
  let options: ClusterOptions;
  let running: Cluster[] = [];
  const start = async (changes: Partial<ClusterOptions> = {}) => {
    const cluster = await startCluster({ ...options, ...changes });
    running.push(cluster);
    return cluster;
  };
  const query = async (cluster: Cluster, statement: string) => {
    const client = new Client({ connectionString: cluster.url("evenglint") });
    await client.connect();
    const { rows } = await client.query(statement);
    await client.end();
    return rows;
  };
  const keepOneRow = async (cluster: Cluster) => {
    await ensureDatabase(cluster, "evenglint");
    await query(cluster, "CREATE TABLE kept AS SELECT 'still here' AS row");
  };
  beforeEach(() => {
    const runAs = postgresUser();
    const folder = makeTemporaryFolder(runAs, [tmpdir(), "/var/tmp", "/tmp"]);
    options = { folder, runAs, password: "for-this-test", isDurable: false };
  });
  afterEach(async () => {
    await Promise.all(running.map((cluster) => cluster.stop()));
    running = [];
    rmSync(options.folder, { recursive: true, force: true });
  });
  const processOf = () => Number(readFileSync(path.join(options.folder, "data/postmaster.pid"), "utf8").split("\n")[0]);

  it("keeps data and port from start to start", async () => {
    const first = await start();
    await keepOneRow(first);
    await first.stop();
    const second = await start();
    await ensureDatabase(second, "evenglint");
    expect(await query(second, "SELECT row FROM kept")).toEqual([{ row: "still here" }]);
    expect(second.port).toBe(first.port);
  });
  it("takes over from a server that was left running, and after one that was killed", async () => {
    await keepOneRow(await start());
    const left = processOf();
    const second = await start();
    expect(processOf()).not.toBe(left);
    process.kill(processOf(), "SIGKILL");
    await second.ended;
    expect(await query(await start(), "SELECT row FROM kept")).toEqual([{ row: "still here" }]);
  });
  it("is not kept from starting by another program that has its old process number", async () => {
    const first = await start();
    await keepOneRow(first);
    const file = path.join(options.folder, "data/postmaster.pid");
    const content = readFileSync(file, "utf8").split("\n");
    await first.stop();
    const other = spawn("sleep", ["60"], { ...options.runAs }); // of another user it would not count
    writeFileSync(file, [other.pid, ...content.slice(1)].join("\n"));
    expect(await query(await start(), "SELECT row FROM kept")).toEqual([{ row: "still here" }]);
    other.kill();
  });
  it("makes the cluster anew when making it was cut short", async () => {
    cpSync("/etc/hostname", path.join(options.folder, "data.unfinished/PG_VERSION"));
    await ensureDatabase(await start(), "evenglint");
    expect(existsSync(path.join(options.folder, "data.unfinished"))).toBe(false);
  });
  it("says what to do when its password is no longer known", async () => {
    await (await start()).stop();
    await expect(start({ password: "another" })).rejects.toThrow("Put back .local/state.json, or remove that folder");
  });
  it("lets nobody in without the password", async () => {
    const cluster = await start();
    const address = new URL(cluster.url("postgres"));
    address.password = "wrong";
    await expect(new Client({ connectionString: address.href }).connect()).rejects.toMatchObject({ code: "28P01" });
  });
  it("ends with the process that started it, however that ends", async () => {
    const script = `import { startCluster } from "./db/server/cluster";
      await startCluster(${JSON.stringify(options)}); console.log("started"); setInterval(() => {}, 1000);`;
    const starter = spawn(process.execPath, ["--import", "tsx", "--input-type=module", "-e", script]);
    await new Promise((resolve) => starter.stdout.once("data", resolve));
    const server = processOf();
    starter.kill("SIGKILL");
    for (let turn = 0; turn < 100 && existsSync(`/proc/${server}`); turn++) await sleep(100);
    expect(existsSync(`/proc/${server}`)).toBe(false);
  });
});
