/** What we use of s3rver 3.7.1, which ships no types. */
declare module "s3rver" {
  import type { IncomingMessage, ServerResponse } from "node:http";

  type Options = {
    directory: string;
    silent: boolean;
    vhostBuckets: boolean;
    configureBuckets: { name: string }[];
  };

  class S3rver {
    constructor(options: Options);
    store: import("s3rver/lib/stores/filesystem").default;
    context: { store: import("s3rver/lib/stores/filesystem").default };
    configureBuckets(): Promise<void>;
    callback(): (request: IncomingMessage, response: ServerResponse) => void;
  }
  export default S3rver;
}

declare module "s3rver/lib/stores/filesystem" {
  import type { Readable } from "node:stream";

  type Incoming = { bucket: string; key: string; content: Readable | Buffer; metadata: Record<string, string> };

  class FilesystemStore {
    constructor(directory: string);
    getResourcePath(bucket: string, key: string, resource: string): string;
    putObject(object: Incoming): Promise<{ size: number; md5: string }>;
    putMetadata(bucket: string, key: string, metadata: Record<string, string>, md5: string): Promise<void>;
  }
  export default FilesystemStore;
}

declare module "s3rver/lib/models/account" {
  class AWSAccount {
    createKeyPair(accessKeyId: string, secretAccessKey: string): void;
    revokeAccessKey(accessKeyId: string): void;
    static DUMMY_ACCOUNT: AWSAccount;
  }
  export default AWSAccount;
}
