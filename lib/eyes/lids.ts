import type { PhotographSettings, Side } from "./parameters";
import { createRandom, type Random } from "./random";
import { type Point, type SampledCurve, sampleCurve } from "./sampled-curve";
import { clamp, lerp } from "./shaping";

/** The two lids of an eye in its own frame: n towards the nose, y down. The corners are where they meet. */
export type Lids = {
  upper: SampledCurve;
  lower: SampledCurve;
  /** The upper lid as it would lie were the eye open: the crease stays behind when the lid comes down. */
  upperOpen: SampledCurve;
  /** 1 open, 0 closed. */
  opening: number;
  outerCorner: { n: number; y: number };
  innerCorner: { n: number; y: number };
};

const OUTER_CORNER_N = -14.4;
const REACH_MM = 30;

/** The stream of numbers of one eye. Its lids are drawn from it first. */
export function createEyeRandom(seed: number, side: Side): Random {
  return createRandom(seed * 131 + (side === "right" ? 11 : 23));
}

export function shapeLids(settings: PhotographSettings, side: Side, random: Random): Lids {
  const { esoDegrees, hyperDegrees, opening: eyeOpening } = settings[side];
  const { epicanthus, lidPeak } = settings;
  const opening = settings.lidOpening * eyeOpening;
  // The lids go a little with the eye, the upper one more; the cornea lifts the upper lid where it turns to.
  const followed = Math.max(-20, Math.min(20, hyperDegrees));
  const upperShift = -0.052 * followed;
  const lowerShift = -0.022 * followed;
  const bulge = esoDegrees / 15;
  const slant = Math.tan((settings.canthalTiltDegrees * Math.PI) / 180);
  const innerN = 15.3 - 2.7 * epicanthus;
  const innerY = 1.7 - 0.3 * epicanthus;

  const jitter = () => random.range(-0.14, 0.14);
  const onUpper = (n: number, y: number, share = 1): Point => [n, y + (upperShift + jitter()) * share];
  const onLower = (n: number, y: number, share = 1): Point => [n, y + (lowerShift + jitter()) * share];
  const placed = ([n, y]: Point): Point => {
    const drawnIn = n > 0 ? n * (innerN / 15.3) : n;
    return [drawnIn, y + slant * drawnIn];
  };
  const upperPoints = [
    [OUTER_CORNER_N, -0.5] as const,
    onUpper(-13.2, -1.65, 0.3),
    onUpper(-11.2, -2.95, 0.6),
    onUpper(-8.2, -4.1, 0.9),
    onUpper(-4.4, -4.82 + 0.16 * lidPeak),
    onUpper(-0.6 + 0.5 * bulge, -5.02),
    onUpper(3.4, -4.55 - 0.16 * lidPeak),
    onUpper(7.2, -3.28 - 0.12 * lidPeak, 0.9),
    onUpper(10.3, -1.62 + 0.35 * epicanthus, 0.6),
    [12.7, -0.22 + 0.45 * epicanthus] as const,
    [14.2, 0.72 + 0.1 * epicanthus] as const,
    [15.3, innerY] as const,
  ];
  const lowerPoints = [
    [OUTER_CORNER_N, -0.5] as const,
    onLower(-13.3, 0.55, 0.3),
    onLower(-11.4, 1.85, 0.6),
    onLower(-8.4, 3.55, 0.8),
    onLower(-4.6, 4.85),
    onLower(-0.8, 5.35),
    onLower(3.2, 5.12),
    onLower(6.8, 4.3, 0.8),
    onLower(9.9, 3.25, 0.6),
    [12.7, 2.55] as const,
    [14.2, 2.15] as const,
    [15.3, innerY] as const,
  ];
  const upperOpen = sampleCurve(upperPoints.map(placed), -REACH_MM, REACH_MM);
  const lowerOpen = sampleCurve(lowerPoints.map(placed), -REACH_MM, REACH_MM);

  // On closing, the upper lid comes down to the lower one, which rises only a little towards the line of the corners.
  const cornerLine = (n: number) =>
    -0.5 +
    slant * OUTER_CORNER_N +
    ((innerY + 0.5 + slant * (innerN - OUTER_CORNER_N)) * (n - OUTER_CORNER_N)) / (innerN - OUTER_CORNER_N);
  const everyMm = (y: (n: number) => number) => {
    const points = Array.from({ length: 2 * REACH_MM + 1 }, (_, i): Point => [i - REACH_MM, y(i - REACH_MM)]);
    return sampleCurve(points, -REACH_MM, REACH_MM);
  };
  const lower = everyMm((n) => lerp(lerp(cornerLine(n), lowerOpen.at(n), 0.72), lowerOpen.at(n), clamp(opening)));
  const isOpen = opening >= 0.999 && opening <= 1.06;
  const upper = isOpen ? upperOpen : everyMm((n) => lerp(lower.at(n), upperOpen.at(n), opening));
  return {
    upper,
    lower,
    upperOpen,
    opening,
    outerCorner: { n: OUTER_CORNER_N, y: -0.5 - 14.4 * slant },
    innerCorner: { n: innerN, y: innerY + innerN * slant },
  };
}
