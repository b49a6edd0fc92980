import "server-only";
import { getToken } from "next-auth/jwt";
import * as z from "zod";

/** Sixty days: a phone must not be signed out in the middle of a passage. A session ends earlier when its row is deleted. */
export const SESSION_SECONDS = 60 * 24 * 3600;

export const siteIsSecure = () => (process.env.AUTH_URL ?? "").startsWith("https://");

const SessionToken = z.object({ sid: z.uuid() });

/**
 * The session that the request's cookie names; null without a cookie that we signed. That the session still lives is
 * for its row to say.
 */
export async function sessionIdOf(headers: Headers): Promise<string | null> {
  const token = await getToken({ req: { headers }, secret: process.env.AUTH_SECRET, secureCookie: siteIsSecure() });
  const parsed = SessionToken.safeParse(token);
  return parsed.success ? parsed.data.sid : null;
}
