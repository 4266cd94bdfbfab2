import type { Noise } from "./noise";
import type { Random } from "./random";
import { clamp, lerp, smoothStep } from "./shaping";

/** How much of a vessel lies at a place on the sclera, 0 to about 1: `around` the axis in radians, `fromAxis` degrees. */
export type VesselMap = (around: number, fromAxis: number) => number;

const COLUMNS = 1024;
const ROWS = 192;
const NEAREST_DEGREES = 26;
const FARTHEST_DEGREES = 95;

/** Grows the vessels of one eye from the corners towards the limbus, once, into a map around the axis of the eye. */
export function growVessels(random: Random, noise: Noise, amount: number): VesselMap {
  const map = new Float32Array(COLUMNS * ROWS);

  const grow = (from: Sprout, depth: number) => {
    let { around, fromAxis } = from;
    let wander = 0;
    const own = random.next() * 100;
    for (let i = 0; i < from.length; i++) {
      const t = i / from.length;
      wander += random.range(-1, 1) * 0.0036;
      wander *= 0.9;
      around += from.bend + wander;
      fromAxis -= 0.42 * (0.75 + 0.5 * Math.abs(noise.plane(own, i * 0.09)));
      const fading = smoothStep(31, 46, fromAxis);
      if (fromAxis < 30) break;
      const strength =
        from.strength * smoothStep(-0.02, 0.18, t) * fading * (0.75 + 0.45 * noise.plane(own + 5, i * 0.15));
      stamp(map, around, fromAxis, from.width * (1 - 0.6 * t), strength);
      if (depth < 3 && random.next() < 0.015) {
        const branch = {
          around,
          fromAxis,
          bend: from.bend + random.range(-0.006, 0.006),
          length: (from.length - i) * random.range(0.5, 0.9),
          width: from.width * 0.72,
          strength: from.strength * 0.8,
        };
        grow(branch, depth + 1);
      }
    }
  };

  const trunks = Math.round(20 + 12 * amount);
  for (let i = 0; i < trunks; i++) {
    const middle = random.next() < 0.5 ? 0 : Math.PI;
    const trunk = {
      around: middle + random.bell() * 0.55,
      fromAxis: random.range(66, 88),
      bend: random.range(-0.0022, 0.0022),
      length: random.range(60, 120),
      width: random.range(0.9, 1.9),
      strength: random.range(0.3, 1.0) * amount,
    };
    grow(trunk, 0);
  }
  return (around, fromAxis) => readMap(map, around, fromAxis);
}

type Sprout = { around: number; fromAxis: number; bend: number; length: number; width: number; strength: number };

function columnOf(around: number): number {
  return ((around / (2 * Math.PI)) * COLUMNS + COLUMNS * 2) % COLUMNS;
}

function rowOf(fromAxis: number): number {
  return ((fromAxis - NEAREST_DEGREES) / (FARTHEST_DEGREES - NEAREST_DEGREES)) * ROWS;
}

function stamp(map: Float32Array, around: number, fromAxis: number, width: number, strength: number): void {
  const x = columnOf(around);
  const y = rowOf(fromAxis);
  const radius = Math.max(1, width * 2.2);
  for (let dy = -Math.ceil(radius); dy <= radius; dy++) {
    for (let dx = -Math.ceil(radius); dx <= radius; dx++) {
      const row = Math.round(y + dy);
      if (row < 0 || row >= ROWS) continue;
      const column = (Math.round(x + dx) + COLUMNS) % COLUMNS;
      const d = Math.hypot(Math.round(x + dx) - x, row - y);
      const value = strength * Math.exp(-(d * d) / (width * width));
      if (value > (map[row * COLUMNS + column] ?? 0)) map[row * COLUMNS + column] = value;
    }
  }
}

function readMap(map: Float32Array, around: number, fromAxis: number): number {
  const x = columnOf(around);
  const y = clamp(rowOf(fromAxis), 0, ROWS - 1.001);
  const left = x | 0;
  const top = y | 0;
  const right = (left + 1) % COLUMNS;
  const u = x - left;
  const v = y - top;
  const read = (row: number, column: number) => map[row * COLUMNS + column] ?? 0;
  return lerp(lerp(read(top, left), read(top, right), u), lerp(read(top + 1, left), read(top + 1, right), u), v);
}
