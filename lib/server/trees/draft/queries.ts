import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import { people } from "@/db/schema/fleets";
import { treeVersions } from "@/db/schema/trees";
import type { DraftInfo, TreeDraft } from "@/lib/core/contract/draft";
import { Problem } from "@/lib/core/contract/problem";
import type { FleetScope } from "@/lib/server/auth/scope";

const selectDraft = (scope: FleetScope) =>
  scope.tx
    .select({ draft: treeVersions, byName: people.name })
    .from(treeVersions)
    .innerJoin(people, and(eq(people.fleetId, treeVersions.fleetId), eq(people.userId, treeVersions.by)))
    .where(and(eq(treeVersions.fleetId, scope.fleetId), isNull(treeVersions.publishedAt)))
    .limit(1);

type Row = Awaited<ReturnType<typeof selectDraft>>[number];

/** The fleet's draft, whole; null when nobody is changing the tree. */
export async function findDraft(scope: FleetScope): Promise<TreeDraft | null> {
  const [row] = await selectDraft(scope);
  return row ? { ...infoOf(row), document: row.draft.document } : null;
}

/** @throws Problem 404 when there is no draft */
export async function getDraft(scope: FleetScope): Promise<TreeDraft> {
  const draft = await findDraft(scope);
  if (!draft) throw Problem.notFound("Nobody is changing the fault tree now. Begin a draft from the version in use.");
  return draft;
}

/**
 * The draft that somebody has before their eyes. An address and a version are not enough to name it: it may have been
 * published or given up since, and the next one may have been saved as often.
 *
 * @throws Problem 404 when there is no draft; 412, with the one that is there now, for any other or a newer one
 */
export async function getDraftAsSeen(scope: FleetScope, id: string, version: number): Promise<TreeDraft> {
  const draft = await getDraft(scope);
  if (draft.id !== id || draft.version !== version) throw Problem.stale(draft);
  return draft;
}

function infoOf({ draft, byName }: Row): DraftInfo {
  return {
    id: draft.id,
    version: draft.revision,
    title: draft.document.title,
    begunFrom: draft.begunFrom,
    takenUp: draft.takenUp,
    savedAt: draft.savedAt.toISOString(),
    by: byName,
  };
}
