import { mkdirSync, readFileSync, rmSync } from "node:fs";
import path from "node:path";
import { countTests } from "./count-tests.mjs";
import {
  checkNode,
  ensureDebianPackages,
  ensureNodePackages,
  loadEnvFile,
  ROOT,
  SetupError,
  succeeds,
} from "./setup.mjs";

// npm test: installs what is missing, then type check, lint and every test. The last line counts them all.
const node = (script, ...args) => succeeds([process.execPath, path.join(ROOT, "node_modules", script), ...args]);

async function setUp() {
  process.chdir(ROOT);
  checkNode();
  loadEnvFile();
  const server = process.env.TEST_DATABASE === "container" ? [] : ["postgresql-15"];
  await ensureDebianPackages([...server, "chromium"]);
  await ensureNodePackages();
}

async function runVitest() {
  const folder = path.join(ROOT, ".local/test");
  const file = path.join(folder, "vitest.json");
  mkdirSync(folder, { recursive: true });
  rmSync(file, { force: true });
  const reporters = ["--reporter=default", "--reporter=json", `--outputFile.json=${file}`];
  const passed = await node("vitest/vitest.mjs", "run", ...reporters);
  let report = null;
  try {
    report = JSON.parse(readFileSync(file, "utf8"));
  } catch {} // vitest did not get as far, which counts as a failure
  return countTests(report, passed);
}

try {
  await setUp();
  console.log("Type check");
  // Next.js makes the types of the routes first.
  const isTyped = (await node("next/dist/bin/next", "typegen")) && (await node("typescript/bin/tsc", "--noEmit"));
  console.log("Lint");
  const isClean = await node("@biomejs/biome/bin/biome", "ci", ".");
  const tests = await runVitest();
  const checks = [isTyped, isClean];
  const passed = tests.passed + checks.filter((isGood) => isGood).length;
  const failed = tests.failed + checks.filter((isGood) => !isGood).length;
  if (!isTyped) console.log("The type check failed.");
  if (!isClean) console.log("The lint failed.");
  if (tests.skipped > 0) console.log(`${tests.skipped} skipped`);
  console.log(`${passed} passed, ${failed} failed`);
  process.exitCode = failed > 0 ? 1 : 0;
} catch (error) {
  console.error(error instanceof SetupError ? error.message : error);
  process.exitCode = 1;
}
