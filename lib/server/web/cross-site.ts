import "server-only";
import { Problem } from "@/lib/core/contract/problem";

const SAFE = new Set(["GET", "HEAD", "OPTIONS"]);

/**
 * Refuses a change that another site's page asks for with this person's cookie. Browsers say where a request comes from
 * in Sec-Fetch-Site, older ones in Origin; what sends neither is no browser and carries nobody's cookie by accident.
 */
export function refuseCrossSite(request: Request): void {
  if (SAFE.has(request.method)) return;
  const site = request.headers.get("sec-fetch-site");
  if (site === "same-origin" || site === "none") return;
  const origin = request.headers.get("origin");
  if (site === null && origin === null) return;
  if (site === null && origin !== null && isOurs(origin, request)) return;
  throw new Problem(403, "cross-site", "That came from another site", "Open Gudgeon itself and try again.");
}

function isOurs(origin: string, request: Request): boolean {
  if (!URL.canParse(origin)) return false;
  const url = new URL(origin);
  const site = process.env.AUTH_URL;
  return url.host === request.headers.get("host") || (site !== undefined && url.origin === new URL(site).origin);
}
