import { spawn } from "node:child_process";
import { existsSync, mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { describe, expect, it, onTestFinished } from "vitest";
import { inheritedEnv } from "@/lib/env";
import { NO_ENGINE } from "@/tests/support/database-server";

/** Runs the launcher as a test run would, where neither the environment nor a home folder leads to an engine. */
async function launch(home: string): Promise<string> {
  const script = `import { startDatabaseServer } from "./tests/support/database-server";
    await startDatabaseServer("/nowhere").catch((error) => console.log(error.message));`;
  const child = spawn(process.execPath, ["--import", "tsx", "--input-type=module", "-e", script], {
    env: inheritedEnv({
      TEST_DATABASE: "container",
      DOCKER_HOST: "tcp://127.0.0.1:9",
      HOME: home,
      XDG_RUNTIME_DIR: home,
      NODE_ENV: "test",
    }),
    stdio: ["ignore", "pipe", "inherit"],
  });
  let output = "";
  for await (const text of child.stdout.setEncoding("utf8")) output += text;
  return output.trim();
}

// The usual socket is tried whatever the settings say, so with an engine behind it there is nothing to see.
describe.skipIf(existsSync("/var/run/docker.sock"))("TEST_DATABASE=container", () => {
  it("says in one sentence that no Docker engine answers", async () => {
    const home = mkdtempSync(path.join(tmpdir(), "evenglint-home-"));
    onTestFinished(() => rmSync(home, { recursive: true }));
    expect(await launch(home)).toBe(NO_ENGINE);
    expect(NO_ENGINE.match(/[.!?]/g)).toHaveLength(1);
  });
});
