import sharp from "sharp";
import type { DrawnPhotograph } from "@/lib/eyes/draw-photograph";

/** A JPEG as the library keeps it: full colour resolution, for the sake of thin reflexes, and no metadata. */
export function encodeJpeg({ width, height, data }: Omit<DrawnPhotograph, "truth">, quality = 88): Promise<Buffer> {
  return sharp(data, { raw: { width, height, channels: 3 } })
    .jpeg({ quality, chromaSubsampling: "4:4:4", mozjpeg: true })
    .toBuffer();
}
