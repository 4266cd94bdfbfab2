import type { ItemKind, RoundDraft } from "./schema";

type Items = RoundDraft["items"];
type RepeatKind = Exclude<ItemKind, "first">;

/** Takes a case into a round, or out of it together with its repeats. */
export function toggleCase(items: Items, caseId: string): Items {
  const isIn = items.some((item) => item.caseId === caseId);
  return isIn ? items.filter((item) => item.caseId !== caseId) : [...items, { caseId, kind: "first" }];
}

export function countKind(items: Items, kind: ItemKind): number {
  return items.filter((item) => item.kind === kind).length;
}

/**
 * Sets how many cases are shown once more, as they are or mirrored. Repeats already chosen stay as far as the number
 * allows; new ones are drawn among the cases without any. There can be no more repeats than cases.
 *
 * `random` gives uniform numbers in [0, 1).
 */
export function setRepeats(items: Items, kind: RepeatKind, wanted: number, random: () => number): Items {
  const repeats = items.filter((item) => item.kind === kind);
  const others = items.filter((item) => item.kind !== kind);
  const kept = repeats.slice(0, wanted);
  const repeated = new Set([...others.filter((item) => item.kind !== "first"), ...kept].map(({ caseId }) => caseId));
  const pool = others.filter((item) => item.kind === "first" && !repeated.has(item.caseId));
  const added: Items = [];
  while (kept.length + added.length < wanted && pool.length > 0) {
    const [drawn] = pool.splice(Math.floor(random() * pool.length), 1);
    if (drawn) added.push({ caseId: drawn.caseId, kind });
  }
  return [...others, ...kept, ...added];
}
