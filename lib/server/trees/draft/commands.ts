import "server-only";
import { and, eq, isNull, sql } from "drizzle-orm";
import { uuidv7 } from "uuidv7";
import { shippedTreeVersions, trees, treeVersions } from "@/db/schema/trees";
import type { NewDraft, TreeDraft, TreeEdit } from "@/lib/core/contract/draft";
import { Problem } from "@/lib/core/contract/problem";
import type { TreeVersionInfo } from "@/lib/core/contract/tree";
import { applyEdit } from "@/lib/core/tree/edits/apply-edit";
import { parseTree } from "@/lib/core/tree/parse-tree";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { FleetScope } from "@/lib/server/auth/scope";
import { contentHash } from "../content-hash";
import { documentOf, findTreeVersion } from "../queries";
import { findDraft, getDraft, getDraftAsSeen } from "./queries";

/** Begins the fleet's draft from a published version. Where somebody has begun one already, that one is it. */
export async function beginDraft(scope: FleetScope<"tree:write">, { id, versionId }: NewDraft): Promise<TreeDraft> {
  await scope.tx.execute(sql`select pg_advisory_xact_lock(hashtext('tree draft'), hashtext(${scope.fleetId}))`);
  const there = await findDraft(scope);
  if (there) return there;
  const version = await findTreeVersion(scope, versionId);
  if (!version) throw Problem.notFound("There is no such version of the fault tree.");
  const document = await documentOf(scope, version);
  const takenUp = await takenUpBy(scope, version);
  await scope.tx.insert(treeVersions).values({
    fleetId: scope.fleetId,
    id,
    treeId: await ownTree(scope, version, takenUp),
    document,
    hash: contentHash(document),
    begunFrom: version.id,
    takenUp,
    by: scope.actor.userId,
  });
  return getDraft(scope);
}

async function takenUpBy(scope: FleetScope, version: TreeVersionInfo): Promise<string> {
  if (version.from === "shipped") return version.id;
  const [own] = await scope.tx
    .select({ takenUp: treeVersions.takenUp })
    .from(treeVersions)
    .where(and(eq(treeVersions.fleetId, scope.fleetId), eq(treeVersions.id, version.id)));
  if (!own) throw Problem.notFound();
  return own.takenUp;
}

/** The fleet's own tree of this key, made when the first change of it begins. */
async function ownTree(scope: FleetScope, version: TreeVersionInfo, ancestorId: string): Promise<string> {
  await scope.tx
    .insert(trees)
    .values({ fleetId: scope.fleetId, id: uuidv7(), key: version.key, title: version.title, ancestorId })
    .onConflictDoNothing();
  const [own] = await scope.tx
    .select({ id: trees.id })
    .from(trees)
    .where(and(eq(trees.fleetId, scope.fleetId), eq(trees.key, version.key)));
  if (!own) throw new Error("a fleet's own tree was neither made nor there");
  return own.id;
}

/**
 * Makes an edit in the draft.
 *
 * @throws Problem 412 with the draft as it is now, when somebody saved it since `version` or it is another; 409 when the edit does not
 *   fit the tree; 422 when the edited tree would not have the shape of one. Nothing is changed then.
 */
export async function changeDraft(scope: FleetScope<"tree:write">, edit: TreeEdit, version: number): Promise<TreeDraft> {
  const draft = await getDraftAsSeen(scope, edit.draft, version);
  const applied = applyEdit(draft.document, edit);
  if ("refused" in applied) throw Problem.conflict(applied.refused);
  const document = wellFormed(applied.tree);
  if (edit.takesUp !== undefined) await demandShipped(scope, edit.takesUp);
  const saved = await scope.tx
    .update(treeVersions)
    .set({
      document,
      hash: contentHash(document),
      revision: sql`${treeVersions.revision} + 1`,
      takenUp: edit.takesUp,
      by: scope.actor.userId,
      savedAt: new Date(),
    })
    .where(itself(scope, draft, version))
    .returning({ id: treeVersions.id });
  const now = await getDraft(scope);
  if (saved.length === 0) throw Problem.stale(now);
  return now;
}

function wellFormed(tree: FaultTree): FaultTree {
  const parsed = parseTree(tree);
  if ("tree" in parsed) return parsed.tree;
  throw Problem.invalid(
    parsed.flaws.map(({ node, says, mend }) => ({ path: `${node.kind} ${node.key}`, says: `${says} ${mend ?? ""}`.trim() })),
  );
}

async function demandShipped(scope: FleetScope, id: string): Promise<void> {
  const [shipped] = await scope.tx.select({ id: shippedTreeVersions.id }).from(shippedTreeVersions).where(eq(shippedTreeVersions.id, id));
  if (!shipped) throw Problem.notFound("There is no such shipped version of the fault tree.");
}

/** Gives the draft up, as it was seen. @throws Problem 412 when somebody saved it since */
export async function discardDraft(scope: FleetScope<"tree:write">, id: string, version: number): Promise<void> {
  const draft = await getDraftAsSeen(scope, id, version);
  const gone = await scope.tx
    .delete(treeVersions)
    .where(itself(scope, draft, version))
    .returning({ id: treeVersions.id });
  if (gone.length === 0) throw Problem.stale(draft);
}

/** The draft's row as it stood at this version. */
export const itself = (scope: FleetScope, draft: Pick<TreeDraft, "id">, version: number) =>
  and(
    eq(treeVersions.fleetId, scope.fleetId),
    eq(treeVersions.id, draft.id),
    eq(treeVersions.revision, version),
    isNull(treeVersions.publishedAt),
  );
