import "server-only";
import { folderStore } from "./folder-store";
import { s3Store } from "./s3-store";

/** Where files live: a folder of this machine, or a bucket that all instances share. */
export interface ObjectStore {
  /** Whole or not at all. */
  put(key: string, body: Uint8Array, type: string): Promise<void>;
  get(key: string): Promise<{ body: ReadableStream<Uint8Array>; size: number } | null>;
  delete(key: string): Promise<void>;
}

let chosen: ObjectStore | undefined;

/** S3 where S3_BUCKET is set (S3_ENDPOINT, AWS_REGION beside it), else the folder FILES_DIR. */
export function objectStore(): ObjectStore {
  chosen ??= process.env.S3_BUCKET
    ? s3Store({ bucket: process.env.S3_BUCKET, endpoint: process.env.S3_ENDPOINT, region: process.env.AWS_REGION })
    : folderStore(process.env.FILES_DIR ?? ".data/files");
  return chosen;
}
