import type { Rgb } from "./colour";

/** In pixels from the top left corner of a picture. */
export type PixelPoint = readonly [x: number, y: number];

/** Linear light, three numbers a pixel, row by row. */
export type Canvas = { width: number; height: number; light: Float32Array };

export function createCanvas(width: number, height: number): Canvas {
  return { width, height, light: new Float32Array(width * height * 3) };
}

export function setPixel(canvas: Canvas, px: number, py: number, colour: Rgb): void {
  const offset = (py * canvas.width + px) * 3;
  canvas.light[offset] = colour[0];
  canvas.light[offset + 1] = colour[1];
  canvas.light[offset + 2] = colour[2];
}
