import { mean } from "simple-statistics";
import { type Fitted, fitAdditive } from "./additive-fit";
import { numberLevels } from "./factor-levels";
import { requireConfidence, requireFinite } from "./input";
import { symmetricInterval } from "./intervals";
import { isConnected } from "./is-connected";
import type { Factor } from "./reduced-equations";
import { type Estimate, InputError, type Result, refuse } from "./result";
import { sumOfSquares, withoutCancellation, withoutRounding } from "./rounding";
import { studentQuantile } from "./student";

type Level = string | number;

/** One reading minus its reference, signed; null where there is none. `round` on all readings or on none. */
export type BiasReading = { examiner: Level; case: Level; round?: Level; difference: number | null };

export type TwoWayBias = {
  /** The mean difference if every examiner had read every case in every round. */
  mean: Estimate;
  /** SD of a single reading about what examiner, case and round lead one to expect; left out without spare readings. */
  residualSd?: number;
  df: number;
  /** `bias` is the examiner's own mean over all cases and rounds, `effect` how far that lies from the mean of the panel. */
  examiners: { examiner: Level; n: number; effect?: Estimate; bias: Estimate }[];
  cases: { case: Level; n: number; effect?: Estimate }[];
  /** Empty when the readings name no round. */
  rounds: { round: Level; n: number; effect?: Estimate }[];
};

/**
 * Bias of each examiner, freed from which cases and rounds each happened to read: effects of examiner, case and round,
 * each adding up to zero over its levels, with every level weighing the same however many readings it has.
 *
 * Shape: one entry for each reading, in any order and number; entries without a difference do not count. Levels come back
 * in order of appearance, with `n` readings each; a factor with one level has no effect. Units: those of the differences.
 * Standard errors are those of reading error: cases, examiners and rounds are taken as they are. Intervals by t on `df`.
 * Refuses without a difference and where the table falls apart: readings that share no case, or rounds that share none,
 * cannot be compared (leave `round` out then). Throws InputError on bad numbers and on rounds named for some readings only.
 * Source: least squares of the unbalanced crossed classification without interaction, Searle (1971) Linear Models.
 */
export function twoWayBias(
  differences: readonly BiasReading[],
  { confidence = 0.95 }: { confidence?: number } = {},
): Result<TwoWayBias> {
  requireConfidence(confidence);
  const readings = presentDifferences(differences);
  const n = readings.length;
  if (n === 0) return refuse(0, "no differences");
  const values = readings.map((reading) => reading.difference);
  const examiners = numberLevels(readings.map((reading) => reading.examiner));
  const cases = numberLevels(readings.map((reading) => reading.case));
  const rounds = numberLevels(readings.flatMap((reading) => reading.round ?? []));
  const gap = findGap(examiners, cases, rounds);
  if (gap) return refuse(n, gap);
  const others = rounds.count > 0 ? [cases, rounds] : [cases];
  const fit = fitAdditive(values, examiners, others);
  if (!fit) return refuse(n, "the effects of examiners, cases and rounds cannot be told apart");

  const df = n - 1 - [examiners, ...others].reduce((sum, { count }) => sum + count - 1, 0);
  const residualSd = df > 0 ? Math.sqrt(sumOfResiduals(fit.residuals, values) / df) : Number.NaN;
  const factor = df > 0 ? studentQuantile(0.5 + confidence / 2, df) : Number.NaN;
  const estimate = ({ value, variance }: Fitted) =>
    symmetricInterval(value, residualSd * Math.sqrt(Math.max(0, variance)), factor);
  const effectOf = (effects: readonly Fitted[] = [], index: number) => {
    const effect = effects[index];
    return effect && effects.length > 1 ? { effect: estimate(effect) } : {};
  };
  return {
    ok: true,
    n,
    mean: estimate(fit.mean),
    ...(df > 0 && { residualSd }),
    df,
    examiners: examiners.levels.map(({ level, n: count }, i) => ({
      examiner: level,
      n: count,
      ...effectOf(fit.effects, i),
      bias: estimate(fit.means[i] ?? fit.mean),
    })),
    cases: cases.levels.map(({ level, n: count }, i) => ({
      case: level,
      n: count,
      ...effectOf(fit.otherEffects[0], i),
    })),
    rounds: rounds.levels.map(({ level, n: count }, i) => ({
      round: level,
      n: count,
      ...effectOf(fit.otherEffects[1], i),
    })),
  };
}

type PresentReading = BiasReading & { difference: number };

function presentDifferences(differences: readonly BiasReading[]): PresentReading[] {
  const named = differences.filter(({ round }) => round !== undefined).length;
  if (named > 0 && named < differences.length) throw new InputError("Name the round of every reading, or of none.");
  requireFinite(
    differences.map(({ difference }) => difference),
    "differences",
  );
  return differences.filter((reading): reading is PresentReading => reading.difference !== null);
}

/** Why the readings fall into parts that cannot be compared, if they do. */
function findGap(examiners: Factor, cases: Factor, rounds: Factor): string | undefined {
  if (!isConnected(examiners.codes, cases.codes)) return "groups of examiners share no case";
  if (rounds.count === 0) return undefined;
  if (!isConnected(cases.codes, rounds.codes)) return "groups of rounds share no case";
  if (!isConnected(examiners.codes, rounds.codes)) return "groups of rounds share no examiner";
  return undefined;
}

/** Squared residuals; 0 where they are rounding error of the values. */
function sumOfResiduals(residuals: readonly number[], values: readonly number[]): number {
  const center = mean(values);
  const total = withoutCancellation(sumOfSquares(values.map((value) => value - center)), sumOfSquares(values));
  return total === 0 ? 0 : withoutRounding(sumOfSquares(residuals), total);
}
