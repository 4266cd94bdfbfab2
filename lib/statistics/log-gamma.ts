/**
 * What Stirling's formula leaves out: log Γ(x + 1) − [(x + ½) log x − x + ½ log 2π], for x > 0.
 * Small and smooth, so ratios of gamma functions built from it keep their digits where differences of log Γ lose them.
 * Source: series of Abramowitz & Stegun 6.1.40, reached by the exact step (x + ½) log(1 + 1/x) − 1;
 * use in densities after Loader (2000), Fast and accurate computation of binomial probabilities.
 */
export function stirlingError(x: number): number {
  let below = 0;
  let z = x;
  for (; z < 16; z += 1) below += (z + 0.5) * Math.log1p(1 / z) - 1;
  const w = 1 / (z * z);
  return below + (1 / 12 - w * (1 / 360 - w * (1 / 1260 - w * (1 / 1680 - w / 1188)))) / z;
}

/** log Γ(x) for x > 0. */
export function logGamma(x: number): number {
  return (x - 0.5) * Math.log(x) - x + 0.5 * Math.log(2 * Math.PI) + stirlingError(x);
}

/**
 * x log(x / m) + m − x without the cancellation near x = m, for x, m > 0.
 * Source: Loader (2000), the deviance part of a binomial or Poisson probability.
 */
export function deviance(x: number, m: number): number {
  if (Math.abs(x - m) > 0.1 * (x + m)) return x * Math.log(x / m) + m - x;
  const v = (x - m) / (x + m);
  let sum = (x - m) * v;
  let term = 2 * x * v;
  for (let j = 3; ; j += 2) {
    term *= v * v;
    const next = sum + term / j;
    if (next === sum) return sum;
    sum = next;
  }
}
