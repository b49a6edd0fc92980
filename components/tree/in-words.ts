import type { FindingLink, Strength } from "@/lib/core/tree/finding-link";
import type { Who } from "@/lib/core/tree/schema";
import { STRENGTHS } from "@/lib/core/tree/strength";

/** A strength as a mechanic reads it: the word, a count of 100, or times a sound engine's odds. */
export function linkInWords(link: FindingLink | Strength): string {
  if (typeof link === "number") {
    const word = Object.entries(STRENGTHS).find(([, share]) => share === link)?.[0];
    return word ?? `${Math.round(link * 100)} of 100`;
  }
  if (!/^x\d/.test(link)) return link;
  return `${link.slice(1)} times the odds of a sound engine`;
}

export const WHO: Readonly<Record<Who, string>> = {
  "skipper-at-sea": "Skipper, at sea too",
  "skipper-in-port": "Skipper, in port",
  mechanic: "Mechanic",
  workshop: "Workshop",
};

export const ENGINE_STATES = {
  any: "any state",
  cold: "cold",
  stopped: "stopped",
  cranking: "cranking",
  idling: "idling",
  "under-load": "under load",
} as const;
