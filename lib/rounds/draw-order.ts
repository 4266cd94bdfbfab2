/** One showing to be placed: `twin` is the same for all showings of one case. */
export type Showing = { id: string; twin: string };

const ATTEMPTS = 200;

/**
 * An order of reading for one examiner: every order as likely as any other in which showings of one case lie at least
 * a third of the round apart. Where chance finds none (rounds of a few items, or with many repeats), the order found
 * that keeps them furthest.
 *
 * `random` gives uniform numbers in [0, 1).
 */
export function drawOrder(showings: readonly Showing[], random: () => number): string[] {
  const gapWanted = Math.ceil(showings.length / 3);
  let best: { order: Showing[]; gap: number } | undefined;
  for (let attempt = 0; attempt < ATTEMPTS; attempt++) {
    const order = shuffle(showings, random);
    const gap = smallestGap(order);
    if (!best || gap > best.gap) best = { order, gap };
    if (best.gap >= gapWanted) break;
  }
  return (best?.order ?? []).map(({ id }) => id);
}

/** The least number of places between two showings of one case; Infinity when no case is shown twice. */
export function smallestGap(order: readonly Showing[]): number {
  const lastPlace = new Map<string, number>();
  let gap = Number.POSITIVE_INFINITY;
  order.forEach(({ twin }, place) => {
    const earlier = lastPlace.get(twin);
    if (earlier !== undefined) gap = Math.min(gap, place - earlier);
    lastPlace.set(twin, place);
  });
  return gap;
}

/** Fisher and Yates: each order equally likely. */
function shuffle<Item>(items: readonly Item[], random: () => number): Item[] {
  const pool = [...items];
  const order: Item[] = [];
  while (pool.length > 0) order.push(...pool.splice(Math.floor(random() * pool.length), 1));
  return order;
}
