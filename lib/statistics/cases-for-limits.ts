import { exactLimitFactors } from "./exact-limit-factors";
import { requireConfidence, requirePositive } from "./input";
import type { LimitOptions } from "./limits-of-agreement";
import { normalQuantile } from "./normal";
import { InputError } from "./result";

const CASES_MIN = 3;
const CASES_MAX = 1e9;

/**
 * How many cases it takes to place a limit of agreement to ± `halfWidth`, for differences of the expected `sd`.
 *
 * `n` is the smallest number whose exact interval (Carkeet 2015) is on average no wider each way; never below three.
 * Throws InputError on sizes that are not positive, and on a half-width that would take more than a milliard cases.
 */
export function casesForLimits(options: LimitOptions & { halfWidth: number; sd: number }): { ok: true; n: number } {
  const { halfWidth, sd, coverage = 0.95, confidence = 0.95 } = options;
  requirePositive(halfWidth, "halfWidth");
  requirePositive(sd, "sd");
  requireConfidence(coverage, "coverage");
  requireConfidence(confidence);
  const wished = halfWidth / sd;
  const suffices = (n: number) => {
    const { inner, outer } = exactLimitFactors(n, coverage, confidence);
    return (outer - inner) / 2 <= wished;
  };
  // Large-sample guess, (z/wished)²·(1 + z²/2), then a bracket around it and halving.
  const limit = normalQuantile(0.5 + coverage / 2);
  const guess = (normalQuantile(0.5 + confidence / 2) / wished) ** 2 * (1 + limit ** 2 / 2);
  if (!(guess < CASES_MAX)) throw new InputError(`A half-width of ${halfWidth} would take more than a milliard cases.`);
  let enough = Math.max(CASES_MIN, Math.ceil(guess));
  let tooFew = CASES_MIN - 1;
  let reach = 1;
  while (!suffices(enough)) {
    tooFew = enough;
    enough += reach;
    reach *= 2;
  }
  for (reach = 4; enough - reach > tooFew && suffices(enough - reach); reach *= 2) enough -= reach;
  tooFew = Math.max(tooFew, enough - reach);
  while (enough - tooFew > 1) {
    const middle = Math.floor((enough + tooFew) / 2);
    if (suffices(middle)) enough = middle;
    else tooFew = middle;
  }
  return { ok: true, n: enough };
}
