import { mapRgb, type Rgb } from "./colour";
import type { GlobePlace } from "./globe";
import type { Scene } from "./scene";
import { bell, clamp, smoothStep } from "./shaping";

/** The corneal light reflex: a small round core with a halo, or on the sclera a broader, broken gleam. */
export function paintReflex(scene: Scene, place: GlobePlace, under: Rgb): Rgb {
  const brightness = scene.settings.reflexBrightness;
  if (brightness <= 0) return under;
  const { eye, n, y } = place;
  const dn = n - eye.reflexInView.n;
  const dy = y - eye.reflexInView.y;
  const distance = Math.hypot(dn, dy);
  if (!eye.reflexInEye.onSclera) {
    const core = smoothStep(0.5, 0.34, distance);
    const halo = 0.2 * Math.exp(-((distance / 0.58) ** 2)) + 0.012 * Math.exp(-((distance / 1.5) ** 2));
    return [
      under[0] + brightness * (1.65 * core + halo),
      under[1] + brightness * (1.65 * core + halo),
      under[2] + brightness * (1.68 * core + halo * 1.04),
    ];
  }
  // The conjunctiva is uneven.
  const [first, second, third] = scene.noise;
  const broken = 0.5 + 0.9 * second.plane(n * 2.6 + 4, y * 2.6);
  const ragged = 0.2 * first.plane(n * 1.7, y * 1.7);
  const core = smoothStep(0.66, 0.26, Math.hypot(dn * 1.05, dy * 0.88) + ragged + 0.05 * third.plane(n * 5, y * 5));
  const halo = 0.2 * Math.exp(-((distance / 0.95) ** 2)) * (0.7 + 0.5 * clamp(broken));
  const rim = 0.16 * bell(distance - 0.95, 0.3);
  return mapRgb(under, (q) => q * (1 - rim) + brightness * (1.7 * core + halo));
}
