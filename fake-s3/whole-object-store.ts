import { createHash, randomUUID } from "node:crypto";
import { mkdir, open, rename } from "node:fs/promises";
import path from "node:path";
import FilesystemStore from "s3rver/lib/stores/filesystem";

/**
 * s3rver answers before an object is fully written, and a kill at the wrong moment leaves half of it. Here an object is
 * on the disk, whole, before it has its name, and has its name before the answer goes out.
 */
export class WholeObjectStore extends FilesystemStore {
  override async putObject({ bucket, key, content, metadata }: Parameters<FilesystemStore["putObject"]>[0]) {
    const body = Buffer.isBuffer(content) ? content : Buffer.concat(await content.toArray());
    const target = this.getResourcePath(bucket, key, "object");
    const unfinished = `${target}.${randomUUID()}`;
    await mkdir(path.dirname(target), { recursive: true });
    const file = await open(unfinished, "wx");
    try {
      await file.writeFile(body);
      await file.sync();
    } finally {
      await file.close();
    }
    const md5 = createHash("md5").update(body).digest("hex");
    await this.putMetadata(bucket, key, metadata, md5);
    await rename(unfinished, target);
    return { size: body.byteLength, md5 };
  }
}
