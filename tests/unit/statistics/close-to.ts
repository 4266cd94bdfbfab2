import { expect } from "vitest";
import { near } from "./near";

/** Holds one number to the tolerance of `near`, so that a missing number fails too. */
export function expectClose(actual: number | undefined, expected: number, relative = 1e-9, absolute = 1e-10): void {
  expect(actual).toEqual(near(expected, relative, absolute));
}

/** Unwraps a result that must have succeeded, so that a refusal fails the test with its reason. */
export function expectOk<T extends { ok: true }>(result: T | { ok: false; n: number; reason: string }): T {
  if (!result.ok) expect.fail(`refused: ${result.reason}`);
  return result;
}
