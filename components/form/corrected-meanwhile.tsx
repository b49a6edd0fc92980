import { Notice } from "@/components/ui/notice";
import type { Refusal } from "./use-save";

/** Somebody else corrected the line after this page was opened: theirs is read before it is put aside. */
export function CorrectedMeanwhile({ refusal }: { refusal: Refusal | null }) {
  if (refusal?.status !== 412) return null;
  return (
    <Notice tone="look" title="Somebody corrected this since you opened the page" live>
      Load the page again, read what it says now, then make your correction. Nothing was changed.
    </Notice>
  );
}
