import { linearRegression } from "simple-statistics";
import { robustLocationScale, theilSen, twoWayBias, zScores } from "@/lib/statistics";
import { CREOSOTE_1998, JUDGES_1979, ONE_OUTLIER } from "./examples";
import { known, present, type WorkedExample } from "./worked-example";

const CREOSOTE_DATA = "Means of nine laboratories, creosote oil: ISO 5725-5:1998.";

export function theilSenExample(): WorkedExample {
  const { x, y } = ONE_OUTLIER;
  const { slope, intercept } = known(theilSen(x, y));
  const leastSquares = linearRegression(x.map((value, index) => [value, y[index] ?? Number.NaN]));
  return {
    data: "Ten constructed points near a line of slope 1, one of them wild. Recomputed with R and SciPy.",
    tables: [
      {
        caption: "Points",
        heads: ["x", "y"],
        rows: x.map((value, i) => ({ cells: [value, y[i] ?? null] })),
        isLong: true,
      },
    ],
    figures: [
      { label: "Theil–Sen slope", value: slope.estimate, digits: 2, recomputed: 1 },
      { label: "Theil–Sen intercept", value: intercept, digits: 2, recomputed: 1.1 },
      { label: "Slope by least squares", value: leastSquares.m, digits: 2 },
    ],
    note: "The one wild value pulls least squares away from the line and leaves the Theil–Sen slope where it was.",
  };
}

export function robustMeanExample(): WorkedExample {
  const { location, scale, uncertainty } = known(robustLocationScale(CREOSOTE_1998));
  return {
    data: CREOSOTE_DATA,
    tables: [
      {
        caption: "Means, %",
        heads: ["laboratory", "mean, %"],
        rows: CREOSOTE_1998.map((value, laboratory) => ({ head: `${laboratory + 1}`, cells: [value] })),
        isLong: true,
      },
    ],
    figures: [
      { label: "Robust mean", value: location, digits: 3, recomputed: 20.4121429 },
      { label: "Robust SD", value: scale, digits: 3, recomputed: 1.0698397 },
      { label: "Standard uncertainty of the mean", value: uncertainty, digits: 3, recomputed: 0.4457665 },
    ],
    note: "Recomputed with R, iterated to convergence; a printed example of the iterations was not at hand.",
  };
}

export function zScoresExample(): WorkedExample {
  const { location, scale, uncertainty } = known(robustLocationScale(CREOSOTE_1998));
  const plain = known(zScores(CREOSOTE_1998, { assigned: location, sd: scale })).scores;
  const widened = known(zScores(CREOSOTE_1998, { assigned: location, sd: scale, uncertainty })).scores;
  const states = { in: "within", warning: "warning", action: "action" };
  return {
    data: `${CREOSOTE_DATA} Scored against their own robust mean and SD.`,
    tables: [
      {
        caption: "Scores",
        heads: ["mean, %", "z", "state", "z′", "state"],
        rows: CREOSOTE_1998.map((value, index) => ({
          head: `${value}`,
          cells: [plain[index], widened[index]].flatMap((score) =>
            score ? [score.z.toFixed(2).replace("-", "−"), states[score.state]] : [null, null],
          ),
        })),
        isLong: true,
      },
    ],
    figures: [
      { label: "z of 24.14", value: present(plain[0]).z, digits: 2, recomputed: 3.4845007 },
      { label: "z of 17.57", value: present(plain[5]).z, digits: 2, recomputed: -2.6566062 },
      { label: "z′ of 24.14", value: present(widened[0]).z, digits: 2 },
    ],
    note: "With the uncertainty of the mean taken in, the score is smaller: some of the distance may be the mean’s.",
  };
}

export function twoWayBiasExample(): WorkedExample {
  const readings = JUDGES_1979.flatMap((row, target) =>
    row.map((difference, judge) => ({ examiner: judge + 1, case: target + 1, difference })),
  );
  // Taken away so that judge 1, who scores high, has not read the two targets that score highest.
  const unequal = readings.filter(({ examiner, case: target }) => examiner !== 1 || (target !== 3 && target !== 5));
  const whole = known(twoWayBias(readings));
  const part = known(twoWayBias(unequal));
  const left = unequal.filter(({ examiner }) => examiner === 1).map(({ difference }) => difference);
  const effectOf = (result: typeof whole, judge: number) =>
    present(present(result.examiners.find(({ examiner }) => examiner === judge)).effect).estimate;
  const meanOf = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;
  return {
    data: "The ratings of Shrout & Fleiss (1979), taken as differences from a reference: judges as examiners, targets as cases.",
    figures: [
      { label: "Residual mean square", value: present(whole.residualSd) ** 2, digits: 2, printed: 1.02 },
      { label: "Judge 1, effect", value: effectOf(whole, 1), digits: 2, recomputed: 2.375 },
      { label: "Judge 2, effect", value: effectOf(whole, 2), digits: 2, recomputed: -67 / 24 },
      { label: "Judge 1, effect without targets 3 and 5", value: effectOf(part, 1), digits: 2 },
      {
        label: "The same as plain mean less the mean of all",
        value: meanOf(left) - meanOf(unequal.map(({ difference }) => difference)),
        digits: 2,
      },
    ],
    note: "Recomputed here means from the row and column means, which a full table allows. Once two targets are missing, the plain mean charges judge 1 with easier targets and the effect does not.",
  };
}
