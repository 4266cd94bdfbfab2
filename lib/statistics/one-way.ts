import { mean } from "simple-statistics";
import { sumOfSquares, withoutCancellation, withoutRounding } from "./rounding";

/** One-way analysis of variance: sums of squares and degrees of freedom between and within groups. */
export type OneWay = {
  mean: number;
  between: { sumOfSquares: number; df: number };
  within: { sumOfSquares: number; df: number };
};

/** Shape: one array of finite numbers for each group, of any sizes, none of them empty, at least one group. */
export function analyseOneWay(groups: readonly (readonly number[])[]): OneWay {
  const values = groups.flat();
  const center = mean(values);
  let between = 0;
  let within = 0;
  for (const group of groups) {
    const groupMean = mean(group);
    between += group.length * (groupMean - center) ** 2;
    within += sumOfSquares(group.map((value) => value - groupMean));
  }
  const total = withoutCancellation(between + within, sumOfSquares(values));
  const part = (sum: number, df: number) => ({ sumOfSquares: total === 0 ? 0 : withoutRounding(sum, total), df });
  return {
    mean: center,
    between: part(between, groups.length - 1),
    within: part(within, values.length - groups.length),
  };
}
