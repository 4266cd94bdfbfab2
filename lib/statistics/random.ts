import { requireWhole } from "./input";

/**
 * A repeatable stream of uniform numbers in [0, 1), 32 bits each: the same seed gives the same numbers everywhere.
 *
 * `seed` is a whole number from 0. Not for secrets.
 * Source: sfc32 of C. Doty-Humphrey's PractRand, filled from the seed by a 32-bit splitmix mixer.
 */
export function seededRandom(seed: number): () => number {
  requireWhole(seed, "seed", 0);
  const fill = splitMix((seed % 2 ** 32) ^ Math.imul(Math.floor(seed / 2 ** 32), 0x85ebca6b));
  let [a, b, c, counter] = [fill(), fill(), fill(), 1];
  const next = () => {
    const sum = (a + b + counter) | 0;
    counter = (counter + 1) | 0;
    a = b ^ (b >>> 9);
    b = (c + (c << 3)) | 0;
    c = ((c << 21) | (c >>> 11)) + sum;
    return (sum >>> 0) / 2 ** 32;
  };
  for (let round = 0; round < 12; round += 1) next(); // neighbouring seeds part within the first rounds
  return next;
}

function splitMix(seed: number): () => number {
  let state = seed | 0;
  return () => {
    state = (state + 0x9e3779b9) | 0;
    let mixed = state ^ (state >>> 16);
    mixed = Math.imul(mixed, 0x21f0aaad);
    mixed ^= mixed >>> 15;
    mixed = Math.imul(mixed, 0x735a2d97);
    return mixed ^ (mixed >>> 15);
  };
}
