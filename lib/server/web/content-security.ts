import "server-only";
import { createHash } from "node:crypto";

/** How an inline script is named in a policy. */
export const scriptHash = (script: string): string => `'sha256-${createHash("sha256").update(script).digest("base64")}'`;

/**
 * What a page may load and run. `scripts` names the inline scripts it may have: by nonce on a page made for one
 * request, by hash on one that was made when Gudgeon was built.
 */
export function contentSecurityPolicy({
  scripts,
  development,
  secure,
}: {
  scripts: readonly string[];
  development: boolean;
  secure: boolean;
}): string {
  const directives: Record<string, readonly string[]> = {
    "default-src": ["'self'"],
    // React's development build evaluates strings to rebuild stack traces.
    "script-src": ["'self'", ...scripts, ...(development ? ["'unsafe-eval'"] : [])],
    "style-src": ["'self'", ...(development ? ["'unsafe-inline'"] : scripts.filter((s) => s.startsWith("'nonce-")))],
    // React Flow places its nodes by style attributes.
    "style-src-attr": ["'unsafe-inline'"],
    "img-src": ["'self'", "blob:", "data:"],
    "font-src": ["'self'"],
    "connect-src": ["'self'", ...(development ? ["ws:"] : [])],
    "worker-src": ["'self'", "blob:"],
    "manifest-src": ["'self'"],
    "object-src": ["'none'"],
    "base-uri": ["'none'"],
    "form-action": ["'self'"],
    "frame-ancestors": ["'none'"],
    ...(secure && { "upgrade-insecure-requests": [] }),
  };
  return Object.entries(directives)
    .map(([name, values]) => [name, ...values].join(" "))
    .join("; ");
}

/** The headers of every answer, page or not. The camera is for photos of the engine, the position for calling help. */
export function securityHeaders(secure: boolean): Record<string, string> {
  return {
    "x-content-type-options": "nosniff",
    "x-frame-options": "DENY",
    "referrer-policy": "same-origin",
    "permissions-policy":
      "camera=(self), geolocation=(self), screen-wake-lock=(self), microphone=(), payment=(), usb=(), browsing-topics=()",
    "cross-origin-opener-policy": "same-origin",
    "cross-origin-resource-policy": "same-origin",
    ...(secure && { "strict-transport-security": "max-age=31536000; includeSubDomains" }),
  };
}
