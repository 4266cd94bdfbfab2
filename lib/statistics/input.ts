import { InputError } from "./result";

/** Readings in the order given; null where there is none. */
export type Readings = readonly (number | null)[];

/** One row for each subject, one column for each rater; null, or a row that ends early, where there is no rating. */
export type Ratings = readonly Readings[];

/** Of a confidence, or of any other share that cannot be all or nothing. */
export function requireConfidence(share: number, name = "confidence"): void {
  if (!(share > 0 && share < 1)) {
    throw new InputError(`${name} lies between 0 and 1, for example 0.95; got ${share}.`);
  }
}

export function requireFinite(values: Readings, name: string): void {
  values.forEach((value, index) => {
    if (value !== null && !Number.isFinite(value)) {
      throw new InputError(`${name}[${index}] is not a finite number: ${value}.`);
    }
  });
}

export function requirePositive(value: number, name: string): void {
  if (!(value > 0 && Number.isFinite(value))) throw new InputError(`${name} is positive and finite; got ${value}.`);
}

export function requireWhole(value: number, name: string, least: number): void {
  if (!(Number.isSafeInteger(value) && value >= least)) {
    throw new InputError(`${name} is a whole number from ${least}; got ${value}.`);
  }
}

/** The values that are there. Throws InputError on NaN and infinities. */
export function presentReadings(values: Readings, name: string): number[] {
  requireFinite(values, name);
  return values.filter((value) => value !== null);
}

/**
 * The pairs in which both readings are there: a gap in one drops the pair, never only that array's own place.
 * Throws InputError on unequal lengths, NaN and infinities.
 */
export function pairReadings(first: Readings, second: Readings): [number, number][] {
  if (first.length !== second.length) {
    throw new InputError(`Paired readings need equal lengths; got ${first.length} and ${second.length}.`);
  }
  requireFinite(first, "first");
  requireFinite(second, "second");
  const pairs: [number, number][] = [];
  first.forEach((a, index) => {
    const b = second[index] ?? null;
    if (a !== null && b !== null) pairs.push([a, b]);
  });
  return pairs;
}

/** The rows in which every rater (as many as the longest row has) gave a rating, copied. */
export function completeRows(ratings: Ratings): number[][] {
  const raterCount = ratings.reduce((most, row) => Math.max(most, row.length), 0);
  return ratings.map((row, index) => presentReadings(row, `row ${index}`)).filter((row) => row.length === raterCount);
}
