import * as z from "zod";

// The content security policy forbids making code from strings; zod would try, and be refused.
z.config({ jitless: true });

/** Why the server did not answer as hoped. */
export class NoAnswer extends Error {
  readonly status: number;
  readonly because: string;

  /** `status` 0: nothing came back at all. */
  constructor(status: number, because: string) {
    super(because);
    this.status = status;
    this.because = because;
  }
}

const Problem = z.object({ title: z.string(), detail: z.string().optional() });
const PATIENCE_MS = 20_000;

/** One request to the server. @throws NoAnswer with the status and the problem's words, or status 0 where there is no signal. */
export async function request(path: string, init: RequestInit = {}): Promise<unknown> {
  let response: Response;
  try {
    response = await fetch(path, { credentials: "same-origin", cache: "no-store", signal: AbortSignal.timeout(PATIENCE_MS), ...init });
  } catch {
    throw new NoAnswer(0, "no signal");
  }
  const body: unknown = await response.json().catch(() => null);
  if (response.ok) return body;
  const problem = Problem.safeParse(body);
  throw new NoAnswer(response.status, problem.success ? (problem.data.detail ?? problem.data.title) : `answer ${response.status}`);
}

export const sendJson = (path: string, body: unknown): Promise<unknown> =>
  request(path, { method: "POST", headers: { "content-type": "application/json" }, body: JSON.stringify(body) });
