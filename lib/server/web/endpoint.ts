import "server-only";
import type * as z from "zod";
import type { Permission } from "@/lib/core/access/permissions";
import { Problem } from "@/lib/core/contract/problem";
import type { Id } from "@/lib/core/contract/id";
import { prove, type FleetScope, type Pass } from "../auth/scope";
import { sessionIdOf } from "../auth/session-cookie";
import { mediaType, readBytes, readJson } from "./body";
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
  raw?: Raw;
  maxBytes?: number;
  /** Takes text that cannot be kept as far as `run`, which answers for each item by itself. */
  itemByItem?: boolean;
};

export type Raw = { accepts: readonly string[]; maxBytes: number };
export type Nothing = z.ZodUndefined;

/** What `run` is handed beside its scope. */
export type Call<
  Params extends z.ZodType,
  Query extends z.ZodType,
  Input extends z.ZodType,
  Versioned extends boolean,
  R extends Raw | undefined,
> = {
  params: z.output<Params>;
  query: z.output<Query>;
  input: z.output<Input>;
  version: Versioned extends true ? number : undefined;
  bytes: R extends Raw ? { body: Uint8Array; mediaType: string } : undefined;
};

/** The answer: in the shape of `output`, or a Response of one's own. */
export type Answer<Output extends z.ZodType> = Promise<(Output extends Nothing ? void : z.input<Output>) | Response>;

/** A spec whose shapes are known, so that `run` is checked against them. */
export type Shaped<
  Who extends EndpointSpec["permission"],
  Params extends z.ZodType,
  Query extends z.ZodType,
  Input extends z.ZodType,
  Output extends z.ZodType,
  Versioned extends boolean,
  R extends Raw | undefined,
> = Pick<EndpointSpec, "summary" | "status" | "maxBytes" | "itemByItem"> & {
  permission: Who;
  params?: Params;
  query?: Query;
  input?: Input;
  output?: Output;
  versioned?: Versioned;
  raw?: R;
};

export type Context = { params: Promise<Record<string, string>> };
export type Handler = ((request: Request, context: Context) => Promise<Response>) & { spec: EndpointSpec };

const DEFAULT_MAX_BYTES = 1_000_000;

/** A route within a fleet (its address holds {fleetId}), as far as its shapes go. */
type InFleet<
  P extends Permission,
  Params extends z.ZodObject<{ fleetId: typeof Id }>,
  Query extends z.ZodType,
  Input extends z.ZodType,
  Output extends z.ZodType,
  Versioned extends boolean,
  R extends Raw | undefined,
> = Shaped<P, Params, Query, Input, Output, Versioned, R> & { params: Params };

/**
 * A route within a fleet. Four things, always: parse, prove, run, translate. `run` may answer with a Response of its own
 * (a file's bytes); anything else is checked against `output`, and its `version` becomes the ETag.
 */
export function endpoint<
  P extends Permission,
  Params extends z.ZodObject<{ fleetId: typeof Id }>,
  Query extends z.ZodType = Nothing,
  Input extends z.ZodType = Nothing,
  Output extends z.ZodType = Nothing,
  Versioned extends boolean = false,
  R extends Raw | undefined = undefined,
>(
  spec: InFleet<P, Params, Query, Input, Output, Versioned, R> & {
    run: (scope: FleetScope<P>, call: Call<Params, Query, Input, Versioned, R>) => Answer<Output>;
  },
): Handler {
  const { run, ...rest } = spec;
  return slowEndpoint<P, Params, Query, Input, Output, Versioned, R>({
    ...(rest as InFleet<P, Params, Query, Input, Output, Versioned, R>),
    run: (pass, call) => pass.enter((scope) => run(scope, call)),
  });
}

/**
 * As endpoint(), for work that takes longer than a transaction may be held open, such as encoding a picture or proving a
 * tree: `run` is handed the pass, and enters the fleet for no longer than it reads or writes.
 */
export function slowEndpoint<
  P extends Permission,
  Params extends z.ZodObject<{ fleetId: typeof Id }>,
  Query extends z.ZodType = Nothing,
  Input extends z.ZodType = Nothing,
  Output extends z.ZodType = Nothing,
  Versioned extends boolean = false,
  R extends Raw | undefined = undefined,
>(
  spec: InFleet<P, Params, Query, Input, Output, Versioned, R> & {
    run: (pass: Pass<P>, call: Call<Params, Query, Input, Versioned, R>) => Answer<Output>;
  },
): Handler {
  return handler(spec as EndpointSpec, async (request, params) => {
    const sessionId = await sessionIdOf(request.headers);
    if (!sessionId) throw Problem.signedOut();
    // An address that cannot be one of ours is not found, like one that is not.
    const where = spec.params.safeParse(params);
    if (!where.success) throw Problem.notFound();
    // Strangers and people who may not are turned away before their body is read, and no transaction waits for a slow sender.
    const { fleetId } = where.data as { fleetId: string };
    const pass = await prove({ sessionId }, fleetId, spec.permission);
    const call = await readCall<Call<Params, Query, Input, Versioned, R>>(request, spec as EndpointSpec, where.data);
    return reply(await spec.run(pass, call), spec as EndpointSpec);
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

/** Everything of a request that is checked before anything is done: size, kind, shape, version. The spec's shapes make what it returns a C. */
export async function readCall<C>(request: Request, spec: EndpointSpec, params: unknown): Promise<C> {
  const version = spec.versioned ? ifMatchVersion(request.headers) : undefined;
  const query = spec.query && parse(spec.query, Object.fromEntries(new URL(request.url).searchParams));
  const input = spec.input && parse(spec.input, await readJson(request, spec.maxBytes ?? DEFAULT_MAX_BYTES, spec.itemByItem));
  const bytes = spec.raw && { body: await readBytes(request, spec.raw.accepts, spec.raw.maxBytes), mediaType: mediaType(request) };
  return { params, query, input, version, bytes } as C;
}
