// One `npm start` per checkout: a second one is told where the first one is.
import { rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { takeLock } from "./lock-file.mjs";
import { processTag, root, UserError } from "./proc.mjs";

/** Claims the checkout until this process ends; returns a function that notes the address for others. */
export function claimCheckout() {
  const file = path.join(root, ".data/start.lock");
  const other = takeLock(file);
  if (other) {
    throw new UserError(
      `Gudgeon already runs from this folder${other.url ? ` at ${other.url}` : ""} (process ${other.tag.split(":")[0]}). Stop that one first, or use it.`,
    );
  }
  process.on("exit", () => rmSync(file, { force: true }));
  return (url) => writeFileSync(file, JSON.stringify({ tag: processTag(process.pid), url }));
}
