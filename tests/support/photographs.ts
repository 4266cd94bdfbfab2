import { crc32 } from "node:zlib";
import sharp, { type Sharp } from "sharp";

/** A photograph of one colour, for sizes: flat, so that it is made and compressed in no time. */
export function flatPhotograph(width: number, height: number): Sharp {
  return sharp({ create: { width, height, channels: 3, background: "#8899aa" }, limitInputPixels: false });
}

/** Words that stand in the metadata of `withMetadata`, none of which may be found in what is stored. */
export const METADATA_WORDS = ["A Photographer", "Exampletown", "A Camera", "rdf:RDF", "51/1"];

/** The left half red and the right half blue, with GPS and other EXIF, XMP and a colour profile of its own. */
export async function withMetadata(format: "jpeg" | "png" | "webp", orientation?: number): Promise<Buffer> {
  const left = { create: { width: 300, height: 200, channels: 3 as const, background: "#d02020" } };
  const pixels = flatPhotograph(600, 200)
    .composite([{ input: left, left: 0, top: 0 }])
    .withExif({
      IFD0: { Artist: "A Photographer", Model: "A Camera" },
      IFD3: { GPSLatitudeRef: "N", GPSLatitude: "51/1 30/1 0/1", GPSProcessingMethod: "Exampletown" },
    })
    .withXmp(
      '<x:xmpmeta xmlns:x="adobe:ns:meta/"><rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#"/></x:xmpmeta>',
    )
    .withIccProfile("p3")
    .withMetadata({ orientation });
  return pixels.toFormat(format, { quality: 95 }).toBuffer();
}

/** Puts a segment right after the start of a JPEG file: a comment is marker 0xfe, Photoshop's block with IPTC 0xed. */
export function withSegment(jpeg: Buffer, marker: number, text: string): Buffer {
  const content = Buffer.from(text, "latin1");
  const head = Buffer.from([0xff, marker, 0, 0]);
  head.writeUInt16BE(content.length + 2, 2);
  return Buffer.concat([jpeg.subarray(0, 2), head, content, jpeg.subarray(2)]);
}

/** The markers of a JPEG file's segments up to the pixels. */
export function jpegMarkers(jpeg: Uint8Array): number[] {
  const file = Buffer.from(jpeg);
  const markers: number[] = [];
  for (let at = 2; file[at] === 0xff; at += 2 + file.readUInt16BE(at + 2)) {
    const marker = file[at + 1] ?? 0;
    markers.push(marker);
    if (marker === 0xda) break;
  }
  return markers;
}

/** A file that begins as an ISO media file of this brand does; the rest of it is of no matter. */
export function isoMediaFile(brand: string): Buffer {
  const box = Buffer.from(`\0\0\0\x18ftyp${brand}\0\0\0\0mif1${brand}`, "latin1");
  return Buffer.concat([box, Buffer.alloc(4096, 7)]);
}

/** A PNG file of a few bytes that announces a picture of any size. */
export function pngHeader(width: number, height: number): Buffer {
  const header = Buffer.alloc(13);
  header.writeUInt32BE(width, 0);
  header.writeUInt32BE(height, 4);
  header.set([8, 2, 0, 0, 0], 8); // 8 bits, red green blue
  const chunk = (name: string, content: Buffer) => {
    const body = Buffer.concat([Buffer.from(name, "latin1"), content]);
    const frame = Buffer.alloc(8);
    frame.writeUInt32BE(content.length, 0);
    frame.writeUInt32BE(crc32(body), 4);
    return Buffer.concat([frame.subarray(0, 4), body, frame.subarray(4)]);
  };
  const signature = Buffer.from("\x89PNG\r\n\x1a\n", "latin1");
  return Buffer.concat([
    signature,
    chunk("IHDR", header),
    chunk("IDAT", Buffer.alloc(16)),
    chunk("IEND", Buffer.alloc(0)),
  ]);
}
