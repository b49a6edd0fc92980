import "server-only";

/** Lets through only names that we make ourselves: nothing that leads out of the folder or that a file system would choke on. */
export function checkedKey(key: string): string {
  if (!/^[A-Za-z0-9_-]+(?:\/[A-Za-z0-9_-]+)*(?:\.[a-z0-9]{1,8})?$/.test(key))
    throw new Error(`Bad key for a stored file: ${JSON.stringify(key)}`);
  return key;
}
