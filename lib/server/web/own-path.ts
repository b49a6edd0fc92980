import "server-only";

/** A path of this site to go on to, or null: never //elsewhere, /\elsewhere or another scheme. */
export function ownPath(to: string | undefined): string | null {
  if (!to || !isPath(to)) return null;
  const url = new URL(to, "http://here.invalid");
  const path = url.pathname + url.search + url.hash;
  // Once more: "/.//elsewhere" is a path as it stands and //elsewhere once its dots are worked out.
  return url.host === "here.invalid" && isPath(path) ? path : null;
}

const isPath = (to: string) => /^\/(?![/\\])/.test(to) && !/[\u0000-\u001f\\]/.test(to);
