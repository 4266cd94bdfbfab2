/** A stream of numbers that depends on its seed alone, so that the same parameters draw the same face for ever. */
export type Random = {
  /** The next number, 0 to 1. */
  next(): number;
  range(from: number, to: number): number;
  /** A bell-shaped number about 0 with a standard deviation near 1, from a sum of six. */
  bell(): number;
};

/** Marsaglia's 32-bit xorshift (13, 17, 5), with the seed scattered first so that neighbouring seeds differ at once. */
export function createRandom(seed: number): Random {
  let state = (Math.imul(seed ^ 0x9e3779b9, 0x85ebca6b) ^ 0xc2b2ae35) >>> 0 || 1;
  const next = () => {
    state ^= state << 13;
    state >>>= 0;
    state ^= state >>> 17;
    state ^= state << 5;
    state >>>= 0;
    return state / 4294967296;
  };
  for (let i = 0; i < 8; i++) next();
  return {
    next,
    range: (from, to) => from + (to - from) * next(),
    bell: () => {
      let sum = 0;
      for (let i = 0; i < 6; i++) sum += next();
      // biome-ignore lint/suspicious/noApproximativeNumericConstant: every picture made so far holds to this very figure
      return (sum - 3) * 1.414;
    },
  };
}
