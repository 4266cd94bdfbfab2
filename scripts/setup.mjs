import { spawn } from "node:child_process";
import { existsSync, readFileSync } from "node:fs";
import path from "node:path";
import { waitForLock } from "./lock.mjs";

/** What runs before anything is installed: plain JavaScript that needs Node.js alone. */
export const ROOT = path.resolve(import.meta.dirname, "..");

/** A failure with a message that says all there is to say. */
export class SetupError extends Error {
  name = "SetupError";
}

export function checkNode(version = process.versions.node) {
  const [major = 0, minor = 0] = version.split(".").map(Number);
  if (major === 20 && minor >= 19) return;
  throw new SetupError(`Evenglint needs Node.js 20, version 20.19 or later; this is Node.js ${version}.`);
}

export function loadEnvFile() {
  process.env.NEXT_TELEMETRY_DISABLED = "1";
  const file = path.join(ROOT, ".env");
  if (existsSync(file)) process.loadEnvFile(file); // what is set already stays
}

const DEBIAN_PACKAGES = {
  "postgresql-15": "/usr/lib/postgresql/15/bin/initdb",
  chromium: "/usr/bin/chromium",
};

export function missingDebianPackages(wanted, isThere = existsSync) {
  return wanted.filter((name) => !isThere(DEBIAN_PACKAGES[name]));
}

export function manualInstallMessage(missing, reason) {
  return [
    `Evenglint needs Debian packages that are not installed: ${missing.join(", ")}. ${reason}`,
    "Run this once, then try again:",
    "",
    `  sudo apt-get update && sudo apt-get install -y --no-install-recommends ${missing.join(" ")}`,
    "",
  ].join("\n");
}

/** Runs a program to its end, without keyboard, and tells whether it succeeded. */
export function succeeds([program, ...args], output = "inherit") {
  return new Promise((resolve) => {
    const child = spawn(program, args, { cwd: ROOT, stdio: ["ignore", output, output] });
    child.on("error", () => resolve(false)); // there is no such program
    child.on("exit", (code) => resolve(code === 0));
  });
}

/** Installs what is missing where that is allowed; otherwise says exactly what to run. */
export async function ensureDebianPackages(wanted) {
  const missing = missingDebianPackages(wanted);
  if (missing.length === 0) return;
  const isRoot = process.getuid?.() === 0;
  if (!isRoot && !(await succeeds(["sudo", "-n", "true"], "ignore"))) {
    throw new SetupError(
      manualInstallMessage(missing, "Installing them here takes rights that this user does not have."),
    );
  }
  console.log(`Installing Debian packages: ${missing.join(", ")}`);
  const sudo = isRoot ? [] : ["sudo", "-n"];
  const apt = [...sudo, "env", "DEBIAN_FRONTEND=noninteractive", "apt-get", "-q", "-o", "DPkg::Lock::Timeout=300"];
  // A failing update (one mirror of several, say) need not keep the packages from being found.
  await succeeds([...apt, "update"]);
  await succeeds([...apt, "install", "-y", "--no-install-recommends", ...missing]);
  const still = missingDebianPackages(wanted);
  if (still.length > 0) throw new SetupError(manualInstallMessage(still, "Installing them here failed (see above)."));
}

/**
 * Whether node_modules holds what package-lock.json asks for. npm writes its own record of what it installed as the last
 * thing, so an installation that was interrupted does not count; packages for other platforms may be absent.
 */
export function nodePackagesAreCurrent(root = ROOT) {
  try {
    const read = (file) => JSON.parse(readFileSync(path.join(root, file), "utf8")).packages;
    const installed = read("node_modules/.package-lock.json");
    return Object.entries(read("package-lock.json")).every(
      ([where, entry]) => where === "" || entry.optional || installed[where]?.version === entry.version,
    );
  } catch {
    return false;
  }
}

export async function ensureNodePackages() {
  if (nodePackagesAreCurrent()) return;
  const lock = await waitForLock("install", ROOT, () => console.log("Waiting for another installation of packages."));
  try {
    if (nodePackagesAreCurrent()) return;
    console.log("Installing the packages of package-lock.json");
    // Building needs the development packages too, whatever NODE_ENV says.
    // No install scripts: every binary we use ships inside its package, and a compiler may not be there.
    const args = ["ci", "--include=dev", "--ignore-scripts", "--no-audit", "--no-fund", "--loglevel=error"];
    const { npm_execpath: npm } = process.env;
    const command = npm?.endsWith(".js") ? [process.execPath, npm] : ["npm"];
    // Ends with this process, however that ends: two installations at once would spoil each other's.
    const done = await succeeds(["setpriv", "--pdeathsig", "KILL", "--", ...command, ...args]);
    if (!done) throw new SetupError("The packages could not be installed: npm ci failed (see above).");
  } finally {
    await lock.release();
  }
}
