import { describe, expect, it } from "vitest";
import { countTests } from "@/scripts/count-tests.mjs";

const file = (status: string, ...tests: string[]) => ({
  status,
  assertionResults: tests.map((test) => ({ status: test })),
});

describe("countTests", () => {
  it("counts the tests of every file", () => {
    const report = { testResults: [file("failed", "passed", "failed"), file("passed", "passed", "pending", "todo")] };
    expect(countTests(report, false)).toEqual({ passed: 2, failed: 1, skipped: 2 });
  });
  // Each of these would otherwise end a broken run with "0 failed".
  it("counts a file that could not be loaded as a failed test", () => {
    expect(countTests({ testResults: [file("failed"), file("passed", "passed")] }, false)).toMatchObject({ failed: 1 });
  });
  it("counts a run without a report, and one that failed outside its tests, as a failed test", () => {
    expect(countTests(null, false)).toMatchObject({ passed: 0, failed: 1 });
    expect(countTests({ testResults: [file("passed", "passed")] }, false)).toMatchObject({ passed: 1, failed: 1 });
  });
});
