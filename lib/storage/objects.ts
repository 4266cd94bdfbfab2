import "server-only";
import { DeleteObjectCommand, GetObjectCommand, NoSuchKey, PutObjectCommand, S3Client } from "@aws-sdk/client-s3";
import { storageEnv } from "@/lib/env";
import { AppError } from "@/lib/errors";

export type StoredObject = { body: Uint8Array<ArrayBuffer>; contentType: string };

/** An object that the database names and the bucket does not have. The key goes to the log, never to a browser. */
export class MissingObjectError extends Error {
  override readonly name = "MissingObjectError";
  constructor(readonly key: string) {
    super(`The bucket has no object ${key}.`);
  }
}

/** Stores an object; once this returns, it is kept. Throws "unavailable" when the storage cannot be used. */
export async function putObject(key: string, body: Uint8Array, contentType: string): Promise<void> {
  const { S3_BUCKET } = storageEnv();
  await ask(() =>
    client().send(new PutObjectCommand({ Bucket: S3_BUCKET, Key: key, Body: body, ContentType: contentType })),
  );
}

/** Reads an object whole. Throws MissingObjectError, or "unavailable" when the storage cannot be used. */
export async function getObject(key: string): Promise<StoredObject> {
  const { S3_BUCKET } = storageEnv();
  return ask(async () => {
    const answer = await client().send(new GetObjectCommand({ Bucket: S3_BUCKET, Key: key }));
    if (!answer.Body) throw new MissingObjectError(key);
    const body = new Uint8Array(await answer.Body.transformToByteArray());
    return { body, contentType: answer.ContentType ?? "application/octet-stream" };
  }, key);
}

/** Removes an object; one that is not there is as good as removed. */
export async function deleteObject(key: string): Promise<void> {
  const { S3_BUCKET } = storageEnv();
  await ask(() => client().send(new DeleteObjectCommand({ Bucket: S3_BUCKET, Key: key })));
}

let opened: S3Client | undefined;

function client(): S3Client {
  opened ??= openClient();
  return opened;
}

function openClient(): S3Client {
  const { S3_ENDPOINT, S3_REGION, S3_ACCESS_KEY_ID, S3_SECRET_ACCESS_KEY } = storageEnv();
  const hasKeys = S3_ACCESS_KEY_ID !== undefined && S3_SECRET_ACCESS_KEY !== undefined;
  return new S3Client({
    region: S3_REGION,
    // Services other than Amazon's are reached by path, since their buckets seldom have host names of their own.
    ...(S3_ENDPOINT && { endpoint: S3_ENDPOINT, forcePathStyle: true }),
    ...(hasKeys && { credentials: { accessKeyId: S3_ACCESS_KEY_ID, secretAccessKey: S3_SECRET_ACCESS_KEY } }),
    // Not every S3 service knows the newer checksums.
    requestChecksumCalculation: "WHEN_REQUIRED",
    responseChecksumValidation: "WHEN_REQUIRED",
    requestHandler: { connectionTimeout: 3_000, requestTimeout: 30_000 },
  });
}

async function ask<Answer>(send: () => Promise<Answer>, key = ""): Promise<Answer> {
  try {
    return await send();
  } catch (error) {
    if (error instanceof MissingObjectError) throw error;
    if (error instanceof NoSuchKey) throw new MissingObjectError(key);
    const unavailable = new AppError(
      "unavailable",
      "storage-unavailable",
      "The photographs cannot be reached at the moment. Try again in a minute.",
    );
    unavailable.cause = error;
    throw unavailable;
  }
}
