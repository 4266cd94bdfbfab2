import { randomBytes } from "node:crypto";
import { beforeAll, describe, expect, inject, it, vi } from "vitest";
import { changeEnv } from "@/lib/env";
import { deleteObject, getObject, MissingObjectError, putObject } from "@/lib/storage/objects";

beforeAll(() => changeEnv(inject("services").storage));

const photograph = (sizeBytes: number) => new Uint8Array(randomBytes(sizeBytes));

describe("the bucket", () => {
  it.each([1, 300_000, 20_000_000])("gives back %d bytes as they were put", async (sizeBytes) => {
    const key = crypto.randomUUID();
    const put = photograph(sizeBytes);
    await putObject(key, put, "image/webp");
    const { body, contentType } = await getObject(key);
    expect(contentType).toBe("image/webp");
    expect(Buffer.compare(body, put)).toBe(0);
  });
  it("replaces what is put under the same key", async () => {
    const key = crypto.randomUUID();
    const second = photograph(10);
    await putObject(key, photograph(1_000), "image/jpeg");
    await putObject(key, second, "image/png");
    expect(await getObject(key)).toEqual({ body: second, contentType: "image/png" });
  });
  it("says that an object is missing, and removes one that is missing without complaint", async () => {
    const key = crypto.randomUUID();
    await putObject(key, photograph(10), "image/jpeg");
    await deleteObject(key);
    await deleteObject(key);
    await expect(getObject(key)).rejects.toBeInstanceOf(MissingObjectError);
  });
  it("gives nothing to whoever has no key", async () => {
    const key = crypto.randomUUID();
    await putObject(key, photograph(10), "image/jpeg");
    const { S3_ENDPOINT, S3_BUCKET } = inject("services").storage;
    expect((await fetch(`${S3_ENDPOINT}/${S3_BUCKET}/${key}`)).status).toBe(403);
  });
  it("says that it cannot be reached, without its address", async () => {
    vi.resetModules();
    vi.stubEnv("S3_ENDPOINT", "http://127.0.0.1:9");
    const { getObject } = await import("@/lib/storage/objects");
    await expect(getObject("x")).rejects.toMatchObject({
      code: "storage-unavailable",
      message: "The photographs cannot be reached at the moment. Try again in a minute.",
    });
    vi.unstubAllEnvs();
  });
});
