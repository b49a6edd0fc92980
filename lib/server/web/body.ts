import "server-only";
import { isKeepable } from "@/lib/core/contract/kept-text";
import { Problem } from "@/lib/core/contract/problem";

export const mediaType = (request: Request) => (request.headers.get("content-type") ?? "").split(";")[0]?.trim().toLowerCase() ?? "";

/** The body's bytes, read no further than `maxBytes`. */
export async function readBytes(request: Request, accepted: readonly string[], maxBytes: number): Promise<Uint8Array> {
  if (!accepted.includes(mediaType(request))) throw Problem.wrongMediaType(accepted);
  // What is said is checked first: a large upload is refused before it is sent.
  if (Number(request.headers.get("content-length") ?? 0) > maxBytes) throw Problem.tooLarge(maxBytes);
  const chunks: Uint8Array[] = [];
  let size = 0;
  for await (const chunk of request.body ?? []) {
    size += chunk.byteLength;
    if (size > maxBytes) throw Problem.tooLarge(maxBytes);
    chunks.push(chunk);
  }
  return Buffer.concat(chunks);
}

/** `asItCame`: text that cannot be kept is left for the shape to judge, item by item; else it refuses the whole. */
export async function readJson(request: Request, maxBytes: number, asItCame = false): Promise<unknown> {
  const bytes = await readBytes(request, ["application/json"], maxBytes);
  try {
    return JSON.parse(new TextDecoder("utf-8", { fatal: true }).decode(bytes), asItCame ? undefined : storable);
  } catch (error) {
    throw error instanceof Problem ? error : Problem.malformed("The body is not JSON.");
  }
}

function storable(key: string, value: unknown): unknown {
  if (!isKeepable(key) || (typeof value === "string" && !isKeepable(value)))
    throw Problem.malformed("There is a character in it that cannot be kept.");
  return value;
}
