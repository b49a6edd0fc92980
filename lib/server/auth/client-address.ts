import "server-only";
import { isIPv6 } from "node:net";

/**
 * The network address a request came from, as far as it can be known, for counting tries. Behind proxies that add to
 * X-Forwarded-For, TRUSTED_PROXIES says how many: what stands before theirs may be made up. With none, the header
 * holds what the socket says and nothing else: scripts/lib/socket-address.mjs puts it there.
 */
export function clientAddress(headers: Headers): string {
  const hops = (headers.get("x-forwarded-for") ?? "")
    .split(",")
    .map((hop) => hop.trim())
    .filter(Boolean);
  const trusted = Number(process.env.TRUSTED_PROXIES ?? 0);
  const address = (trusted > 0 ? hops.at(-trusted) : hops[0]) ?? "unknown";
  // One household has a whole /64.
  return isIPv6(address) && !address.startsWith("::ffff:") ? groupsOf(address).slice(0, 4).join(":") : address.slice(0, 64);
}

/** The eight groups of an address; "::" stands for as many zeros as are missing. */
function groupsOf(address: string): string[] {
  const [head = [], tail = []] = address.split("::").map((part) => (part === "" ? [] : part.split(":")));
  return [...head, ...Array.from({ length: 8 - head.length - tail.length }, () => "0"), ...tail];
}
