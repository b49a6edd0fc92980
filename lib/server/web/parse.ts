import "server-only";
import type * as z from "zod";
import { Problem, type FieldError } from "@/lib/core/contract/problem";

const fieldErrors = (error: z.ZodError): FieldError[] =>
  error.issues.slice(0, 20).map((issue) => ({ path: issue.path.join("."), says: issue.message }));

/** Parsed, or a 422 that names the fields. */
export function parse<S extends z.ZodType>(shape: S, value: unknown): z.output<S> {
  const parsed = shape.safeParse(value);
  if (!parsed.success) throw Problem.invalid(fieldErrors(parsed.error));
  return parsed.data;
}

/** The version in an If-Match header, as it stood in the ETag: "3". 428 where there is none. */
export function ifMatchVersion(headers: Headers): number {
  const value = headers.get("if-match");
  if (value === null) throw Problem.versionNeeded();
  const digits = /^(?:W\/)?"(\d{1,9})"$/.exec(value.trim())?.[1];
  if (digits === undefined) throw Problem.malformed('If-Match must name one version, for example "3".');
  return Number(digits);
}
