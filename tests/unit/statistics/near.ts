import type { Estimate } from "@/lib/statistics/result";

/**
 * Matches a number within the tolerance of the reference files: |value − expected| ≤ max(1e-10, 1e-9·|expected|).
 * Stricter than `closeTo` on large numbers and on small ones, and usable inside `toMatchObject`.
 */
export function near(expected: number, relative = 1e-9, absolute = 1e-10) {
  const allowed = Math.max(absolute, relative * Math.abs(expected));
  return {
    asymmetricMatch: (actual: unknown) => typeof actual === "number" && Math.abs(actual - expected) <= allowed,
    toString: () => `near ${expected}`,
    toAsymmetricMatcher: () => `near ${expected} (± ${allowed})`,
  };
}

/** Matches another way to the same estimate: all of its parts near, and none that it lacks. */
export function nearEstimate(expected: Estimate) {
  return Object.fromEntries(Object.entries(expected).map(([part, value]) => [part, near(value)]));
}
