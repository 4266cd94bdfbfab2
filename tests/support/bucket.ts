import { randomUUID } from "node:crypto";
import { CreateBucketCommand, ListObjectsCommand, S3Client } from "@aws-sdk/client-s3";
import { storageEnv } from "@/lib/env";

/** Makes an empty bucket on the stand-in, so that one test file can count its own objects. Answers its name. */
export async function makeBucket(storage: Record<string, string>): Promise<string> {
  const name = `test-${randomUUID()}`;
  await clientFor(storage).send(new CreateBucketCommand({ Bucket: name }));
  return name;
}

/** The keys of every object in the bucket that the application uses. */
export async function listObjectKeys(): Promise<string[]> {
  const { S3_BUCKET, ...storage } = storageEnv();
  const answer = await clientFor(storage).send(new ListObjectsCommand({ Bucket: S3_BUCKET }));
  return (answer.Contents ?? []).flatMap(({ Key }) => Key ?? []);
}

function clientFor(storage: Record<string, string | undefined>): S3Client {
  const { S3_ENDPOINT, S3_REGION, S3_ACCESS_KEY_ID = "", S3_SECRET_ACCESS_KEY = "" } = storage;
  return new S3Client({
    endpoint: S3_ENDPOINT,
    region: S3_REGION,
    forcePathStyle: true,
    credentials: { accessKeyId: S3_ACCESS_KEY_ID, secretAccessKey: S3_SECRET_ACCESS_KEY },
  });
}
