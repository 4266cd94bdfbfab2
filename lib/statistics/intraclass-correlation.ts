import { fQuantile, fTails } from "./f-distribution";
import { completeRows, type Ratings, requireConfidence } from "./input";
import { type Estimate, type Result, refuse } from "./result";
import { analyseTwoWay } from "./two-way";

/** F, its degrees of freedom and p test a coefficient of 0; `f` and `p` are left out where F would divide by 0. */
export type Coefficient = Estimate & { f?: number; df1: number; df2: number; p?: number };

/** 1: other raters for each subject; 2: raters are a sample; 3: these raters only; k: the mean of all instead of one. */
export type IntraclassCorrelations = Partial<
  Record<"icc11" | "icc21" | "icc31" | "icc1k" | "icc2k" | "icc3k", Coefficient>
>;

/**
 * The six intraclass correlations of Shrout & Fleiss, with F tests and intervals.
 *
 * Shape: one row for each subject, one column for each rater; only complete rows are used, and `n` counts them.
 * A coefficient, a test or a bound whose denominator is not positive is left out, the rest stands; nothing is clipped.
 * Refuses fewer than two complete rows, one rater, and readings that are all the same. Throws InputError on bad numbers.
 * Source: Shrout & Fleiss (1979) Psychol Bull 86: 420-428; interval of icc2k by Spearman-Brown from that of icc21.
 */
export function intraclassCorrelation(
  matrix: Ratings,
  { confidence = 0.95 }: { confidence?: number } = {},
): Result<IntraclassCorrelations> {
  requireConfidence(confidence);
  const table = completeRows(matrix);
  const n = table.length;
  const k = table[0]?.length ?? 0;
  if (n < 2) return refuse(n, n === 0 ? "no row is complete" : "fewer than two complete rows");
  if (k < 2) return refuse(n, "fewer than two raters");
  const { rows, columns, residual } = analyseTwoWay(table);
  if (rows + columns + residual === 0) return refuse(n, "all readings are the same");

  const squares: MeanSquares = {
    rows: rows / (n - 1),
    columns: columns / (k - 1),
    residual: residual / ((n - 1) * (k - 1)),
    within: (columns + residual) / (n * (k - 1)),
  };
  const oneWay = testOf(squares.rows, squares.within, n - 1, n * (k - 1));
  const twoWay = testOf(squares.rows, squares.residual, n - 1, (n - 1) * (k - 1));
  const oneWayRange = rangeOfRatio(oneWay, confidence);
  const twoWayRange = rangeOfRatio(twoWay, confidence);
  const sampleRange = rangeOfSample(squares, n, k, confidence);
  const single = (ratio: number) => (ratio - 1) / (ratio + k - 1);
  const average = (ratio: number) => 1 - 1 / ratio;
  const spearmanBrown = (r: number) => (r > -1 / (k - 1) ? (k * r) / (1 + (k - 1) * r) : Number.NaN);
  const { rows: msr, columns: msc, residual: mse, within: msw } = squares;
  // Below this a denominator is what rounding leaves of 0.
  const least = 1e-12 * (msr + msc + mse + msw);
  const coefficient = (numerator: number, denominator: number, test: Test, range: number[]) =>
    denominator > least ? coefficientOf(numerator / denominator, test, range) : undefined;
  const coefficients = {
    icc11: coefficient(msr - msw, msr + (k - 1) * msw, oneWay, oneWayRange.map(single)),
    icc21: coefficient(msr - mse, msr + (k - 1) * mse + (k * (msc - mse)) / n, twoWay, sampleRange),
    icc31: coefficient(msr - mse, msr + (k - 1) * mse, twoWay, twoWayRange.map(single)),
    icc1k: coefficient(msr - msw, msr, oneWay, oneWayRange.map(average)),
    icc2k: coefficient(msr - mse, msr + (msc - mse) / n, twoWay, sampleRange.map(spearmanBrown)),
    icc3k: coefficient(msr - mse, msr, twoWay, twoWayRange.map(average)),
  };
  return { ok: true, n, ...coefficients };
}

type MeanSquares = { rows: number; columns: number; residual: number; within: number };
type Test = Pick<Coefficient, "f" | "df1" | "df2" | "p">;

function testOf(numerator: number, denominator: number, df1: number, df2: number): Test {
  if (denominator === 0) return { df1, df2 };
  const f = numerator / denominator;
  return { f, df1, df2, p: fTails(f, df1, df2).upper };
}

function coefficientOf(estimate: number, test: Test, [low = Number.NaN, high = Number.NaN]: number[]): Coefficient {
  return { estimate, ...(Number.isFinite(low) && { low }), ...(Number.isFinite(high) && { high }), ...test };
}

/** Interval of the ratio of expected mean squares that F estimates. */
function rangeOfRatio({ f, df1, df2 }: Test, confidence: number): number[] {
  if (f === undefined) return [];
  const p = 0.5 + confidence / 2;
  return [f / fQuantile(p, df1, df2), f * fQuantile(p, df2, df1)];
}

/**
 * Interval of icc21, whose degrees of freedom Satterthwaite's formula gives. Written in mean squares rather than their
 * ratios, so that it stands when raters differ by constants only (residual 0).
 */
function rangeOfSample(squares: MeanSquares, n: number, k: number, confidence: number): number[] {
  const { rows: msr, columns: msc, residual: mse } = squares;
  const icc = (msr - mse) / (msr + (k - 1) * mse + (k * (msc - mse)) / n);
  const ofColumns = k * icc * msc;
  const ofResidual = (n * (1 + (k - 1) * icc) - k * icc) * mse;
  const df = ((k - 1) * (n - 1) * (ofColumns + ofResidual) ** 2) / ((n - 1) * ofColumns ** 2 + ofResidual ** 2);
  if (!(df > 0 && Number.isFinite(df))) return [];
  const p = 0.5 + confidence / 2;
  const spread = k * msc + (k * n - k - n) * mse;
  const lower = fQuantile(p, n - 1, df);
  const upper = fQuantile(p, df, n - 1);
  return [
    (n * (msr - lower * mse)) / (lower * spread + n * msr),
    (n * (upper * msr - mse)) / (spread + n * upper * msr),
  ];
}
