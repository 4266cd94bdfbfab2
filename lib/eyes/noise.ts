import { createRandom } from "./random";

/** Distances to the nearest and the second nearest of points scattered one to a square. */
export type CellDistances = { nearest: number; second: number };

export type Noise = {
  /** Gradient noise over the plane, about −1 to 1, one bump to a unit. */
  plane(x: number, y: number): number;
  /** Gradient noise in space. On a circle in two of its axes it closes on itself, which the iris needs. */
  space(x: number, y: number, z: number): number;
  /** Plane noise in octaves, each half as strong and about twice as fine as the one before. */
  octaves(x: number, y: number, count: number): number;
  cells(x: number, y: number): CellDistances;
};

const GRADIENT_X = Float64Array.from({ length: 256 }, (_, i) => Math.cos((i / 256) * Math.PI * 2));
const GRADIENT_Y = Float64Array.from({ length: 256 }, (_, i) => Math.sin((i / 256) * Math.PI * 2));

/** The middles of the twelve edges of a cube, the usual gradients of noise in space; three numbers each. */
// biome-ignore format: one gradient after another reads best in rows of four
const EDGES = Float64Array.from([
  1, 1, 0, -1, 1, 0, 1, -1, 0, -1, -1, 0,
  1, 0, 1, -1, 0, 1, 1, 0, -1, -1, 0, -1,
  0, 1, 1, 0, -1, 1, 0, 1, -1, 0, -1, -1,
]);

/** Perlin's gradient noise and Worley's cellular noise over a shuffle that depends on the seed. */
export function createNoise(seed: number): Noise {
  const table = shuffleBytes(seed);
  const hash = (i: number) => table[i] ?? 0;

  const plane = (x: number, y: number) => {
    const xi = Math.floor(x);
    const yi = Math.floor(y);
    const fx = x - xi;
    const fy = y - yi;
    const column = xi & 255;
    const row = yi & 255;
    const u = fade(fx);
    const v = fade(fy);
    const n00 = alongGradient(hash(hash(column) + row), fx, fy);
    const n10 = alongGradient(hash(hash(column + 1) + row), fx - 1, fy);
    const n01 = alongGradient(hash(hash(column) + row + 1), fx, fy - 1);
    const n11 = alongGradient(hash(hash(column + 1) + row + 1), fx - 1, fy - 1);
    const top = n00 + u * (n10 - n00);
    const bottom = n01 + u * (n11 - n01);
    return (top + v * (bottom - top)) * 1.5;
  };

  const space = (x: number, y: number, z: number) => {
    const xi = Math.floor(x);
    const yi = Math.floor(y);
    const zi = Math.floor(z);
    const fx = x - xi;
    const fy = y - yi;
    const fz = z - zi;
    const row = yi & 255;
    const layer = zi & 255;
    const u = fade(fx);
    const v = fade(fy);
    const left = hash(xi & 255) + row;
    const right = hash((xi & 255) + 1) + row;
    const leftTop = hash(left & 511) + layer;
    const leftBottom = hash((left + 1) & 511) + layer;
    const rightTop = hash(right & 511) + layer;
    const rightBottom = hash((right + 1) & 511) + layer;
    const near = blend(
      blend(alongEdge(hash(leftTop & 511), fx, fy, fz), alongEdge(hash(rightTop & 511), fx - 1, fy, fz), u),
      blend(
        alongEdge(hash(leftBottom & 511), fx, fy - 1, fz),
        alongEdge(hash(rightBottom & 511), fx - 1, fy - 1, fz),
        u,
      ),
      v,
    );
    const far = blend(
      blend(
        alongEdge(hash((leftTop + 1) & 511), fx, fy, fz - 1),
        alongEdge(hash((rightTop + 1) & 511), fx - 1, fy, fz - 1),
        u,
      ),
      blend(
        alongEdge(hash((leftBottom + 1) & 511), fx, fy - 1, fz - 1),
        alongEdge(hash((rightBottom + 1) & 511), fx - 1, fy - 1, fz - 1),
        u,
      ),
      v,
    );
    return blend(near, far, fade(fz));
  };

  const octaves = (x: number, y: number, count: number) => {
    let px = x;
    let py = y;
    let weight = 1;
    let sum = 0;
    let total = 0;
    for (let i = 0; i < count; i++) {
      sum += weight * plane(px, py);
      total += weight;
      px = px * 2.03 + 17.1;
      py = py * 2.03 - 9.7;
      weight *= 0.5;
    }
    return sum / total;
  };

  const cells = (x: number, y: number) => {
    const xi = Math.floor(x);
    const yi = Math.floor(y);
    let nearest = 9;
    let second = 9;
    for (let j = -1; j <= 1; j++) {
      for (let i = -1; i <= 1; i++) {
        const h = hash((hash((xi + i) & 255) + yi + j) & 255);
        const h2 = hash((h + 91) & 255);
        const dx = xi + i + h / 255 - x;
        const dy = yi + j + h2 / 255 - y;
        const squared = dx * dx + dy * dy;
        if (squared < nearest) {
          second = nearest;
          nearest = squared;
        } else if (squared < second) second = squared;
      }
    }
    return { nearest: Math.sqrt(nearest), second: Math.sqrt(second) };
  };

  return { plane, space, octaves, cells };
}

/** The bytes 0 to 255 in an order of the seed's own, twice over so that a sum of two needs no wrapping. */
function shuffleBytes(seed: number): Uint8Array {
  const random = createRandom(seed);
  const bytes = Uint8Array.from({ length: 256 }, (_, i) => i);
  for (let i = 255; i > 0; i--) {
    const j = Math.floor(random.next() * (i + 1));
    const kept = bytes[i] ?? 0;
    bytes[i] = bytes[j] ?? 0;
    bytes[j] = kept;
  }
  return Uint8Array.from({ length: 512 }, (_, i) => bytes[i & 255] ?? 0);
}

function fade(t: number): number {
  return t * t * t * (t * (t * 6 - 15) + 10);
}

function blend(from: number, to: number, t: number): number {
  return from + t * (to - from);
}

function alongGradient(hash: number, dx: number, dy: number): number {
  return (GRADIENT_X[hash] ?? 0) * dx + (GRADIENT_Y[hash] ?? 0) * dy;
}

function alongEdge(hash: number, dx: number, dy: number, dz: number): number {
  const i = (hash % 12) * 3;
  return (EDGES[i] ?? 0) * dx + (EDGES[i + 1] ?? 0) * dy + (EDGES[i + 2] ?? 0) * dz;
}
