export type Bench = { run: () => void | Promise<void> };

const BATCH_MS = 2;
const BATCHES_MIN = 3;
const BUDGET_MS = 250;

/**
 * Milliseconds that one call takes: the median over batches of calls, so that other work on the machine disturbs little.
 * The first call warms up and says how many calls make a batch worth timing.
 */
export function measureMs(work: () => unknown): number {
  work();
  const calls = Math.max(1, Math.ceil(BATCH_MS / timeMs(work, 1)));
  const batches: number[] = [];
  let spentMs = 0;
  while (batches.length < BATCHES_MIN || spentMs < BUDGET_MS) {
    const batchMs = timeMs(work, calls);
    batches.push(batchMs / calls);
    spentMs += batchMs;
  }
  return batches.toSorted((a, b) => a - b)[Math.floor(batches.length / 2)] ?? Number.NaN;
}

function timeMs(work: () => unknown, calls: number): number {
  const start = performance.now();
  for (let call = 0; call < calls; call += 1) work();
  return performance.now() - start;
}

/** Time and operations per second, in columns of fixed width. */
export function formatSpeed(milliseconds: number): string {
  const perSecond = 1000 / milliseconds;
  const time = milliseconds.toFixed(milliseconds < 10 ? 3 : 1);
  return `${time.padStart(9)} ms ${perSecond.toFixed(perSecond < 10 ? 1 : 0).padStart(9)} /s`;
}
