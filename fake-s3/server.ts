import { createServer } from "node:http";
import S3rver from "s3rver";
import AWSAccount from "s3rver/lib/models/account";
import { storageEnv } from "../lib/env";
import { WholeObjectStore } from "./whole-object-store";

/**
 * A stand-in for an S3 service, on loopback only: tsx fake-s3/server.ts <folder> <port>. The bucket and the keys are the
 * application's own settings. s3rver neither checks newer signatures nor asks for any, so the random key id is what
 * keeps other programs of this machine out.
 */
const [folder, port] = process.argv.slice(2);
const { S3_BUCKET, S3_ACCESS_KEY_ID, S3_SECRET_ACCESS_KEY } = storageEnv();
if (!folder || !port || !S3_ACCESS_KEY_ID || !S3_SECRET_ACCESS_KEY) {
  throw new Error("Needs a folder, a port, S3_ACCESS_KEY_ID and S3_SECRET_ACCESS_KEY.");
}

AWSAccount.DUMMY_ACCOUNT.revokeAccessKey("S3RVER");
AWSAccount.DUMMY_ACCOUNT.createKeyPair(S3_ACCESS_KEY_ID, S3_SECRET_ACCESS_KEY);

const fake = new S3rver({
  directory: folder,
  silent: true,
  vhostBuckets: false,
  configureBuckets: [{ name: S3_BUCKET }],
});
fake.store = fake.context.store = new WholeObjectStore(folder);
await fake.configureBuckets();

const respond = fake.callback();
const server = createServer((request, response) => {
  if (request.headers.authorization?.includes(`Credential=${S3_ACCESS_KEY_ID}/`)) respond(request, response);
  else response.writeHead(403).end();
});
server.listen(Number(port), "127.0.0.1");
process.once("SIGTERM", () => {
  server.close();
  server.closeAllConnections();
});
