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
  otherEngine: "does" | "does-not" | null;
  boatIsSafe: boolean;
};

export const emptyDraft = (engineId: string, mechanic: boolean): Draft => ({
  engineId,
  complaint: "",
  situation: null,
  chosen: {},
  mechanic,
  otherEngine: null,
  boatIsSafe: false,
});
