/** Red, green and blue as light: linear, 0 to 1 and beyond for gleams. */
export type Rgb = readonly [red: number, green: number, blue: number];

/** From `#rrggbb` as screens write it (sRGB, IEC 61966-2-1). */
export function linearFromHex(hex: string): Rgb {
  return [linearFromByte(hex.slice(1, 3)), linearFromByte(hex.slice(3, 5)), linearFromByte(hex.slice(5, 7))];
}

function linearFromByte(digits: string): number {
  const c = Number.parseInt(digits, 16) / 255;
  return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
}

export function mixRgb(a: Rgb, b: Rgb, t: number): Rgb {
  return [a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t, a[2] + (b[2] - a[2]) * t];
}

export function scaleRgb(c: Rgb, factor: number): Rgb {
  return [c[0] * factor, c[1] * factor, c[2] * factor];
}

export function mapRgb(c: Rgb, change: (channel: number) => number): Rgb {
  return [change(c[0]), change(c[1]), change(c[2])];
}
