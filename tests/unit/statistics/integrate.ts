/** Composite Simpson rule; tests use it as a way to a distribution that shares nothing with the code under test. */
export function integrate(f: (x: number) => number, low: number, high: number, intervals = 4000): number {
  const step = (high - low) / intervals;
  let sum = f(low) + f(high);
  for (let i = 1; i < intervals; i += 1) sum += (i % 2 === 1 ? 4 : 2) * f(low + i * step);
  return (sum * step) / 3;
}
