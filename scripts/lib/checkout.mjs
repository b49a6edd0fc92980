// One `npm start` per checkout: a second one is told where the first one is.
import { mkdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { processTag, root, UserError } from "./proc.mjs";

/** Claims the checkout until this process ends; returns a function that notes the address for others. */
export function claimCheckout() {
  const file = path.join(root, ".data/start.lock");
  mkdirSync(path.dirname(file), { recursive: true });
  const mine = processTag(process.pid);
  for (;;) {
    try {
      writeFileSync(file, JSON.stringify({ tag: mine }), { flag: "wx" });
      break;
    } catch (e) {
      if (e.code !== "EEXIST") throw e;
      const other = readOther(file);
      const pid = Number(String(other.tag).split(":")[0]);
      if (pid && processTag(pid) === other.tag) {
        throw new UserError(
          `Gudgeon already runs from this folder${other.url ? ` at ${other.url}` : ""} (process ${pid}). Stop that one first, or use it.`,
        );
      }
      rmSync(file, { force: true }); // its holder died
    }
  }
  process.on("exit", () => rmSync(file, { force: true }));
  return (url) => writeFileSync(file, JSON.stringify({ tag: mine, url }));
}

function readOther(file) {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch {
    return {};
  }
}
