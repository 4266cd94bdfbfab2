import { mkdirSync } from "node:fs";
import path from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { freePort } from "../db/server/free-port";
import { hasEnded, startTied, stopTied } from "../db/server/tied-process";
import { inheritedEnv } from "../lib/env";

export type FakeS3Keys = { accessKeyId: string; secretAccessKey: string };

/** The settings that lead the application to the stand-in. */
export type FakeS3Settings = Record<
  "S3_ENDPOINT" | "S3_REGION" | "S3_BUCKET" | "S3_ACCESS_KEY_ID" | "S3_SECRET_ACCESS_KEY",
  string
>;

export type FakeS3 = { settings: FakeS3Settings; ended: Promise<string>; stop(): Promise<void> };

/** Starts the stand-in in a process of its own (s3rver catches every uncaught error) and waits until it answers. */
export async function startFakeS3(folder: string, logFile: string, keys: FakeS3Keys): Promise<FakeS3> {
  const port = await freePort();
  const settings = {
    S3_ENDPOINT: `http://127.0.0.1:${port}`,
    S3_REGION: "us-east-1",
    S3_BUCKET: "evenglint",
    S3_ACCESS_KEY_ID: keys.accessKeyId,
    S3_SECRET_ACCESS_KEY: keys.secretAccessKey,
  };
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const server = startTied({
    name: "The S3 stand-in",
    command: [process.execPath, "--import", "tsx", path.join(import.meta.dirname, "server.ts"), folder, String(port)],
    cwd: path.resolve(import.meta.dirname, ".."),
    env: inheritedEnv(settings),
    output: { logFile },
  });
  const deadline = Date.now() + 30_000;
  while (!(await answers(settings.S3_ENDPOINT))) {
    if (hasEnded(server)) throw new Error(`${await server.ended}.\n${server.recentOutput()}`);
    if (Date.now() > deadline) throw new Error(`The S3 stand-in does not answer.\n${server.recentOutput()}`);
    await sleep(50);
  }
  return { settings, ended: server.ended, stop: () => stopTied(server) };
}

async function answers(address: string): Promise<boolean> {
  return fetch(address).then(
    () => true,
    () => false,
  );
}
