import "server-only";
import type * as z from "zod";
import { Problem } from "@/lib/core/contract/problem";
import { findPerson, type Person } from "../auth/person";
import { sessionIdOf } from "../auth/session-cookie";
import { handler, readCall, type Answer, type Call, type EndpointSpec, type Handler, type Nothing, type Shaped } from "./endpoint";
import { parse } from "./parse";
import { reply } from "./reply";

/** A route about the person who asks, in no fleet: /me. The same four steps as endpoint(). */
export function personalEndpoint<
  Params extends z.ZodObject = z.ZodObject<Record<never, never>>,
  Query extends z.ZodType = Nothing,
  Input extends z.ZodType = Nothing,
  Output extends z.ZodType = Nothing,
>(
  spec: Shaped<"signed-in", Params, Query, Input, Output, false, undefined> & {
    run: (person: Person, call: Call<Params, Query, Input, false, undefined>) => Answer<Output>;
  },
): Handler {
  return handler(spec as EndpointSpec, async (request, params) => {
    const sessionId = await sessionIdOf(request.headers);
    const person = sessionId && (await findPerson(sessionId));
    if (!person) throw Problem.signedOut();
    const call = await readCall<Call<Params, Query, Input, false, undefined>>(
      request,
      spec as EndpointSpec,
      spec.params && parse(spec.params, params),
    );
    return reply(await spec.run(person, call), spec as EndpointSpec);
  });
}

/** A route for everyone, signed in or not: openapi.json. */
export function publicEndpoint<
  Params extends z.ZodObject = z.ZodObject<Record<never, never>>,
  Query extends z.ZodType = Nothing,
  Output extends z.ZodType = Nothing,
>(
  spec: Shaped<"anyone", Params, Query, Nothing, Output, false, undefined> & {
    run: (call: Call<Params, Query, Nothing, false, undefined>) => Answer<Output>;
  },
): Handler {
  return handler(spec as EndpointSpec, async (request, params) => {
    const call = await readCall<Call<Params, Query, Nothing, false, undefined>>(
      request,
      spec as EndpointSpec,
      spec.params && parse(spec.params, params),
    );
    return reply(await spec.run(call), spec as EndpointSpec);
  });
}
