import { InputError } from "./result";

/** What an examiner called a case. Beside it, `null` says that there is no reading. */
export type Label = string | number;

/** Subjects × raters. A row may be shorter than the others: what it lacks is missing, as `null` is. */
export type LabelRatings = readonly (readonly (Label | null)[])[];

/** Ratings as positions in `categories`: `codes[subject][rater]`, every row full, -1 where there is no reading. */
export type CodedRatings = { categories: Label[]; codes: number[][]; raterCount: number };

const MISSING = -1;

/** Numbers by size, then strings by code unit, so that the order is the same on every machine and in every locale. */
function compareLabels(a: Label, b: Label): number {
  if (typeof a === "number" && typeof b === "number") return a - b;
  if (typeof a === typeof b) return a < b ? -1 : 1;
  return typeof a === "number" ? -1 : 1;
}

function requireLabel(label: unknown): void {
  if (typeof label === "string" || Number.isFinite(label)) return;
  throw new InputError(`A label is a string or a finite number, and null where there is no reading; got ${label}.`);
}

/** The labels in use, ascending: the categories of a table when none are offered. */
export function labelsUsed(readings: Iterable<Label | null>): Label[] {
  const used = new Set<Label>();
  for (const label of readings) if (label !== null) used.add(label);
  for (const label of used) requireLabel(label);
  return [...used].sort(compareLabels);
}

/** A function from label to its position among the categories offered; null goes to -1, a label not offered throws. */
export function positionIn(categories: readonly Label[]): (label: Label | null) => number {
  const positions = new Map(categories.map((category, position) => [category, position]));
  for (const category of categories) requireLabel(category);
  if (positions.size < categories.length) throw new InputError("Each category is offered once.");
  return (label) => {
    if (label === null) return MISSING;
    const position = positions.get(label);
    if (position !== undefined) return position;
    requireLabel(label);
    throw new InputError(`The label "${label}" is not among the categories offered.`);
  };
}

/** Turns labels into positions once, so that what follows counts instead of comparing strings. */
export function codeRatings(ratings: LabelRatings, offered?: readonly Label[]): CodedRatings {
  if (!ratings.every(Array.isArray)) throw new InputError("Ratings are rows: one array for each subject.");
  const categories = [...(offered ?? labelsUsed(ratings.flat()))];
  const position = positionIn(categories);
  const raterCount = ratings.reduce((widest, row) => Math.max(widest, row.length), 0);
  const codes = ratings.map((row) => {
    const coded = new Array<number>(raterCount).fill(MISSING);
    row.forEach((label, rater) => {
      coded[rater] = position(label);
    });
    return coded;
  });
  return { categories, codes, raterCount };
}

/** Subjects × categories: how many ratings of each category a subject had. */
export function countByCategory({ categories, codes }: CodedRatings): number[][] {
  return codes.map((row) => {
    const counts = new Array<number>(categories.length).fill(0);
    for (const code of row) if (code !== MISSING) counts[code] = (counts[code] ?? 0) + 1;
    return counts;
  });
}
