import "server-only";
import * as z from "zod";
import { createDocument, type ZodOpenApiOperationObject, type ZodOpenApiPathsObject } from "zod-openapi";
import { ProblemBody } from "@/lib/core/contract/problem";
import type { EndpointSpec, Handler } from "./endpoint";

export type Verb = "GET" | "POST" | "PUT" | "PATCH" | "DELETE";
/** Addresses under /api/v1, each with the handlers its route file exports. */
export type Routes = Readonly<Record<string, Partial<Readonly<Record<Verb, Handler>>>>>;

const REFUSALS: Record<string, string> = {
  "401": "signed out",
  "403": "the role does not allow it",
  "404": "not there, or of a fleet one is not in",
};

/** The OpenAPI document, made from the very objects that serve the routes. */
export function openapi(routes: Routes) {
  const paths: ZodOpenApiPathsObject = {};
  for (const [path, verbs] of Object.entries(routes)) {
    paths[`/api/v1${path}`] = Object.fromEntries(
      Object.entries(verbs).map(([verb, handler]) => [verb.toLowerCase(), operation(handler.spec, `${verb.toLowerCase()} ${path}`)]),
    );
  }
  return createDocument({
    openapi: "3.1.0",
    info: {
      title: "Gudgeon",
      version: "1",
      description: "Find the fault, prove the fix, know when it is back. Failures are problem documents (RFC 9457).",
    },
    components: { securitySchemes: { session: { type: "apiKey", in: "cookie", name: "authjs.session-token" } } },
    paths,
  });
}

function operation(spec: EndpointSpec, id: string): ZodOpenApiOperationObject {
  const refusals: Record<string, string> = spec.permission === "anyone" ? {} : { ...REFUSALS };
  if (spec.input ?? spec.raw) Object.assign(refusals, { "413": "too large", "415": "wrong kind of content", "422": "not right" });
  if (spec.versioned) Object.assign(refusals, { "412": "changed by somebody else meanwhile", "428": "If-Match is missing" });
  const problem = { "application/problem+json": { schema: ProblemBody } };
  const header = spec.versioned ? z.object({ "if-match": z.string() }) : undefined;
  return {
    operationId: id.replace(/[^a-z]+/gi, "-").replace(/-$/, ""),
    summary: spec.summary,
    description: `Permission: ${spec.permission}.`,
    security: spec.permission === "anyone" ? [] : [{ session: [] }],
    requestParams: {
      ...(spec.params && { path: spec.params }),
      ...(spec.query instanceof z.ZodObject && { query: spec.query }),
      ...(header && { header }),
    },
    ...(spec.input && { requestBody: { required: true, content: { "application/json": { schema: spec.input } } } }),
    ...(spec.raw && { requestBody: { required: true, content: Object.fromEntries(spec.raw.accepts.map((type) => [type, {}])) } }),
    responses: {
      [spec.output ? String(spec.status ?? 200) : "204"]: {
        description: spec.summary,
        ...(spec.output && { content: { "application/json": { schema: spec.output } } }),
      },
      ...Object.fromEntries(Object.entries(refusals).map(([status, description]) => [status, { description, content: problem }])),
    },
  };
}
