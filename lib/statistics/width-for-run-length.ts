import { requireLambda } from "./ewma";
import { ewmaRunLength } from "./ewma-run-length";
import { findRoot } from "./find-root";
import { logGap } from "./markov-run-length";
import { normalCdf, normalDensity } from "./normal";
import { InputError } from "./result";

/**
 * The width of steady EWMA limits, in standard deviations of the average, at which the chart signals by chance once in
 * `runLength` points on average (in control, both sides). Accurate to 1e-4 of itself.
 *
 * Throws InputError for a lambda outside (0, 1], and a run length that is not finite and above 1.
 * Source: inverse of `ewmaRunLength`.
 */
export function widthForRunLength({ lambda, runLength }: { lambda: number; runLength: number }): number {
  requireLambda(lambda);
  if (!(runLength > 1 && Number.isFinite(runLength))) {
    throw new InputError(`runLength is finite and above 1; got ${runLength}.`);
  }
  const near = findRoot((log) => Math.log(diffusionRunLength(lambda, Math.exp(log)) / runLength), 1, 0.5);
  const gap = (log: number) => logGap(ewmaRunLength({ lambda, width: Math.exp(log) }), runLength);
  return Math.exp(findRoot(gap, near, 0.01));
}

/**
 * A run length within some 5%, to start the search near its end: the chart as a continuous process (Ornstein-Uhlenbeck)
 * whose limits lie 0.583 steps further out, since a chart that is looked at now and then passes its limits unseen.
 * Source: mean exit time by integration; 0.583 from Siegmund, Sequential Analysis, 1985, chapter 10.
 */
function diffusionRunLength(lambda: number, width: number): number {
  const limit = width + 0.583 * Math.sqrt(lambda * (2 - lambda));
  const slice = limit / 64;
  let time = 0;
  for (let x = slice / 2; x < limit; x += slice) time += (slice * (normalCdf(x) - 0.5)) / normalDensity(x);
  return time / lambda;
}
