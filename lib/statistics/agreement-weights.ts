import { InputError } from "./result";

/** How much a near miss counts as agreement: not at all, by steps apart, or by steps apart squared. */
export type Weighting = "none" | "linear" | "quadratic";

/**
 * Agreement weights between `size` ordered categories: 1 on the diagonal, and off it 0 (none), 1 − |i−j|/(q−1) (linear)
 * or 1 − ((i−j)/(q−1))² (quadratic). Source: Cohen, Psychological Bulletin 1968; 70: 213-220, in the form of
 * Fleiss & Cohen, Educational and Psychological Measurement 1973; 33: 613-619.
 */
export function agreementWeights(weighting: Weighting, size: number): number[][] {
  const weight = weightFunction(weighting, size - 1);
  return Array.from({ length: size }, (_, i) =>
    Array.from({ length: size }, (_, j) => (i === j ? 1 : weight(Math.abs(i - j)))),
  );
}

/** 1 less the agreement weights, row after row: what a disagreement costs, 0 on the diagonal. */
export function disagreementsFor(weighting: Weighting, size: number): Float64Array {
  return Float64Array.from(agreementWeights(weighting, size).flat(), (weight) => 1 - weight);
}

function weightFunction(weighting: Weighting, stepsMax: number): (steps: number) => number {
  switch (weighting) {
    case "none":
      return () => 0;
    case "linear":
      return (steps) => 1 - steps / stepsMax;
    case "quadratic":
      return (steps) => 1 - (steps / stepsMax) ** 2;
    default:
      throw new InputError(`weights are "none", "linear" or "quadratic"; got "${weighting}".`);
  }
}
