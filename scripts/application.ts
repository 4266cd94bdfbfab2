import path from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { hasEnded, runTied, startTied, type TiedProcess } from "../db/server/tied-process";
import { inheritedEnv } from "../lib/env";
import { ROOT } from "./paths";

/** Services and tasks are marked server-only, a package that under this condition lets itself be imported. */
const SERVER_SCRIPT = ["--import", "tsx", "--conditions=react-server"];
const READY_TIMEOUT_MS = 120_000;

type Settings = Record<string, string>;
type Output = { logFile: string } | "inherit";

/** Brings the database to the newest shape. Throws with what went wrong. */
export function migrateDatabase(settings: Settings, output: Output): Promise<void> {
  return runTied(script("The migration", ["--import", "tsx", "scripts/migrate.ts"], settings, output));
}

/** Fills in the demo, unless it is there. Throws with what went wrong. */
export function seedDatabase(settings: Settings, output: Output): Promise<void> {
  return runTied(script("Filling in the demo", [...SERVER_SCRIPT, "scripts/seed.ts"], settings, output));
}

export function startWorker(settings: Settings, output: Output): TiedProcess {
  return startTied(script("The worker", [...SERVER_SCRIPT, "scripts/worker.ts"], settings, output));
}

/** Starts Next.js on loopback: the production build, or from the sources with hot reload. */
export function startWeb(mode: "start" | "dev", port: number, settings: Settings, output: Output): TiedProcess {
  const next = path.join(ROOT, "node_modules/next/dist/bin/next");
  const args = [next, mode, "--hostname", "127.0.0.1", "--port", String(port)];
  const env = { ...settings, NODE_ENV: mode === "dev" ? "development" : "production" };
  // In development Next.js is two processes, of which the first ends the second when it is asked to end. In production
  // it would wait for open connections, with the port that the next start wants.
  const signalWhenOrphaned = mode === "dev" ? "TERM" : "KILL";
  return startTied({ ...script("The application", args, env, output), signalWhenOrphaned });
}

/** Waits until something answers, a refusal too: then the server is there. Throws with the end of its log. */
export async function waitUntilAnswering(web: TiedProcess, port: number): Promise<void> {
  const deadline = Date.now() + READY_TIMEOUT_MS;
  while (!(await answers(port))) {
    if (hasEnded(web)) throw new Error(`${await web.ended}.\n${web.recentOutput()}`);
    if (Date.now() > deadline) throw new Error(`The application does not answer.\n${web.recentOutput()}`);
    await sleep(100);
  }
}

function answers(port: number): Promise<boolean> {
  const address = `http://127.0.0.1:${port}/`;
  return fetch(address, { redirect: "manual", signal: AbortSignal.timeout(READY_TIMEOUT_MS) }).then(
    () => true,
    () => false,
  );
}

function script(name: string, args: string[], settings: Settings, output: Output) {
  const env = inheritedEnv({ NODE_ENV: "production", ...settings });
  const command: [string, ...string[]] = [process.execPath, ...args];
  return { name, command, cwd: ROOT, env, output };
}
