import { formatSigned } from "@/lib/format/numbers";
import { ERROR_KINDS } from "@/lib/reflex/error-kind";
import type { Scorecard } from "@/lib/results/schema";

const NUMBERS = ["no", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine", "ten"];

/** What happened in this round, in two or three sentences. The reading is described, never the person. */
export function scorecardStandfirst({ figures }: Scorecard): string {
  const agreed = figures.confusion.counts.reduce((sum, row, index) => sum + (row[index] ?? 0), 0);
  const sentences = [`Your direction agrees with the reference on ${agreed} of ${figures.readCount} cases.`];
  const { limits } = figures.size;
  if (limits.ok) {
    sentences.push(
      `Where it agrees, you read sizes ${formatSigned(limits.bias.estimate)}° from the reference on average.`,
    );
  }
  const frequent = ERROR_KINDS.filter((kind) => (figures.errorCounts[kind] ?? 0) > 0)
    .sort((a, b) => (figures.errorCounts[b] ?? 0) - (figures.errorCounts[a] ?? 0))
    .slice(0, 3)
    .map((kind) => `${kind} (${NUMBERS[figures.errorCounts[kind] ?? 0] ?? figures.errorCounts[kind]})`);
  if (frequent.length > 0) sentences.push(`Most often: ${frequent.join(", ")}.`);
  return sentences.join(" ");
}
