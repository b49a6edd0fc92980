import "server-only";
import { readFileSync } from "node:fs";
import path from "node:path";
import * as z from "zod";

/** Pages made when Gudgeon is built, the same for everyone: everything under app/(flow). */
const STATIC_PATHS = ["/diagnose"];

export const isStaticPage = (pathname: string): boolean => STATIC_PATHS.some((p) => pathname === p || pathname.startsWith(`${p}/`));

const Hashes = z.array(z.string().regex(/^'sha256-[A-Za-z0-9+/]+=*'$/));
let known: readonly string[] | undefined;

/**
 * The hashes of the inline scripts in the static pages, gathered after the build into a file beside the server. Null
 * where there is none: `next dev` makes pages anew each time.
 */
export function staticScriptHashes(): readonly string[] | null {
  if (known) return known;
  try {
    known = Hashes.parse(JSON.parse(readFileSync(path.join(process.cwd(), process.env.SCRIPT_HASHES ?? "script-hashes.json"), "utf8")));
    return known;
  } catch {
    return null;
  }
}
