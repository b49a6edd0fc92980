import type { Situation } from "@/lib/core/tree/schema";

/** What has been said of an engine before the diagnosis begins: kept, so that a phone dropped in a pocket loses nothing. */
export type Draft = {
  engineId: string;
  complaint: string;
  /** null: not said yet. */
  situation: Situation | null;
  /** Ticked or unticked by hand; the rest follows the complaint. */
  chosen: Record<string, boolean>;
  mechanic: boolean;
  /** What was found at the other engine: the key of a finding, or that nobody can tell; null: not said. */
  otherEngine: string | null;
  boatIsSafe: boolean;
  /** When it was last changed; absent in what was kept before this was noted. */
  keptAt?: string;
};

/** After this long a boat may lie elsewhere, and another person may stand at the engine. */
const STALE_MS = 4 * 3_600_000;

/**
 * A draft taken up again. The words stay; where the boat is and who is at the
 * engine are asked anew after hours, and that the boat is safe each time: it
 * decides what is safe to try.
 */
export function takenUp(kept: Draft, now: number, mechanic: boolean): Draft {
  const age = now - Date.parse(kept.keptAt ?? "");
  const fresh = age >= 0 && age < STALE_MS;
  return { ...kept, boatIsSafe: false, ...(fresh ? {} : { situation: null, mechanic }) };
}

export const emptyDraft = (engineId: string, mechanic: boolean): Draft => ({
  engineId,
  complaint: "",
  situation: null,
  chosen: {},
  mechanic,
  otherEngine: null,
  boatIsSafe: false,
});
