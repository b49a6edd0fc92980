import "server-only";
import type { S3Client } from "@aws-sdk/client-s3";
import type { ObjectStore } from "./object-store";
import { checkedKey } from "./store-key";

/** A bucket of any S3-like service. The SDK is large, so it is loaded with the first file. */
export function s3Store({
  bucket: Bucket,
  endpoint,
  region = "us-east-1",
}: {
  bucket: string;
  endpoint?: string | undefined;
  region?: string | undefined;
}): ObjectStore {
  let opened: Promise<{ sdk: typeof import("@aws-sdk/client-s3"); s3: S3Client }> | undefined;
  const open = () =>
    (opened ??= import("@aws-sdk/client-s3").then((sdk) => ({
      sdk,
      s3: new sdk.S3Client({ region, ...(endpoint ? { endpoint, forcePathStyle: true } : {}) }),
    })));
  return {
    async put(key, body, type) {
      const { sdk, s3 } = await open();
      await s3.send(new sdk.PutObjectCommand({ Bucket, Key: checkedKey(key), Body: body, ContentType: type }));
    },
    async get(key) {
      const { sdk, s3 } = await open();
      try {
        const found = await s3.send(new sdk.GetObjectCommand({ Bucket, Key: checkedKey(key) }));
        return found.Body ? { body: found.Body.transformToWebStream(), size: found.ContentLength ?? 0 } : null;
      } catch (e) {
        if (e instanceof sdk.NoSuchKey) return null;
        throw e;
      }
    },
    async delete(key) {
      const { sdk, s3 } = await open();
      await s3.send(new sdk.DeleteObjectCommand({ Bucket, Key: checkedKey(key) }));
    },
  };
}
