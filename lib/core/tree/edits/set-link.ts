import type { FindingLink, Strength } from "../finding-link";
import type { Cause, FaultTree } from "../schema";

/** A link that begins at a cause: what it shows, what it gives, what cures it, what brings it on. */
export type CauseLink =
  | { shows: string }
  | { gives: string; /** A finding, or a span of bands "from..to". */ finding: string }
  | { curedBy: string }
  | { broughtOnBy: string };

/** The strength of a link; null where there is none. */
export function linkStrength(cause: Cause, link: CauseLink): FindingLink | null {
  if ("gives" in link) return cause.gives[link.gives]?.[link.finding] ?? null;
  if ("shows" in link) return cause.shows[link.shows] ?? null;
  if ("curedBy" in link) return cause.curedBy[link.curedBy] ?? null;
  return cause.broughtOnBy[link.broughtOnBy] ?? null;
}

/**
 * The tree with a cause's link set, or (null) taken out. Only a link to a
 * finding may be a factor ("x20"); the schema refuses one elsewhere.
 */
export function setLink(tree: FaultTree, causeKey: string, link: CauseLink, strength: FindingLink | null): FaultTree {
  return { ...tree, causes: tree.causes.map((cause) => (cause.key === causeKey ? linked(cause, link, strength) : cause)) };
}

function linked(cause: Cause, link: CauseLink, strength: FindingLink | null): Cause {
  const plain = strength as Strength | null;
  if ("shows" in link) return { ...cause, shows: put(cause.shows, link.shows, plain) };
  if ("curedBy" in link) return { ...cause, curedBy: put(cause.curedBy, link.curedBy, plain) };
  if ("broughtOnBy" in link) return { ...cause, broughtOnBy: put(cause.broughtOnBy, link.broughtOnBy, plain) };
  const row = put(cause.gives[link.gives] ?? {}, link.finding, strength);
  return { ...cause, gives: put(cause.gives, link.gives, Object.keys(row).length === 0 ? null : row) };
}

function put<T>(map: Readonly<Record<string, T>>, key: string, value: T | null): Record<string, T> {
  if (value !== null) return { ...map, [key]: value };
  return Object.fromEntries(Object.entries(map).filter(([other]) => other !== key));
}
