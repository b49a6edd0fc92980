import "server-only";
import { createReadStream } from "node:fs";
import { mkdir, rename, rm, stat, writeFile } from "node:fs/promises";
import path from "node:path";
import { Readable } from "node:stream";
import { randomUUID } from "node:crypto";
import type { ObjectStore } from "./object-store";
import { checkedKey } from "./store-key";

export function folderStore(root: string): ObjectStore {
  const at = (key: string) => path.join(/* turbopackIgnore: true */ root, checkedKey(key));
  return {
    async put(key, body) {
      const file = at(key);
      await mkdir(path.dirname(file), { recursive: true, mode: 0o700 });
      const unfinished = `${file}.${randomUUID()}.tmp`;
      await writeFile(unfinished, body, { mode: 0o600 });
      await rename(unfinished, file);
    },
    async get(key) {
      const file = at(key);
      const found = await stat(file).catch(() => null);
      if (!found?.isFile()) return null;
      return { size: found.size, body: Readable.toWeb(createReadStream(file)) as ReadableStream<Uint8Array> };
    },
    async delete(key) {
      await rm(at(key), { force: true });
    },
  };
}
