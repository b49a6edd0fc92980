import "server-only";
import type * as z from "zod";
import type { Permission } from "@/lib/core/access/permissions";
import { Problem } from "@/lib/core/contract/problem";
import { Id } from "@/lib/core/contract/id";
import { prove, type FleetScope } from "../auth/scope";
import { sessionIdOf } from "../auth/session-cookie";
import { readBytes, readJson } from "./body";
import { refuseCrossSite } from "./cross-site";
import { problemResponse } from "./failure";
import { ifMatchVersion, parse } from "./parse";
import { reply } from "./reply";

/** What one verb of one address takes and gives: the route, its permission and its entry in the OpenAPI document. */
export type EndpointSpec = {
  permission: Permission | "signed-in" | "anyone";
  summary: string;
  params?: z.ZodObject;
  query?: z.ZodType;
  input?: z.ZodType;
  output?: z.ZodType;
  /** 200 unless said otherwise; 204 where nothing comes back. */
  status?: 200 | 201;
  /** A change that two people may make at once: needs If-Match, hands `version` on. */
  versioned?: boolean;
  /** Takes bytes of these kinds instead of JSON. */
  raw?: { accepts: readonly string[]; maxBytes: number };
  maxBytes?: number;
};

type Infer<S> = S extends z.ZodType ? z.output<S> : undefined;
type Given<S> = S extends z.ZodType ? z.input<S> : void;

/** What `run` is handed beside its scope. */
export type Call<S extends EndpointSpec> = {
  params: Infer<S["params"]>;
  query: Infer<S["query"]>;
  input: Infer<S["input"]>;
  version: S["versioned"] extends true ? number : undefined;
  bytes: S["raw"] extends object ? { body: Uint8Array; mediaType: string } : undefined;
};

export type Context = { params: Promise<Record<string, string>> };
export type Handler = ((request: Request, context: Context) => Promise<Response>) & { spec: EndpointSpec };

const DEFAULT_MAX_BYTES = 1_000_000;

/**
 * A route within a fleet (its address holds {fleetId}). Four things, always: parse, prove, run, translate. `run` may
 * answer with a Response of its own (a file's bytes); anything else is checked against `output`, and its `version`
 * becomes the ETag.
 */
export function endpoint<
  P extends Permission,
  const S extends EndpointSpec & { permission: P; params: z.ZodObject<{ fleetId: typeof Id }> },
>(spec: S & { run(scope: FleetScope<P>, call: Call<S>): Promise<Given<S["output"]> | Response> }): Handler {
  return handler(spec, async (request, params) => {
    const sessionId = await sessionIdOf(request.headers);
    if (!sessionId) throw Problem.signedOut();
    // An address that cannot be one of ours is not found, like one that is not.
    const where = spec.params.safeParse(params);
    if (!where.success) throw Problem.notFound();
    // Strangers and people who may not are turned away before their body is read, and no transaction waits for a slow sender.
    const pass = await prove({ sessionId }, where.data.fleetId, spec.permission);
    const call = (await readCall(request, spec, where.data)) as Call<S>;
    return reply(await pass.enter((scope) => spec.run(scope, call)), spec);
  });
}

export function handler(spec: EndpointSpec, work: (request: Request, params: Record<string, string>) => Promise<Response>): Handler {
  const handle = async (request: Request, context: Context): Promise<Response> => {
    try {
      refuseCrossSite(request);
      return await work(request, await context.params);
    } catch (error) {
      return problemResponse(error);
    }
  };
  return Object.assign(handle, { spec });
}

/** Everything of a request that is checked before anything is done: size, kind, shape, version. */
export async function readCall(request: Request, spec: EndpointSpec, params: unknown): Promise<Record<keyof Call<EndpointSpec>, unknown>> {
  const version = spec.versioned ? ifMatchVersion(request.headers) : undefined;
  const query = spec.query && parse(spec.query, Object.fromEntries(new URL(request.url).searchParams));
  const input = spec.input && parse(spec.input, await readJson(request, spec.maxBytes ?? DEFAULT_MAX_BYTES));
  const bytes = spec.raw && {
    body: await readBytes(request, spec.raw.accepts, spec.raw.maxBytes),
    mediaType: (request.headers.get("content-type") ?? "").split(";")[0]?.trim().toLowerCase() ?? "",
  };
  return { params, query, input, version, bytes };
}
