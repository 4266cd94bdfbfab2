const STEPS_MAX = 400;

/**
 * The zero of a monotone function, to the last digits: widens a bracket from `start`, then closes it.
 *
 * Infinite values of `f` (the logarithm of a tail that underflows) only send the search back to halving.
 * Source: Chandrupatla (1997), A new hybrid quadratic/bisection algorithm. Adv Eng Softw 28: 145-149.
 */
export function findRoot(f: (x: number) => number, start: number, width: number): number {
  const [low, high] = bracketRoot(f, start, width);
  return closeBracket(f, low, high);
}

function bracketRoot(f: (x: number) => number, start: number, width: number): [number, number] {
  const sign = Math.sign(f(start));
  if (sign === 0) return [start, start];
  let [left, right] = [start, start];
  let reach = width;
  for (let step = 0; step < STEPS_MAX; step += 1, reach *= 2) {
    if (Math.sign(f(left - reach)) !== sign) return [left - reach, left];
    if (Math.sign(f(right + reach)) !== sign) return [right, right + reach];
    left -= reach;
    right += reach;
  }
  throw new RangeError("no sign change found");
}

function closeBracket(f: (x: number) => number, low: number, high: number): number {
  let [x1, f1, x2, f2] = [high, f(high), low, f(low)];
  let share = 0.5;
  for (let step = 0; step < STEPS_MAX; step += 1) {
    const best = Math.abs(f1) < Math.abs(f2) ? x1 : x2;
    const tolerance = (2 * Number.EPSILON * Math.max(1, Math.abs(best))) / Math.abs(x2 - x1);
    if (f1 === 0 || f2 === 0 || !(tolerance < 0.5)) return best;
    const x = x1 + Math.min(1 - tolerance, Math.max(tolerance, share)) * (x2 - x1);
    const fx = f(x);
    const isSameSide = Math.sign(fx) === Math.sign(f1);
    const [x3, f3] = isSameSide ? [x1, f1] : [x2, f2];
    if (!isSameSide) [x2, f2] = [x1, f1];
    [x1, f1] = [x, fx];
    share = inverseQuadraticShare(x1, f1, x2, f2, x3, f3);
  }
  return Math.abs(f1) < Math.abs(f2) ? x1 : x2;
}

/** Where between x1 and x2 the inverse parabola through three points crosses zero; half way if it cannot be trusted. */
function inverseQuadraticShare(x1: number, f1: number, x2: number, f2: number, x3: number, f3: number): number {
  const xi = (x1 - x2) / (x3 - x2);
  const phi = (f1 - f2) / (f3 - f2);
  if (!(phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi)) return 0.5;
  return (f1 / (f2 - f1)) * (f3 / (f2 - f3)) + ((x3 - x1) / (x2 - x1)) * (f1 / (f3 - f1)) * (f2 / (f3 - f2));
}
