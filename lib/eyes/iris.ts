import { linearFromHex, mixRgb, type Rgb, scaleRgb } from "./colour";
import { createNoise, type Noise } from "./noise";
import { IRIS, type IrisName } from "./palettes";
import { bell, clamp, lerp, smoothStep } from "./shaping";

/** The colour of the iris at a point of its plane, mm from the pupil centre, before any light or shadow falls on it. */
export type IrisShader = (n: number, y: number) => Rgb;

export type IrisQuestion = { iris: IrisName; pupilMm: number; irisDiameterMm: number; seed: number };

/**
 * An iris in noise that closes on itself: fibres run outwards from the pupil, a collarette parts the inner third,
 * crypts open outside it and furrows run round. Places are an angle, as cosine and sine, and `t`: 0 at the pupil, 1 at
 * the limbus.
 */
export function createIris({ iris, pupilMm, irisDiameterMm, seed }: IrisQuestion): IrisShader {
  const palette = IRIS[iris];
  const inner = linearFromHex(palette.inner);
  const mid = linearFromHex(palette.mid);
  const outer = linearFromHex(palette.outer);
  const light = linearFromHex(palette.light);
  const ruff = linearFromHex(palette.ruff);
  const ring = linearFromHex(palette.ring);
  const { contrast } = palette;
  const fibreNoise = createNoise(seed);
  const warpNoise = createNoise(seed + 77);
  const limbusMm = irisDiameterMm / 2;
  const pupilRadius = pupilMm / 2;
  const phase = (seed % 97) * 0.13;

  return (n, y) => {
    const angle = Math.atan2(y, n) + phase;
    const c = Math.cos(angle);
    const s = Math.sin(angle);
    const wobble = 0.03 * fibreNoise.space(c * 2.2, s * 2.2, 3.1) + 0.012 * fibreNoise.space(c * 7, s * 7, 8.2);
    const t = clamp((Math.hypot(n, y) - pupilRadius * (1 + wobble)) / (limbusMm - pupilRadius));
    // The warp lets fibres wander and join.
    const warp = 0.07 * warpNoise.space(c * 2.4, s * 2.4, t * 1.6) + 0.018 * warpNoise.space(c * 9, s * 9, t * 4);
    const { whole, fine, finest, cryptNoise, rootNoise } = fibresAt(fibreNoise, warpNoise, angle + warp, t);
    const collarette =
      0.27 + 0.05 * fibreNoise.space(c * 3.2, s * 3.2, 11) + 0.022 * fibreNoise.space(c * 11, s * 11, 2);
    const inPupillaryZone = 1 - smoothStep(collarette - 0.05, collarette + 0.035, t);
    const fibres = lerp(whole, 0.4 * fine + 0.4 * finest + 0.08, inPupillaryZone * 0.75);
    const crypts =
      smoothStep(0.22, 0.5, cryptNoise) *
        smoothStep(collarette - 0.02, collarette + 0.1, t) *
        (1 - smoothStep(0.62, 0.85, t)) +
      0.6 * smoothStep(0.3, 0.55, rootNoise) * smoothStep(0.45, 0.6, t) * (1 - smoothStep(0.8, 0.95, t));
    const furrows =
      bell(t - (0.62 + 0.02 * warpNoise.space(c * 4, s * 4, 1)), 0.014) *
        smoothStep(-0.1, 0.4, fibreNoise.space(c * 1.4, s * 1.4, 6)) +
      bell(t - (0.77 + 0.02 * warpNoise.space(c * 4, s * 4, 4)), 0.012) *
        smoothStep(0, 0.4, fibreNoise.space(c * 1.3, s * 1.3, 2));

    const midward = t + 0.1 * fibreNoise.space(c * 3, s * 3, t * 3);
    let colour = mixRgb(inner, mid, smoothStep(collarette - 0.14, collarette + 0.2, midward));
    colour = mixRgb(colour, outer, smoothStep(0.42, 0.95, t + 0.09 * warpNoise.space(c * 4, s * 4, t * 2)));
    const brightness =
      0.7 +
      1.15 * (fibres - 0.44) * contrast +
      0.09 * bell(t - collarette, 0.04) * contrast +
      0.1 * warpNoise.space(c * 2.5, s * 2.5, t * 2.5);
    colour = scaleRgb(colour, brightness);
    colour = mixRgb(colour, light, clamp((fibres - 0.46) * 1.5 * contrast) * (0.3 + 0.34 * (1 - t)));
    colour = scaleRgb(colour, 1 - palette.crypt * crypts - 0.22 * furrows);
    colour = mixRgb(colour, ruff, 0.85 * (1 - smoothStep(0.005, 0.045 + 0.02 * fine, t)));
    const limbward = t + 0.035 * fibreNoise.space(c * 4, s * 4, 1) + 0.02 * (fine - 0.5);
    return mixRgb(colour, ring, 0.74 * smoothStep(0.76, 1.0, limbward));
  };
}

/** `whole`: mostly soft streaks with a few crisp strands. `fine` and `finest`: what shows near the pupil. */
type Fibres = { whole: number; fine: number; finest: number; cryptNoise: number; rootNoise: number };

function fibresAt(noise: Noise, warpNoise: Noise, angle: number, t: number): Fibres {
  const at = { c: Math.cos(angle), s: Math.sin(angle), t };
  const coarse = streak(noise, at, 7, 0.7, 1.3);
  const fine = streak(noise, at, 42, 1.5, 4.1);
  const finest = streak(noise, at, 88, 2.2, 9.9);
  const whole =
    0.16 * coarse +
    0.24 * streak(noise, at, 18, 1.0, 7.7) +
    0.22 * fine +
    0.13 * finest +
    0.2 * strand(noise, at, 13, 0.9, 2.2) * (0.4 + 0.6 * coarse) +
    0.12 * strand(noise, at, 27, 1.3, 5.2);
  return {
    whole,
    fine,
    finest,
    cryptNoise: noise.space(at.c * 4.2 + 20, at.s * 4.2, t * 2.4 + 5),
    rootNoise: warpNoise.space(at.c * 6.5, at.s * 6.5 + 9, t * 3.1),
  };
}

type IrisPlace = { c: number; s: number; t: number };

function streak(noise: Noise, at: IrisPlace, fineness: number, stretch: number, offset: number): number {
  return 0.5 + 0.9 * noise.space(at.c * fineness + offset, at.s * fineness - offset, at.t * stretch + offset);
}

function strand(noise: Noise, at: IrisPlace, fineness: number, stretch: number, offset: number): number {
  const along = noise.space(at.c * fineness + offset, at.s * fineness - offset, at.t * stretch + offset);
  return (1 - Math.min(1, Math.abs(along) * 3)) ** 2;
}
