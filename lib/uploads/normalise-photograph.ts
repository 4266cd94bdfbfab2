import "server-only";
import sharp from "sharp";
import { AppError, invalidField } from "@/lib/errors";

export const UPLOAD_BYTES_MAX = 20_000_000;
export const PIXELS_MAX = 50_000_000;
const WIDTH_MIN_PX = 400;
const HEIGHT_MIN_PX = 100;
const FORMATS = ["jpeg", "png", "webp"];

/** A photograph as it is stored: upright sRGB JPEG with nothing but pixels in it. */
export type NormalisedPhotograph = { body: Buffer<ArrayBuffer>; width: number; height: number };

/**
 * Decodes an uploaded file and encodes it anew, so that no metadata, thumbnail or trailing data survives.
 * Throws an AppError that says what to change: 413 beyond 20 MB or 50 megapixels, 415 for other kinds of file,
 * 422 for a damaged or very small photograph.
 */
export async function normalisePhotograph(upload: Uint8Array): Promise<NormalisedPhotograph> {
  if (upload.byteLength > UPLOAD_BYTES_MAX) {
    throw new AppError("too-large", "photograph-too-large", "The file is over 20 MB. Save the photograph smaller.");
  }
  const { width, height } = await readSize(upload);
  if (width * height > PIXELS_MAX) {
    throw new AppError("too-large", "photograph-too-large", "The photograph has over 50 megapixels. Save it smaller.");
  }
  if (width < WIDTH_MIN_PX || height < HEIGHT_MIN_PX) {
    const least = `${WIDTH_MIN_PX} pixels wide and ${HEIGHT_MIN_PX} high`;
    throw invalidField("photograph", `The photograph is too small to read. It must be at least ${least}.`);
  }
  try {
    const encoded = await sharp(upload, { failOn: "warning", limitInputPixels: PIXELS_MAX })
      .autoOrient()
      .flatten({ background: "#777777" })
      .toColourspace("srgb")
      .jpeg({ quality: 92, chromaSubsampling: "4:4:4" })
      .toBuffer({ resolveWithObject: true });
    const body = Buffer.from(encoded.data);
    return { body, width: encoded.info.width, height: encoded.info.height };
  } catch {
    throw damaged();
  }
}

/** The size as the photograph is seen, upright. */
async function readSize(upload: Uint8Array): Promise<{ width: number; height: number }> {
  if (isHeic(upload)) {
    throw unsupported("HEIC photographs cannot be read here. Export the photograph as JPEG, PNG or WebP.");
  }
  const metadata = await sharp(upload, { failOn: "none", limitInputPixels: false })
    .metadata()
    .catch(() => null);
  if (!metadata && hasKnownStart(upload)) throw damaged();
  if (!metadata || !FORMATS.includes(metadata.format)) {
    throw unsupported("This is not a photograph that can be used. Choose a JPEG, PNG or WebP file.");
  }
  return metadata.autoOrient;
}

function damaged(): AppError {
  return invalidField("photograph", "The file is damaged or cut short. Export the photograph again and upload that.");
}

function unsupported(message: string): AppError {
  return new AppError("unsupported-media", "not-a-photograph", message, [{ pointer: "#/photograph", detail: message }]);
}

/** HEIC and HEIF files are ISO media files whose `ftyp` box, after four bytes of length, names one of these brands. */
function isHeic(upload: Uint8Array): boolean {
  const head = Buffer.from(upload.subarray(4, 12)).toString("latin1");
  return /^ftyp(heic|heix|heim|heis|hevc|hevx|mif1|msf1)/.test(head);
}

/** A JPEG, PNG or WebP file by its first bytes, which one that is cut short still has. */
function hasKnownStart(upload: Uint8Array): boolean {
  const head = Buffer.from(upload.subarray(0, 12)).toString("latin1");
  return /^(\xff\xd8\xff|\x89PNG|RIFF.{4}WEBP)/s.test(head);
}
