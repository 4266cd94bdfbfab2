import { sum } from "./count-tables";
import { codeRatings, countByCategory, type Label, type LabelRatings } from "./labels";
import { type Result, refuse } from "./result";

export type CaseDisagreement = {
  /** The label most often given, the first ascending where several are (`tied`). */
  modal: Label;
  tied: boolean;
  /** The part of the readings that gave the modal label. */
  share: number;
  /** How scattered the labels are, in bits: 0 when all agree, 1 for two labels half and half. */
  entropy: number;
  /** No label has more than half of the readings. Common practice, no source. */
  split: boolean;
};

/**
 * Which cases split the panel: for each case the label most examiners gave, and how much the others differ.
 *
 * Shape: cases × examiners, `null` = missing; `cases[i]` is row i, and its `n` counts that case's readings. A case that
 * nobody read is refused by itself. `n` counts the cases with a reading. Throws InputError for labels that are neither
 * strings nor finite numbers.
 * Source: entropy Shannon, Bell System Technical Journal 1948; 27: 379-423.
 */
export function caseDisagreement(labels: LabelRatings): Result<{ cases: Result<CaseDisagreement>[] }> {
  const coded = codeRatings(labels);
  const cases = countByCategory(coded).map((counts) => describeCase(counts, coded.categories));
  const n = cases.filter(({ ok }) => ok).length;
  return n > 0 ? { ok: true, n, cases } : refuse(0, "no readings");
}

function describeCase(counts: readonly number[], categories: readonly Label[]): Result<CaseDisagreement> {
  const n = sum(counts);
  const most = Math.max(...counts);
  const modal = categories[counts.indexOf(most)];
  if (n === 0 || modal === undefined) return refuse(0, "no readings");
  const used = counts.filter((count) => count > 0);
  return {
    ok: true,
    n,
    modal,
    tied: counts.filter((count) => count === most).length > 1,
    share: most / n,
    entropy: sum(used.map((count) => (count / n) * Math.log2(n / count))),
    split: 2 * most <= n,
  };
}
