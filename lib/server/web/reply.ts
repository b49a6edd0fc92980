import "server-only";
import type { EndpointSpec } from "./endpoint";
import { versionOf } from "./failure";

/** An answer in the shape that was promised; one of another shape is our fault, and a 500. */
export function reply(answer: unknown, spec: EndpointSpec): Response {
  if (answer instanceof Response) {
    if (!answer.headers.has("cache-control")) answer.headers.set("cache-control", "private, no-store");
    return answer;
  }
  const headers = new Headers({ "cache-control": "private, no-store" });
  if (!spec.output) return new Response(null, { status: 204, headers });
  const parsed = spec.output.safeParse(answer);
  if (!parsed.success) throw new Error(`the answer of "${spec.summary}" is not what it promises`, { cause: parsed.error });
  const version = versionOf(answer);
  if (version !== null) headers.set("etag", `"${version}"`);
  headers.set("content-type", "application/json");
  return new Response(JSON.stringify(parsed.data), { status: spec.status ?? 200, headers });
}
