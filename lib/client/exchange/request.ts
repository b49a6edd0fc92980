import * as z from "zod";
import { ProblemBody, type FieldError } from "@/lib/core/contract/problem";

// The content security policy forbids making code from strings; zod would try, and be refused.
z.config({ jitless: true });

/** Why the server did not answer as hoped. */
export class NoAnswer extends Error {
  readonly status: number;
  readonly because: string;
  /** Which fields were not right. */
  readonly errors: readonly FieldError[];
  /** With a 412: the thing as it is now. */
  readonly current: unknown;
  /** The server's own word; not that of a proxy, or of a harbour's sign-in page between here and there. */
  readonly fromServer: boolean;

  /** `status` 0: nothing came back at all. */
  constructor(status: number, because: string, problem?: Pick<ProblemBody, "errors" | "current">) {
    super(because);
    this.fromServer = problem !== undefined;
    this.status = status;
    this.because = because;
    this.errors = problem?.errors ?? [];
    this.current = problem?.current;
  }

  /** Nothing came back, or something on the way answered in the server's place. */
  get isNoSignal(): boolean {
    return this.status === 0 || (!this.fromServer && [403, 404, 407, 511].includes(this.status));
  }
}

const PATIENCE_MS = 20_000;

/** One request to the server. @throws NoAnswer with the status and the problem's words, or status 0 where there is no signal. */
export async function request(path: string, init: RequestInit = {}): Promise<unknown> {
  let response: Response;
  try {
    response = await fetch(path, { credentials: "same-origin", cache: "no-store", signal: AbortSignal.timeout(PATIENCE_MS), ...init });
  } catch {
    throw new NoAnswer(0, "no signal");
  }
  if (response.ok && response.status === 204) return null;
  const body: unknown = await response.json().catch(() => undefined);
  // A page where an answer was due: a harbour's network wants signing in to before it lets anything through.
  if (response.ok && body === undefined) throw new NoAnswer(0, "no signal");
  if (response.ok) return body;
  const problem = ProblemBody.partial({ type: true, status: true, detail: true }).safeParse(body);
  if (!problem.success) throw new NoAnswer(response.status, `answer ${response.status}`);
  throw new NoAnswer(response.status, problem.data.detail ?? problem.data.title, problem.data);
}

type Sending = {
  method?: "POST" | "PUT" | "PATCH";
  /** The version that the change was made to; somebody else's change since then is a 412. */
  version?: number;
};

/** Sends a thing as JSON. @throws NoAnswer */
export const sendJson = (path: string, body: unknown, { method = "POST", version }: Sending = {}): Promise<unknown> =>
  request(path, { method, headers: { "content-type": "application/json", ...ifMatch(version) }, body: JSON.stringify(body) });

/** Takes away the version that was seen, or with a 412 nothing. @throws NoAnswer */
export const remove = (path: string, version: number): Promise<unknown> => request(path, { method: "DELETE", headers: ifMatch(version) });

const ifMatch = (version: number | undefined): Record<string, string> => (version === undefined ? {} : { "if-match": `"${version}"` });
