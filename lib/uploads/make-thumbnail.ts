import "server-only";
import sharp from "sharp";

const WIDTH_PX = 640;

/** A small copy for lists, wide enough for twice the width it is shown at. */
export async function makeThumbnail(photograph: Uint8Array): Promise<Buffer<ArrayBuffer>> {
  const small = await sharp(photograph).resize({ width: WIDTH_PX, withoutEnlargement: true }).jpeg({ quality: 80 });
  return Buffer.from(await small.toBuffer());
}
