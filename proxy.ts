import { NextResponse, type NextRequest } from "next/server";
import { LIGHT_SCRIPT } from "@/components/ui/light-script";
import { sessionIdOf, siteIsSecure } from "@/lib/server/auth/session-cookie";
import { contentSecurityPolicy, scriptHash, securityHeaders } from "@/lib/server/web/content-security";
import { builtScriptHashes } from "@/lib/server/web/script-hashes";

const needsSignIn = (pathname: string) => /^\/(account|f|workshop)(\/|$)/.test(pathname);

const development = process.env.NODE_ENV === "development";
const lightScript = scriptHash(LIGHT_SCRIPT);

/**
 * Names the inline scripts that a page may run: by a nonce, if it is made for this request; by their hashes, if it was
 * made when Gudgeon was built (the skipper's surface, "not found"). `next dev` makes the skipper's surface anew each
 * time and without a nonce.
 */
function inlineScripts(pathname: string, nonce: string): string[] {
  if (development && pathname.startsWith("/diagnose")) return ["'unsafe-inline'"];
  return [lightScript, ...builtScriptHashes(), `'nonce-${nonce}'`];
}

/**
 * Sets the security headers and turns signed-out visitors away early. That is a courtesy, by the cookie's signature
 * only: each page and each route proves for itself. (Not Auth.js' own wrapper: it signs the cookie anew on every
 * request, and one under way while somebody signs out would sign them in again.)
 */
export async function proxy(request: NextRequest): Promise<NextResponse> {
  const { pathname, search } = request.nextUrl;
  const secure = siteIsSecure();
  const nonce = Buffer.from(crypto.getRandomValues(new Uint8Array(16))).toString("base64");
  const policy = contentSecurityPolicy({ scripts: inlineScripts(pathname, nonce), development, secure });

  if (needsSignIn(pathname) && !(await sessionIdOf(request.headers))) {
    const to = new URL("/sign-in", request.nextUrl);
    to.searchParams.set("next", pathname + search);
    return withHeaders(NextResponse.redirect(to), policy, secure);
  }
  // Next reads the nonce from the request's policy and puts it on its own scripts.
  const headers = new Headers(request.headers);
  headers.set("content-security-policy", policy);
  return withHeaders(NextResponse.next({ request: { headers } }), policy, secure);
}

function withHeaders(response: NextResponse, policy: string, secure: boolean): NextResponse {
  response.headers.set("content-security-policy", policy);
  for (const [name, value] of Object.entries(securityHeaders(secure))) response.headers.set(name, value);
  return response;
}

export const config = { matcher: ["/((?!_next/static/|_next/image).*)"] };
