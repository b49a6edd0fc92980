import "server-only";
import type { diagnoses } from "@/db/schema/diagnoses";
import type { TreeVersionInfo } from "@/lib/core/contract/tree";

/** The version that a diagnosis began with and stays with. */
export function pinnedVersion(
  row: Pick<typeof diagnoses.$inferSelect, "shippedVersionId" | "ownVersionId">,
): Pick<TreeVersionInfo, "id" | "from"> {
  return row.shippedVersionId === null ? { id: row.ownVersionId ?? "", from: "own" } : { id: row.shippedVersionId, from: "shipped" };
}
