/** A label along one direction, in px: where its centre wants to be and how much room it takes. */
export type LabelWish = { centre: number; size: number };

type Block = { members: number[]; centre: number; size: number };

/**
 * Centres for labels that must not overlap: each as near to its wish as the others allow, in the order of the wishes,
 * inside `from` to `to` as long as they fit there at all.
 */
export function spreadLabels(wishes: readonly LabelWish[], from: number, to: number, gap = 2): number[] {
  const order = wishes.map((_, i) => i).sort((a, b) => (wishes[a]?.centre ?? 0) - (wishes[b]?.centre ?? 0));
  const blocks: Block[] = [];
  for (const index of order) {
    const wish = wishes[index];
    if (!wish) continue;
    blocks.push(keepInside({ members: [index], centre: wish.centre, size: wish.size }, from, to));
    mergeOverlaps(blocks, from, to, gap);
  }
  const centres = wishes.map((wish) => wish.centre);
  for (const block of blocks) {
    let edge = block.centre - block.size / 2;
    for (const index of block.members) {
      const size = wishes[index]?.size ?? 0;
      centres[index] = edge + size / 2;
      edge += size + gap;
    }
  }
  return centres;
}

/** Joins the last block with those before it for as long as they overlap. */
function mergeOverlaps(blocks: Block[], from: number, to: number, gap: number): void {
  for (;;) {
    const last = blocks.at(-1);
    const before = blocks.at(-2);
    if (!last || !before || last.centre - last.size / 2 >= before.centre + before.size / 2 + gap) return;
    const [b, l] = [before.members.length, last.members.length];
    const centre = (before.centre * b + last.centre * l) / (b + l);
    const joined = { members: [...before.members, ...last.members], centre, size: before.size + gap + last.size };
    blocks.splice(-2, 2, keepInside(joined, from, to));
  }
}

function keepInside(block: Block, from: number, to: number): Block {
  const half = block.size / 2;
  return { ...block, centre: Math.max(from + half, Math.min(to - half, block.centre)) };
}

/** Which labels along an axis to write so that none overlap. The last is always kept: the latest round matters most. */
export function keepReadable(wishes: readonly LabelWish[], gap = 8): boolean[] {
  const kept = wishes.map(() => false);
  let limit = Number.POSITIVE_INFINITY;
  for (let i = wishes.length - 1; i >= 0; i -= 1) {
    const wish = wishes[i];
    if (!wish || wish.centre + wish.size / 2 > limit) continue;
    kept[i] = true;
    limit = wish.centre - wish.size / 2 - gap;
  }
  return kept;
}

/** The text, or as much of it as fits with an ellipsis. `measure` answers the width of a text in px. */
export function fitText(text: string, widthMax: number, measure: (text: string) => number): string {
  if (measure(text) <= widthMax) return text;
  for (let length = text.length - 1; length > 0; length -= 1) {
    const shorter = `${text.slice(0, length).trimEnd()}…`;
    if (measure(shorter) <= widthMax) return shorter;
  }
  return "…";
}
