import { formatNumber, formatSigned } from "@/lib/format/numbers";
import type { ExaminerFigures, RoundResults } from "@/lib/results/schema";
import { READINGS_FEW } from "@/lib/results/schema";

/** The kappas that enough readings stand behind, ascending. */
function soundKappas(results: RoundResults): number[] {
  return results.examiners
    .flatMap(({ figures: { kappa } }) => (kappa.ok && kappa.n >= READINGS_FEW ? [kappa.kappa.estimate] : []))
    .sort((a, b) => a - b);
}

export function medianOf(ascending: readonly number[]): number | undefined {
  const middle = (ascending.length - 1) / 2;
  const [low, high] = [ascending[Math.floor(middle)], ascending[Math.ceil(middle)]];
  return low === undefined || high === undefined ? undefined : (low + high) / 2;
}

export function medianKappa(results: RoundResults): number | undefined {
  return medianOf(soundKappas(results));
}

/** What the numbers say, in two to four sentences. */
export function resultsStandfirst(results: RoundResults): string {
  const kappas = soundKappas(results);
  const median = medianOf(kappas);
  const [lowest, highest] = [kappas[0], kappas.at(-1)];
  const sentences: string[] = [];
  if (median === undefined || lowest === undefined || highest === undefined) {
    sentences.push(`Nobody has ${READINGS_FEW} readings in this round, so no kappa is said.`);
  } else {
    sentences.push(
      `Median kappa against the reference is ${formatNumber(median, 2)}, from ${formatNumber(lowest, 2)} to ${formatNumber(highest, 2)}.`,
    );
    sentences.push(belowFloor(kappas, results.kappaFloor));
  }
  const { size } = results.panel;
  if (size.ok) {
    sentences.push(
      `Where the direction agrees, sizes are read ${formatSigned(size.bias.estimate)}° from the reference on average, and 95 % of the differences lie between ${formatSigned(size.lower.estimate)}° and ${formatSigned(size.upper.estimate)}°.`,
    );
  }
  return sentences.join(" ");
}

function belowFloor(kappas: readonly number[], floor: number): string {
  const count = kappas.filter((kappa) => kappa < floor).length;
  const name = `the department’s floor of ${formatNumber(floor, 2)}`;
  if (count === 0) return `Nobody lies under ${name}.`;
  return count === 1 ? `One examiner lies under ${name}.` : `${count} examiners lie under ${name}.`;
}

/** Why pairs are missing from a figure in degrees, for the line under a plot. */
export function leftOutLabels(leftOut: ExaminerFigures["horizontal"]["leftOut"]) {
  return [
    { label: "not read", count: leftOut.unread },
    { label: "not readable", count: leftOut.notReadable },
    { label: "beyond the limbus", count: leftOut.beyondLimbus },
    { label: "aligned or other direction", count: leftOut.otherDirection },
  ].filter(({ count }) => count > 0);
}
