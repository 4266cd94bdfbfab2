import {
  cpSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { keepLocalState } from "@/scripts/local-state";

describe("keepLocalState", () => {
  let folder = "";
  let checkout = "";
  beforeEach(() => {
    folder = mkdtempSync(path.join(tmpdir(), "evenglint-state-"));
    checkout = path.join(folder, "checkout");
    mkdirSync(checkout);
  });
  afterEach(() => rmSync(folder, { recursive: true }));
  /** As if the checkout were where PostgreSQL's user cannot get to. */
  const moveClusterOutside = () => {
    const file = path.join(checkout, ".local/state.json");
    const outside = path.join(folder, "outside");
    writeFileSync(file, JSON.stringify({ ...JSON.parse(readFileSync(file, "utf8")), clusterFolder: outside }));
    return outside;
  };

  it("makes secrets once, which nobody else may read", () => {
    const state = keepLocalState(checkout, undefined);
    expect(keepLocalState(checkout, undefined)).toEqual(state);
    expect(statSync(path.join(checkout, ".local/state.json")).mode & 0o777).toBe(0o600);
    const secrets = [state.databasePassword, state.nextauthSecret, state.s3AccessKeyId, state.s3SecretAccessKey];
    expect(new Set(secrets).size).toBe(4);
    expect(Math.min(...secrets.map((secret) => secret.length))).toBeGreaterThanOrEqual(32);
  });
  it("keeps the cluster in the checkout, and with it when it is moved", () => {
    const { clusterFolder, ...secrets } = keepLocalState(checkout, undefined);
    expect(clusterFolder).toBe(path.join(checkout, ".local/postgres"));
    const moved = path.join(folder, "moved");
    renameSync(checkout, moved);
    const clusterMoved = path.join(moved, ".local/postgres");
    expect(keepLocalState(moved, undefined)).toEqual({ ...secrets, checkout: moved, clusterFolder: clusterMoved });
  });
  it("keeps a cluster outside the checkout when that is moved", () => {
    keepLocalState(checkout, undefined);
    const outside = moveClusterOutside();
    const moved = path.join(folder, "moved");
    renameSync(checkout, moved);
    expect(keepLocalState(moved, undefined).clusterFolder).toBe(outside);
  });
  // Two starts would otherwise stop each other's server.
  it("gives a copy of a checkout a cluster of its own", () => {
    keepLocalState(checkout, undefined);
    const outside = moveClusterOutside();
    const copy = path.join(folder, "copy");
    cpSync(checkout, copy, { recursive: true });
    expect(keepLocalState(copy, undefined).clusterFolder).not.toBe(outside);
    expect(keepLocalState(checkout, undefined).clusterFolder).toBe(outside);
    expect(existsSync(path.join(checkout, ".local/state.json"))).toBe(true);
  });
});
