import "server-only";
import { randomUUID } from "node:crypto";
import { DrizzleQueryError } from "drizzle-orm";
import { Problem } from "@/lib/core/contract/problem";

/** PostgreSQL's code for what went wrong, under the wrapper that drizzle puts round it. */
function sqlState(error: unknown): string | null {
  for (let e: unknown = error, depth = 0; e instanceof Error && depth < 4; e = e.cause, depth++) {
    if ("code" in e && typeof e.code === "string") return e.code;
  }
  return null;
}

/** A failed query without its values: they are people's addresses, hashes of passwords, what somebody wrote. */
const forLog = (error: unknown): unknown => (error instanceof DrizzleQueryError ? { query: error.query, cause: error.cause } : error);

const unavailable = () =>
  new Problem(503, "unavailable", "The server is busy", "Try again in a moment. What you have written down is kept on this device.");

/** Any failure as a problem that may be read; what is ours is logged under a reference and told by that only. */
export function problemOf(error: unknown): Problem {
  if (error instanceof Problem) return error;
  const code = sqlState(error);
  switch (code) {
    case "23505":
      return Problem.conflict("Something with the same identity is already there.");
    case "23503":
      return Problem.conflict("It refers to something that is not in this fleet.");
    case "22021":
    case "22P05":
      return Problem.malformed("There is a character in it that cannot be kept.");
    case "40001":
    case "40P01":
    case "55P03":
    case "57014":
    case "57P01":
    case "57P03":
    case "53300":
    case "ECONNREFUSED":
    case "ECONNRESET":
      console.error("unavailable:", forLog(error));
      return unavailable();
  }
  const reference = randomUUID().slice(0, 8);
  console.error(`failure ${reference}:`, forLog(error));
  return new Problem(
    500,
    "failure",
    "Something went wrong here",
    `The fault is the server's. If it stays, tell whoever runs it: ${reference}.`,
    { reference },
  );
}

export function problemResponse(error: unknown): Response {
  const problem = problemOf(error);
  const headers = new Headers({ "content-type": "application/problem+json", "cache-control": "no-store" });
  const { until, current } = problem.extras;
  if (typeof until === "string") headers.set("retry-after", new Date(until).toUTCString());
  else if (problem.status === 503) headers.set("retry-after", "5");
  const version = versionOf(current);
  if (version !== null) headers.set("etag", `"${version}"`);
  return new Response(JSON.stringify(problem.toBody()), { status: problem.status, headers });
}

/** The version that an answer carries, for its ETag. */
export function versionOf(value: unknown): number | null {
  return typeof value === "object" && value !== null && "version" in value && typeof value.version === "number" ? value.version : null;
}
