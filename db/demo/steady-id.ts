import { createHash } from "node:crypto";

/** A UUIDv7 that hangs on a name alone, so that loading the demo again makes nothing twice. Its moment is a fixed one. */
export function steadyId(name: string): string {
  const digest = createHash("sha256").update(`demo fleet: ${name}`).digest("hex");
  const variant = ((parseInt(digest[3] ?? "0", 16) & 3) | 8).toString(16);
  return `0196f400-0000-7${digest.slice(0, 3)}-${variant}${digest.slice(4, 7)}-${digest.slice(8, 20)}`;
}
