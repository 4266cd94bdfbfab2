import { type Canvas, createCanvas } from "./canvas";
import type { PhotographSettings } from "./parameters";
import { createRandom } from "./random";
import { bell, clamp, lerp } from "./shaping";

/** What the camera makes of the light: fewer pixels, focus, a soft lens, exposure, tone and grain. Bytes, RGB. */
export function takePhotograph(
  canvas: Canvas,
  settings: PhotographSettings,
  skinDepth: number,
): Uint8Array<ArrayBuffer> {
  let picture = scaleDown(canvas, settings);
  if (settings.blurPx > 0) picture = missFocus(picture, settings.blurPx);
  return develop(soften(picture), settings, settings.exposure ?? lerp(1.06, 1.34, skinDepth));
}

/** Means over squares. Gleams are cut first, because a sensor saturates point by point. */
function scaleDown(canvas: Canvas, { width, height, supersample }: PhotographSettings): Canvas {
  const picture = createCanvas(width, height);
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      for (let c = 0; c < 3; c++) {
        let sum = 0;
        for (let j = 0; j < supersample; j++) {
          for (let i = 0; i < supersample; i++) {
            const offset = ((y * supersample + j) * canvas.width + x * supersample + i) * 3 + c;
            sum += Math.min(2.2, canvas.light[offset] ?? 0);
          }
        }
        picture.light[(y * width + x) * 3 + c] = sum / (supersample * supersample);
      }
    }
  }
  return picture;
}

/** Camera shake or a missed focus, for photographs that cannot be read. */
function missFocus(picture: Canvas, blurPx: number): Canvas {
  const radius = Math.ceil(blurPx * 2.5);
  const weights = Float64Array.from({ length: radius * 2 + 1 }, (_, i) => bell(i - radius, blurPx));
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  return blurAlong(blurAlong(picture, weights, total, 1, 0), weights, total, 0, 1);
}

function blurAlong(picture: Canvas, weights: Float64Array, total: number, stepX: number, stepY: number): Canvas {
  const { width, height, light } = picture;
  const radius = (weights.length - 1) / 2;
  const blurred = createCanvas(width, height);
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      for (let c = 0; c < 3; c++) {
        let sum = 0;
        for (let i = -radius; i <= radius; i++) {
          const row = clamp(y + i * stepY, 0, height - 1);
          const column = clamp(x + i * stepX, 0, width - 1);
          sum += (weights[i + radius] ?? 0) * (light[(row * width + column) * 3 + c] ?? 0);
        }
        blurred.light[(y * width + x) * 3 + c] = sum / total;
      }
    }
  }
  return blurred;
}

/** The slight softness of any lens, over 3 × 3 pixels. */
function soften(picture: Canvas): Canvas {
  const { width, height, light } = picture;
  const soft = createCanvas(width, height);
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      for (let c = 0; c < 3; c++) {
        let sum = 0;
        let total = 0;
        for (let j = -1; j <= 1; j++) {
          for (let i = -1; i <= 1; i++) {
            const row = y + j;
            const column = x + i;
            if (row < 0 || column < 0 || row >= height || column >= width) continue;
            const weight = (2 - Math.abs(i)) * (2 - Math.abs(j));
            sum += weight * (light[(row * width + column) * 3 + c] ?? 0);
            total += weight;
          }
        }
        const offset = (y * width + x) * 3 + c;
        soft.light[offset] = lerp(light[offset] ?? 0, sum / total, 0.32);
      }
    }
  }
  return soft;
}

/** Exposure with darker corners, a shoulder for the highlights, and grain that is coarser along a row than across. */
function develop(picture: Canvas, settings: PhotographSettings, exposure: number): Uint8Array<ArrayBuffer> {
  const { width, height, light } = picture;
  const { grain, warmth } = settings;
  const bytes = new Uint8Array(width * height * 3);
  const random = createRandom(settings.seed * 977 + 3);
  let before = 0;
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      const dx = (x / width - 0.5) * 2;
      const dy = (y / height - 0.5) * 2;
      const vignette = 1 - 0.2 * Math.abs(dx) ** 3 - 0.08 * dy * dy;
      const speck = random.bell();
      const luminance = 0.6 * speck + 0.4 * before;
      before = speck;
      for (let c = 0; c < 3; c++) {
        const offset = (y * width + x) * 3 + c;
        let value = toneOf((light[offset] ?? 0) * vignette * (1 + (1 - c) * 0.022 * warmth), exposure);
        value += grain * (0.0085 * luminance + 0.0035 * random.bell()) * (0.55 + 0.8 * (1 - value));
        value = (value - 0.5) * 1.07 + 0.492;
        bytes[offset] = clamp(Math.round(value * 255), 0, 255);
      }
    }
  }
  return bytes;
}

/** From light to the value of a screen (the sRGB curve), highlights bent over above 0.55. */
function toneOf(light: number, exposure: number): number {
  const exposed = Math.max(0, light * exposure);
  const bent = exposed < 0.55 ? exposed : 0.55 + 0.45 * (1 - Math.exp(-(exposed - 0.55) / 0.45));
  return bent <= 0.0031308 ? 12.92 * bent : 1.055 * bent ** (1 / 2.4) - 0.055;
}
