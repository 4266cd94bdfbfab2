import "server-only";
import sharp from "sharp";

export type ItemPictureFile = { body: Buffer<ArrayBuffer>; width: number; height: number };

const TRIM_PX_MAX = 4;

/**
 * Makes the picture of one showing: encoded anew, mirrored where asked, and trimmed by a few pixels and compressed by a
 * strength of its own, so that neither bytes nor size nor dimensions of two showings of one case are equal by design.
 *
 * `random` gives uniform numbers in [0, 1).
 */
export async function makeItemPicture(
  photograph: Uint8Array,
  { isMirrored, random }: { isMirrored: boolean; random: () => number },
): Promise<ItemPictureFile> {
  const upTo = (limit: number) => Math.floor(random() * (limit + 1));
  const { width, height } = await sharp(photograph).metadata();
  const [left, top, right, bottom] = [upTo(TRIM_PX_MAX), upTo(TRIM_PX_MAX), upTo(TRIM_PX_MAX), upTo(TRIM_PX_MAX)];
  const { data, info } = await sharp(photograph)
    .extract({ left, top, width: width - left - right, height: height - top - bottom })
    .flop(isMirrored)
    .jpeg({ quality: 88 + upTo(5), chromaSubsampling: "4:4:4" })
    .toBuffer({ resolveWithObject: true });
  return { body: Buffer.from(data), width: info.width, height: info.height };
}
