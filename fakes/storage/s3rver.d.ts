declare module '@20minutes/s3rver' {
  import type { EventEmitter } from 'node:events';
  import type { RequestListener } from 'node:http';
  import type { Readable } from 'node:stream';

  interface FilesystemStore {
    putContent(objectPath: string, content: Readable | Buffer): Promise<[sizeBytes: number, md5: string]>;
    putMetadata(bucket: string, key: string, metadata: Record<string, string>, md5?: string): Promise<void>;
  }

  interface S3rverOptions {
    directory: string;
    silent?: boolean;
    vhostBuckets?: boolean;
    resetOnClose?: boolean;
    allowMismatchedSignatures?: boolean;
    configureBuckets?: { name: string; configs?: (string | Buffer)[] }[];
  }

  export default class S3rver extends EventEmitter {
    constructor(options: S3rverOptions);
    readonly store: FilesystemStore;
    configureBuckets(): Promise<unknown>;
    callback(): RequestListener;
  }
}

declare module '@20minutes/s3rver/lib/models/error.js' {
  export default class S3Error extends Error {
    constructor(code: string, message: string, detail?: Record<string, string>);
    readonly status: number;
    toXML(): string;
  }
}

declare module '@20minutes/s3rver/lib/models/account.js' {
  export const DUMMY_ACCOUNT: { createKeyPair(accessKeyId: string, secretAccessKey: string): void };
}
