import type { CauseLink } from "@/lib/core/tree/edits/set-link";

/** A link of the picture: from a finding to a cause, or from a cause to a remedy. */
export type DrawnLink = { cause: string; link: CauseLink };

/** The link that two ends of the picture make together; null where they make none. Ends: "check:key" with a finding, "cause:key", "remedy:key", "symptom". */
export function linkBetween(source: string, handle: string | null, target: string, symptom: string): DrawnLink | null {
  const [from, fromKey = ""] = source.split(":");
  const [to, toKey = ""] = target.split(":");
  if (from === "check" && to === "cause" && handle) return { cause: toKey, link: { gives: fromKey, finding: handle } };
  if (from === "cause" && to === "remedy") return { cause: fromKey, link: { curedBy: toKey } };
  if (from === "symptom" && to === "cause") return { cause: toKey, link: { shows: symptom } };
  if (from === "cause" && to === "cause" && fromKey !== toKey) return { cause: toKey, link: { broughtOnBy: fromKey } };
  return null;
}

/** The id of a drawn link, and back. */
export const linkId = (source: string, handle: string | null, target: string): string => [source, handle ?? "", target].join("|");

export function linkOfId(id: string, symptom: string): DrawnLink | null {
  const [source = "", handle = "", target = ""] = id.split("|");
  return linkBetween(source, handle === "" ? null : handle, target, symptom);
}
