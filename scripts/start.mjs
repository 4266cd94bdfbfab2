import { setTimeout as sleep } from "node:timers/promises";
import { askHolder, takeLock } from "./lock.mjs";
import { checkNode, ensureDebianPackages, ensureNodePackages, loadEnvFile, ROOT, SetupError } from "./setup.mjs";

// npm start, and npm run dev with the argument "dev". Plain JavaScript until what the rest needs is installed.
const mode = process.argv[2] === "dev" ? "dev" : "start";
let status = { mode, state: "starting" };

/** One start for each checkout. Answers false after saying where the other one is to be found. */
async function becomeTheOne() {
  let told = "";
  const tell = (line) => {
    if (line !== told) console.log(line);
    told = line;
  };
  for (;;) {
    if (await takeLock("run", ROOT, () => status)) return true;
    const other = await askHolder("run", ROOT);
    if (other?.address && other.state !== "stopping") {
      const doing = other.state === "running" ? "is already running" : "is already being started";
      console.log(`Evenglint ${doing} from this folder: ${other.address} (process ${other.pid})`);
      return false;
    }
    if (other?.state === "stopping") tell(`Waiting for process ${other.pid}, which is stopping.`);
    if (other?.state === "starting") tell(`Waiting for process ${other.pid}, which is still getting ready.`);
    await sleep(300);
  }
}

try {
  process.chdir(ROOT);
  checkNode();
  loadEnvFile();
  if (await becomeTheOne()) {
    if (!process.env.DATABASE_URL) await ensureDebianPackages(["postgresql-15"]);
    await ensureNodePackages();
    (await import("tsx/esm/api")).register();
    const { serve } = await import("./serve.ts");
    await serve(mode, process.env.npm_lifecycle_event !== undefined, (news) => {
      status = { ...status, ...news };
    });
  }
} catch (error) {
  console.error(error instanceof SetupError ? error.message : error);
  process.exit(1);
}
