import type { Factor } from "./reduced-equations";

/** A factor with its levels in order of appearance, and how many entries each has. */
export type NamedFactor<Level> = Factor & { levels: { level: Level; n: number }[] };

export function numberLevels<Level>(entries: readonly Level[]): NamedFactor<Level> {
  const numbers = new Map<Level, number>();
  const levels: { level: Level; n: number }[] = [];
  const codes = entries.map((level) => {
    const known = numbers.get(level);
    const number = known ?? levels.push({ level, n: 0 }) - 1;
    if (known === undefined) numbers.set(level, number);
    const entry = levels[number];
    if (entry) entry.n += 1;
    return number;
  });
  return { count: levels.length, codes, levels };
}
