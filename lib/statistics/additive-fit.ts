import { sum } from "simple-statistics";
import { addAt, at, dotProduct, invertPositive, type Matrix, multiply } from "./matrix";
import { type Factor, reduceEquations, startOf } from "./reduced-equations";

/** A number and its variance in units of the residual variance. */
export type Fitted = { value: number; variance: number };

export type AdditiveFit = {
  mean: Fitted;
  /** What each level of the first factor would give on average if it met every level of the others equally often. */
  means: Fitted[];
  effects: Fitted[];
  otherEffects: Fitted[][];
  residuals: number[];
};

/**
 * Least squares of value = mean + one effect for each factor, the effects of each factor adding up to zero.
 *
 * Every level counts once, however many values it has: that keeps an unequal mix of the other factors out of an effect.
 * Each level has a value. Undefined when the effects cannot be told apart. The first factor is eliminated before solving,
 * so its size costs little; time is cubic in the levels of the others.
 * Source: reduced normal equations of the crossed classification without interaction, Searle (1971) Linear Models. Their
 * null space is one constant for each factor: 1 added to its block imposes the sum of zero, and 1/levels² taken off the
 * inverse leaves the Moore-Penrose inverse, which is the covariance of the effects.
 */
export function fitAdditive(
  values: readonly number[],
  first: Factor,
  others: readonly Factor[],
): AdditiveFit | undefined {
  const { levels, columns, matrix, right } = reduceEquations(values, first, others);
  addToBlocks(matrix, others, () => 1);
  const covariance = invertPositive(matrix);
  if (!covariance) return undefined;
  addToBlocks(covariance, others, (count) => -1 / count ** 2);

  const solution = multiply(covariance, right);
  // What the solution's error adds to a level's mean goes with its mix m as mᵀ·covariance·m.
  const spreads = levels.map(({ mix }) => multiply(covariance, mix));
  const meanMix = right.map((_, i) => sum(levels.map(({ mix }) => at(mix, i))) / first.count);
  const meanSpread = multiply(covariance, meanMix);
  const ownVariance = sum(levels.map(({ count }) => 1 / count)) / first.count ** 2;
  const means = levels.map(({ count, mean, mix }, level) => ({
    value: mean - dotProduct(mix, solution),
    variance: 1 / count + dotProduct(mix, spreads[level] ?? meanSpread),
  }));
  const mean = {
    value: sum(means.map(({ value }) => value)) / first.count,
    variance: ownVariance + dotProduct(meanMix, meanSpread),
  };
  const effects = levels.map(({ count, mix }, level) => {
    const ofMix = dotProduct(mix, spreads[level] ?? meanSpread) - 2 * dotProduct(mix, meanSpread);
    return {
      value: (means[level]?.value ?? 0) - mean.value,
      variance: (1 - 2 / first.count) / count + ofMix + mean.variance,
    };
  });
  const effectAt = (column: number) => ({ value: at(solution, column), variance: at(covariance[column], column) });
  const otherEffects = others.map(({ count }, factor) =>
    Array.from({ length: count }, (_, level) => effectAt(startOf(others, factor) + level)),
  );
  const residuals = values.map((value, i) => {
    let residual = value - (means[first.codes[i] ?? 0]?.value ?? 0);
    for (const column of columns) residual -= at(solution, column[i] ?? 0);
    return residual;
  });
  return { mean, means, effects, otherEffects, residuals };
}

/** Adds to every place of the diagonal block of each factor what its number of levels says. */
function addToBlocks(matrix: Matrix, factors: readonly Factor[], amountOf: (count: number) => number): void {
  factors.forEach(({ count }, factor) => {
    const start = startOf(factors, factor);
    for (const row of matrix.slice(start, start + count)) {
      for (let j = start; j < start + count; j += 1) addAt(row, j, amountOf(count));
    }
  });
}
