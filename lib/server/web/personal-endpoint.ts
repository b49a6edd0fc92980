import "server-only";
import type * as z from "zod";
import { Problem } from "@/lib/core/contract/problem";
import { findPerson, type Person } from "../auth/person";
import { sessionIdOf } from "../auth/session-cookie";
import { handler, readCall, type Call, type EndpointSpec, type Handler } from "./endpoint";
import { parse } from "./parse";
import { reply } from "./reply";

type Given<S> = S extends z.ZodType ? z.input<S> : void;

/** A route about the person who asks, in no fleet: /me. The same four steps as endpoint(). */
export function personalEndpoint<const S extends EndpointSpec & { permission: "signed-in" }>(
  spec: S & { run(person: Person, call: Call<S>): Promise<Given<S["output"]> | Response> },
): Handler {
  return handler(spec, async (request, params) => {
    const sessionId = await sessionIdOf(request.headers);
    const person = sessionId && (await findPerson(sessionId));
    if (!person) throw Problem.signedOut();
    const call = (await readCall(request, spec, spec.params && parse(spec.params, params))) as Call<S>;
    return reply(await spec.run(person, call), spec);
  });
}

/** A route for everyone, signed in or not: openapi.json. */
export function publicEndpoint<const S extends EndpointSpec & { permission: "anyone" }>(
  spec: S & { run(call: Call<S>): Promise<Given<S["output"]> | Response> },
): Handler {
  return handler(spec, async (request, params) => {
    const call = (await readCall(request, spec, spec.params && parse(spec.params, params))) as Call<S>;
    return reply(await spec.run(call), spec);
  });
}
