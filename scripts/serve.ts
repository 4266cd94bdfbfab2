import { releaseAbandonedJobs } from "../db/server/release-abandoned-jobs";
import { stopTied, type TiedProcess } from "../db/server/tied-process";
import { launchEnv } from "../lib/env";
import { migrateDatabase, seedDatabase, startWeb, startWorker, waitUntilAnswering } from "./application";
import { buildApplication } from "./build-application";
import { choosePort } from "./choose-port";
import { startLocalServices } from "./local-services";
import { newLog } from "./paths";
import { npmGone, Services } from "./services";
import { signInLines } from "./sign-in-lines";

type Mode = "start" | "dev";
type Announce = (state: { state: "starting" | "running" | "stopping"; address?: string }) => void;

/** Starts everything on this machine and keeps it running until it is told to stop. Does not return by itself. */
export async function serve(mode: Mode, isFromNpm: boolean, announce: Announce): Promise<void> {
  const services = new Services(() => announce({ state: "stopping" }));
  services.stopOnSignals();
  if (isFromNpm) void npmGone().then(() => services.stop(0));
  try {
    await startEverything(mode, services, announce);
  } catch (error) {
    services.fail(error instanceof Error ? error.message : error);
  }
}

async function startEverything(mode: Mode, services: Services, announce: Announce): Promise<void> {
  const wanted = launchEnv();
  const port = await choosePort(wanted.PORT);
  const address = wanted.NEXTAUTH_URL ?? `http://localhost:${port}`;
  announce({ state: "starting", address });
  const { settings, hasOwnDatabase } = await startLocalServices(services.add);
  settings.NEXTAUTH_URL = address;
  await migrateDatabase(settings, { logFile: newLog("migrate") });
  // People with a password that everybody knows have no place in a database that was brought along, unless asked for.
  const hasDemo = wanted.DEMO === undefined ? hasOwnDatabase : wanted.DEMO === "yes";
  if (hasDemo) {
    console.log("Filling in the demo, where it is not there yet");
    await seedDatabase(settings, { logFile: newLog("seed") });
  }
  // Nobody but the worker started below uses our own database, so whatever is held is held by one that was killed.
  if (hasOwnDatabase && settings.DATABASE_URL) await releaseAbandonedJobs(settings.DATABASE_URL);
  if (mode === "start") await buildApplication();
  const output = (name: string) => (mode === "dev" ? "inherit" : { logFile: newLog(name) });
  const keep = (tied: TiedProcess) => {
    const ended = tied.ended.then((ending) => `${ending}. ${tied.recentOutput()}`);
    services.add({ ended, stop: () => stopTied(tied) });
    return tied;
  };
  keep(startWorker(settings, output("worker")));
  await waitUntilAnswering(keep(startWeb(mode, port, settings, output("web"))), port);
  announce({ state: "running", address });
  console.log(`\nEvenglint is ready at ${address}\n`);
  if (hasDemo) console.log(`${signInLines().join("\n")}\n`);
  console.log("Ctrl-C stops it; the data stay.");
}
