import { type ChildProcess, spawn } from "node:child_process";
import { closeSync, openSync, readFileSync } from "node:fs";
import { setTimeout as sleep } from "node:timers/promises";

export type RunAs = { uid: number; gid: number };

export type TiedOptions = {
  /** How messages call it: "The worker ended unexpectedly". */
  name: string;
  command: [program: string, ...args: string[]];
  cwd: string;
  env: NodeJS.ProcessEnv;
  runAs?: RunAs;
  /** Where its output goes, after what is there already; "inherit" for ours. */
  output: { logFile: string } | "inherit";
  /** What the kernel sends it when our process ends without stopping it. */
  signalWhenOrphaned?: "KILL" | "INT" | "TERM";
};

export type TiedProcess = {
  name: string;
  child: ChildProcess;
  /** Settles with a sentence about how it ended. Never rejects. */
  ended: Promise<string>;
  /** Where its log is, and how it ends: for a message about a failure. */
  recentOutput(): string;
};

/**
 * Starts a process that never outlives ours: should ours be killed, the kernel ends it (setpriv is part of every Debian).
 * It has a session of its own, so that Ctrl-C reaches us alone and we stop everything in order.
 */
export function startTied(options: TiedOptions): TiedProcess {
  const { name, output } = options;
  const logFile = output === "inherit" ? undefined : output.logFile;
  const log = logFile === undefined ? undefined : openSync(logFile, "a");
  const sink = log ?? "inherit";
  const child = spawn("setpriv", ["--pdeathsig", options.signalWhenOrphaned ?? "KILL", "--", ...options.command], {
    cwd: options.cwd,
    env: options.env,
    stdio: ["ignore", sink, sink],
    detached: true,
    ...options.runAs,
  });
  if (log !== undefined) closeSync(log);
  const ended = new Promise<string>((resolve) => {
    child.once("error", (error) => resolve(`${name} could not be started: ${error.message}`));
    child.once("exit", (code, signal) => resolve(`${name} ended with ${signal ?? `code ${code}`}`));
  });
  const recentOutput = () => (logFile === undefined ? "" : endOf(logFile));
  return { name, child, ended, recentOutput };
}

function endOf(logFile: string): string {
  const lines = readFileSync(logFile, "utf8").trim().split("\n").slice(-40);
  return `The end of ${logFile}:\n${lines.join("\n")}`;
}

export function hasEnded({ child }: TiedProcess): boolean {
  return child.pid === undefined || child.exitCode !== null || child.signalCode !== null;
}

/** Asks a process to end, and insists when it has not after the grace. */
export async function stopTied(tied: TiedProcess, graceMs = 10_000): Promise<void> {
  if (hasEnded(tied)) return;
  tied.child.kill("SIGTERM");
  await Promise.race([tied.ended, sleep(graceMs, undefined, { ref: false })]);
  if (!hasEnded(tied)) tied.child.kill("SIGKILL");
  await tied.ended;
}

/** Runs a process to its end. Throws with the end of its log when it fails. */
export async function runTied(options: TiedOptions): Promise<void> {
  const tied = startTied(options);
  const ending = await tied.ended;
  if (tied.child.exitCode !== 0) throw new Error(`${ending}.\n${tied.recentOutput()}`.trim());
}
