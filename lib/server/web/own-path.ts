import "server-only";

/** A path of this site to go on to, or null: never //elsewhere, /\elsewhere or another scheme. */
export function ownPath(to: string | undefined): string | null {
  if (!to || !/^\/(?![/\\])/.test(to) || /[\u0000-\u001f\\]/.test(to)) return null;
  const url = new URL(to, "http://here.invalid");
  return url.host === "here.invalid" ? url.pathname + url.search + url.hash : null;
}
