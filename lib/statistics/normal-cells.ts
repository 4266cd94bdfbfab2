import { normalCdf } from "./normal";

/**
 * The probabilities of a standard normal in `count` cells of equal width from `start` upwards, each with its own relative
 * accuracy. What lies beyond `reach` on either side counts as impossible: with less to be summed a chain is solved faster.
 */
export function normalCells(start: number, width: number, count: number, reach: number): Float64Array {
  const cells = new Float64Array(count);
  let [from, tailFrom] = [start, tailBeyond(start, reach)];
  for (let cell = 0; cell < count; cell += 1) {
    const to = start + (cell + 1) * width;
    const tailTo = tailBeyond(to, reach);
    if (from > 0) cells[cell] = tailFrom - tailTo;
    else cells[cell] = to < 0 ? tailTo - tailFrom : 1 - tailFrom - tailTo;
    [from, tailFrom] = [to, tailTo];
  }
  return cells;
}

function tailBeyond(edge: number, reach: number): number {
  return Math.abs(edge) > reach ? 0 : normalCdf(-Math.abs(edge));
}
