import * as z from "zod";

/** What the API answers when it cannot do what was asked: a problem document (RFC 9457). */
export const ProblemBody = z.looseObject({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  /** In words a skipper can read: what is wrong, and what to do. */
  detail: z.string(),
  /** Which fields, and what is wrong with each. */
  errors: z.array(z.object({ path: z.string(), says: z.string() })).optional(),
  /** The version as it is now, where an If-Match was stale. */
  current: z.unknown().optional(),
  /** When to try again, where there were too many tries. */
  until: z.string().optional(),
});
export type ProblemBody = z.infer<typeof ProblemBody>;

export type FieldError = { path: string; says: string };

/** A failure that people may read. Thrown anywhere, translated once at the edge. */
export class Problem extends Error {
  override readonly name = "Problem";

  constructor(
    readonly status: number,
    /** Kebab-case, stable: becomes the problem's type. */
    readonly code: string,
    readonly title: string,
    readonly detail: string,
    readonly extras: Readonly<Record<string, unknown>> = {},
  ) {
    super(`${title}: ${detail}`);
  }

  toBody(): ProblemBody {
    return { type: `urn:gudgeon:problem:${this.code}`, title: this.title, status: this.status, detail: this.detail, ...this.extras };
  }

  static malformed(detail: string): Problem {
    return new Problem(400, "malformed", "That could not be read", detail);
  }

  static signedOut(): Problem {
    return new Problem(
      401,
      "signed-out",
      "You are signed out",
      "Sign in, then try again. What you have written down is kept on this device.",
    );
  }

  static notAllowed(detail = "Your role in this fleet does not allow this. Ask an owner of the fleet."): Problem {
    return new Problem(403, "not-allowed", "You may not do this", detail);
  }

  /** Also what a stranger gets: whether a thing exists is not told to people outside its fleet. */
  static notFound(detail = "There is nothing here, or it belongs to a fleet you are not in."): Problem {
    return new Problem(404, "not-found", "Not found", detail);
  }

  static conflict(detail: string): Problem {
    return new Problem(409, "conflict", "That does not go together with what is there", detail);
  }

  /** `current`: the thing as it is now, so that the person can compare. */
  static stale(current: unknown): Problem {
    return new Problem(412, "stale", "Somebody changed this before you", "Look at what it says now, then make your change again.", {
      current,
    });
  }

  static tooLarge(maxBytes: number): Problem {
    return new Problem(413, "too-large", "That is too large", `At most ${Math.floor(maxBytes / 1000)} kB can be sent here.`);
  }

  static wrongMediaType(accepted: readonly string[]): Problem {
    return new Problem(415, "wrong-media-type", "That kind of content is not taken here", `Send ${accepted.join(" or ")}.`);
  }

  static invalid(errors: readonly FieldError[]): Problem {
    const first = errors[0];
    return new Problem(
      422,
      "invalid",
      "Something in it is not right",
      first ? `${first.path ? `${first.path}: ` : ""}${first.says}` : "Look it over.",
      { errors },
    );
  }

  static versionNeeded(): Problem {
    return new Problem(
      428,
      "version-needed",
      "Say which version you saw",
      'Send If-Match with the ETag of the version you changed, for example "3".',
    );
  }

  /** `until`: ISO moment from which it works again. */
  static tooMany(until: string): Problem {
    return new Problem(429, "too-many", "Too many tries", "Wait a while, then try again.", { until });
  }
}
