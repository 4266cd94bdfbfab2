import { formatCount, formatNumber } from "@/lib/format/numbers";
import { READINGS_FEW } from "@/lib/results/schema";
import { type Report, type Section, STATISTIC_TITLES, type Statistic } from "./report";

const NAME_WIDTH = 24;
const NOTHING =
  "Nothing to compare: there is neither a reference, nor a second examiner, nor a second reading of a case.";

/** A report as plain text for a terminal: one block a section, one paragraph a statistic, one line a figure. */
export function formatReport(report: Report): string {
  const sections = report.sections.map(formatSection);
  return [heading(report), ...(sections.length > 0 ? sections : [NOTHING])].join("\n\n");
}

function heading({ table, scale, caseCount, readingCount, examiners, rounds, hasReference }: Report): string {
  const kind = table === "findings" ? "Findings" : `Values on the ${scale} scale`;
  const counts = [
    formatCount(readingCount, "reading"),
    formatCount(examiners.length, "examiner"),
    formatCount(caseCount, "case"),
  ];
  if (rounds.length > 0) counts.push(formatCount(rounds.length, "round"));
  counts.push(hasReference ? "with a reference" : "without a reference");
  return `${kind}: ${counts.join(", ")}.\nIntervals are at 95 %; n is the number of cases or readings behind a figure.`;
}

function formatSection({ title, statistics }: Section): string {
  return [title, ...statistics.map(formatStatistic)].join("\n");
}

function formatStatistic({ statistic, of, variant, result, nOf }: Statistic): string {
  const { ok, n, reason, ...parts } = result;
  const name = [`${of}: ${STATISTIC_TITLES[statistic]}`, variant].filter(Boolean).join(", ");
  const few = statistic !== "errorKinds" && n < READINGS_FEW ? ", too few to say" : "";
  const count = nOf ? formatCount(n, nOf) : `n ${n}${few}`;
  if (!ok) return `  ${name}: cannot be computed, ${reason} (${count})`;
  return [`  ${name} (${count})`, ...formatParts(parts, "    ")].join("\n");
}

function formatParts(parts: object, indent: string): string[] {
  return Object.entries(parts).flatMap(([key, part]) => formatPart(toWords(key), key, part, indent));
}

function formatPart(name: string, key: string, part: unknown, indent: string): string[] {
  const text = key === "leftOut" ? formatLeftOut(part) : formatScalar(key, part);
  if (text) return [`${indent}${name.padEnd(NAME_WIDTH)} ${text}`];
  if (Array.isArray(part)) {
    return part.length === 0 ? [] : [`${indent}${name}`, ...part.map((item) => `${indent}  ${formatItem(item)}`)];
  }
  return isObject(part) && key !== "leftOut" ? [`${indent}${name}`, ...formatParts(part, `${indent}  `)] : [];
}

/** Nothing where nothing is left out. */
function formatLeftOut(part: unknown): string {
  if (!isObject(part)) return part === 0 ? "" : `${part} resamples that give no value`;
  const counts = Object.entries(part).filter(([, count]) => count !== 0);
  return counts.map(([reason, count]) => `${count} ${toWords(reason)}`).join(", ");
}

/** One entry of a list on one line: its names first, then its figures. */
function formatItem(item: unknown): string {
  if (!isObject(item)) return String(item);
  const { ok, reason, ...parts } = item;
  if (ok === false) return [...namesOf(parts), `cannot be computed, ${reason}`].join(": ");
  const figures = Object.entries(parts).flatMap(([key, part]) => {
    const text = typeof part === "string" && key !== "state" && key !== "modal" ? null : formatScalar(key, part);
    return text === null ? [] : [`${toWords(key)} ${text}`];
  });
  return [...namesOf(parts), figures.join(", ")].join(": ");
}

function namesOf(parts: Record<string, unknown>): string[] {
  return Object.entries(parts).flatMap(([key, part]) =>
    typeof part === "string" && key !== "state" && key !== "modal" ? [part] : [],
  );
}

/** A number, a figure with its interval, or a word; null for what needs lines of its own or is not there. */
function formatScalar(key: string, part: unknown): string | null {
  if (part === undefined) return null;
  if (part === null) return "none";
  if (typeof part === "string") return part;
  if (typeof part === "boolean") return part ? "yes" : "no";
  if (typeof part === "number") return key === "p" && part < 0.001 ? "below 0.001" : formatDigits(part);
  if (isFigure(part)) return formatFigure(part);
  return isRange(part) ? `${formatDigits(part.low)} to ${formatDigits(part.high)}` : null;
}

type Figure = { estimate: number; low?: number; high?: number; p?: number };

function formatFigure({ estimate, low, high, p }: Figure): string {
  const interval = low === undefined || high === undefined ? "" : ` (${formatDigits(low)} to ${formatDigits(high)})`;
  return `${formatDigits(estimate)}${interval}${p === undefined ? "" : `, p ${formatScalar("p", p)}`}`;
}

function formatDigits(value: number): string {
  if (Number.isInteger(value)) return formatNumber(value, 0);
  const size = Math.abs(value);
  return formatNumber(value, size >= 100 ? 1 : size >= 10 ? 2 : 3);
}

function isFigure(part: unknown): part is Figure {
  return isObject(part) && typeof part.estimate === "number";
}

function isRange(part: unknown): part is { low: number; high: number } {
  return isObject(part) && typeof part.low === "number" && typeof part.high === "number";
}

function isObject(part: unknown): part is Record<string, unknown> {
  return typeof part === "object" && part !== null && !Array.isArray(part);
}

const WORDS: Record<string, string> = {
  icc11: "ICC(1,1)",
  icc21: "ICC(2,1)",
  icc31: "ICC(3,1)",
  icc1k: "ICC(1,k)",
  icc2k: "ICC(2,k)",
  icc3k: "ICC(3,k)",
  residualSd: "residual SD",
  sd: "SD",
  withinSd: "SD within cases",
  pabak: "PABAK",
  standardErrorNull: "standard error at 0",
  roundsToSeeOneSigma: "rounds to see 1 sigma",
};

/** "standardErrorNull" as "standard error null". */
function toWords(key: string): string {
  return WORDS[key] ?? key.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
}
