import { describeFinding } from "@/lib/reflex/describe-finding";
import type { Finding } from "@/lib/reflex/finding";

export type MapFindings = { reference?: Finding; own?: Finding; others: readonly Finding[] };

/** Who found the photograph not readable: there is no place to draw them, so they are counted in words. */
export function describeUnreadable({ reference, own, others }: MapFindings): string | null {
  const who: string[] = [];
  if (reference?.readable === false) who.push("the reference");
  if (own?.readable === false) who.push("you");
  const count = others.filter((finding) => !finding.readable).length;
  if (count > 0) who.push(`${count} of ${others.length} others`);
  return who.length === 0 ? null : `Not readable: ${who.join(", ")}.`;
}

/** The map in a few sentences, for those who do not see it. */
export function describeMap(title: string, { reference, own, others }: MapFindings): string {
  const parts = [`${title}.`];
  if (reference) parts.push(`Reference: ${describeFinding(reference)}`);
  if (own) parts.push(`You: ${describeFinding(own)}`);
  if (others.length > 0) {
    const said = groupFindings(others).map(({ text, count }) => `${count} × ${text.replace(/\.$/, "")}`);
    parts.push(`${others.length} others: ${said.join("; ")}.`);
  }
  return parts.join(" ");
}

/** Equal findings together, the most frequent first. */
export function groupFindings(findings: readonly Finding[]): { text: string; count: number }[] {
  const counts = new Map<string, number>();
  for (const finding of findings) {
    const text = describeFinding(finding);
    counts.set(text, (counts.get(text) ?? 0) + 1);
  }
  return [...counts].map(([text, count]) => ({ text, count })).sort((a, b) => b.count - a.count);
}
