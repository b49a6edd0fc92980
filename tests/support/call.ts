import type { Handler } from "@/lib/server/web/endpoint";
import type { Verb } from "@/lib/server/web/openapi";
import { routes } from "@/app/api/v1/routes";
import { cookieOf, type TestPerson } from "./people";

export type Asked = {
  as?: TestPerson | undefined;
  body?: unknown;
  bytes?: Uint8Array;
  type?: string;
  version?: number | string;
  headers?: Record<string, string>;
};

/** Calls a route of the API as a browser of this person would, without a server in between. `path`: "/fleets/{id}/boats?limit=2". */
export async function call(verb: Verb, path: string, { as, body, bytes, type, version, headers = {} }: Asked = {}): Promise<Response> {
  const url = new URL(`http://localhost:3000/api/v1${path}`);
  const { handler, params } = routeOf(verb, url.pathname.slice("/api/v1".length));
  const sent = new Headers(headers);
  if (as) sent.set("cookie", await cookieOf(as));
  if (version !== undefined) sent.set("if-match", typeof version === "number" ? `"${version}"` : version);
  const content = bytes ?? (body === undefined ? undefined : typeof body === "string" ? body : JSON.stringify(body));
  if (content !== undefined) sent.set("content-type", type ?? "application/json");
  return handler(new Request(url, { method: verb, headers: sent, ...(content === undefined ? {} : { body: content as BodyInit }) }), {
    params: Promise.resolve(params),
  });
}

function routeOf(verb: Verb, pathname: string): { handler: Handler; params: Record<string, string> } {
  const parts = pathname.split("/");
  for (const [pattern, verbs] of Object.entries(routes)) {
    const wanted = pattern.split("/");
    const handler = verbs[verb];
    if (!handler || wanted.length !== parts.length) continue;
    if (!wanted.every((part, i) => part.startsWith("{") || part === parts[i])) continue;
    return {
      handler,
      params: Object.fromEntries(wanted.flatMap((part, i) => (part.startsWith("{") ? [[part.slice(1, -1), parts[i] ?? ""]] : []))),
    };
  }
  throw new Error(`there is no ${verb} ${pathname}`);
}
