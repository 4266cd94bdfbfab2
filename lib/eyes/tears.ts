import { mapRgb, type Rgb } from "./colour";
import type { GlobePlace } from "./globe";
import type { Scene } from "./scene";
import { bell, smoothStep } from "./shaping";

/** The line of tears on the lower lid, with a wet gleam along parts of it. */
export function paintTears(scene: Scene, place: GlobePlace, under: Rgb): Rgb {
  const { eye, n, aboveLower } = place;
  const line = bell(aboveLower - 0.16, 0.13);
  const gleam = smoothStep(0.05, 0.55, scene.noise[2].plane(n * 0.55 + 3, 2 + eye.centreX));
  const light = 0.04 + 0.19 * gleam * smoothStep(13.5, 10, Math.abs(n));
  const shadow = 1 - 0.1 * bell(aboveLower - 0.42, 0.2);
  return mapRgb(under, (q) => q * shadow + line * (1 - 0.5 * scene.palette.depth) * light);
}
