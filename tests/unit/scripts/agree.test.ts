import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, describe, expect, it } from "vitest";

const folder = mkdtempSync(path.join(tmpdir(), "agree-"));
afterAll(() => rmSync(folder, { recursive: true }));

function runAgree(text: string, ...args: string[]) {
  const file = path.join(folder, "readings.csv");
  writeFileSync(file, text);
  const command = ["--import", "tsx", "scripts/agree.ts", file, ...args];
  return spawnSync(process.execPath, command, { encoding: "utf8", cwd: path.resolve(import.meta.dirname, "../../..") });
}

describe("scripts/agree.ts", () => {
  it("prints a report that machines can read, and ends with 0", () => {
    const { stdout, stderr, status } = runAgree("subject,rater,value\n1,A,2\n1,B,2\n", "--scale", "interval", "--json");
    expect({ stderr, status }).toEqual({ stderr: "", status: 0 });
    expect(JSON.parse(stdout)).toMatchObject({ table: "values", examiners: ["A", "B"] });
  }, 60_000);

  it("says on the error stream what is wrong with a table, and ends with 2", () => {
    const { stdout, stderr, status } = runAgree("subject,rater,value\n1,A,two\n", "--scale", "interval");
    expect({ stdout, status }).toEqual({ stdout: "", status: 2 });
    expect(stderr).toContain("line 2, column value: ");
  }, 60_000);
});
