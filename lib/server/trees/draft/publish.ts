import "server-only";
import { setImmediate } from "node:timers/promises";
import { and, eq, isNotNull, max } from "drizzle-orm";
import { trees, treeVersions } from "@/db/schema/trees";
import type { Publication, TreeDraft } from "@/lib/core/contract/draft";
import { Problem } from "@/lib/core/contract/problem";
import type { TreeVersionInfo } from "@/lib/core/contract/tree";
import { caseHolds } from "@/lib/core/diagnosis/case-holds";
import { compareTrees } from "@/lib/core/tree/differences";
import type { FaultTree } from "@/lib/core/tree/schema";
import { findFlaws } from "@/lib/core/tree/soundness";
import type { FleetScope, Pass } from "@/lib/server/auth/scope";
import { documentOf, findTreeVersion } from "../queries";
import { itself } from "./commands";
import { getDraft, getDraftAsSeen } from "./queries";

/**
 * Makes the draft the fleet's newest version, which the next diagnosis is
 * pinned to; diagnoses that have begun stay with theirs. It is proved between
 * two transactions: a hundred cases take seconds, and hold no connection.
 *
 * @throws Problem 412 when somebody saved it since `version`, or it is not the draft that was seen; 422 when the tree is
 *   not sound, when a known case fails that was not accepted, or when nothing was changed
 */
export async function publishDraft(
  pass: Pass<"tree:write">,
  { draft: id, note, accept }: Publication,
  version: number,
): Promise<TreeVersionInfo> {
  const { draft, differences } = await pass.enter(async (scope) => {
    const draft = await getDraftAsSeen(scope, id, version);
    return { draft, differences: await differencesOf(scope, draft) };
  });
  refuseUnsound(draft.document);
  await refuseFailing(draft.document, new Set(accept));
  return pass.enter(async (scope) => {
    const published = await scope.tx
      .update(treeVersions)
      .set({ number: await nextNumber(scope, draft), note, differences, publishedAt: new Date(), by: scope.actor.userId })
      .where(itself(scope, draft, version))
      .returning({ treeId: treeVersions.treeId });
    if (published.length === 0) throw Problem.stale(await getDraft(scope));
    // Without its document, which is kept in mind once it is read: not before the commit.
    const info = await findTreeVersion(scope, draft.id);
    if (!info) throw new Error("a version just published is not there");
    return info;
  });
}

async function differencesOf(scope: FleetScope, draft: TreeDraft): Promise<string[]> {
  const before = await findTreeVersion(scope, draft.begunFrom);
  if (!before) throw Problem.notFound("The version this draft was begun from is not there.");
  const differences = compareTrees(await documentOf(scope, before), draft.document).map(({ says }) => says);
  if (differences.length === 0) throw Problem.invalid([{ path: "", says: "The draft says the same as the version it was begun from." }]);
  return differences;
}

function refuseUnsound(tree: FaultTree): void {
  const errors = findFlaws(tree).filter((flaw) => flaw.severity === "error");
  if (errors.length > 0)
    throw Problem.invalid(
      errors.map(({ node, says, mend }) => ({ path: `${node.kind} ${node.key}`, says: `${says} ${mend ?? ""}`.trim() })),
    );
}

/** Known cases are proved one by one, and others are served in between. */
async function refuseFailing(tree: FaultTree, accepted: ReadonlySet<string>): Promise<void> {
  const failing: FaultTree["knownCases"] = [];
  for (const known of tree.knownCases) {
    if (!accepted.has(known.key) && !caseHolds(tree, known)) failing.push(known);
    await setImmediate();
  }
  if (failing.length > 0)
    throw Problem.invalid(
      failing.map(({ key, title }) => ({
        path: `known case ${key}`,
        says: `"${title}": its cause is no longer among the first three. Mend the links, or accept it by name.`,
      })),
    );
}

async function nextNumber(scope: FleetScope, draft: TreeDraft): Promise<number> {
  const [row] = await scope.tx
    .select({ treeId: treeVersions.treeId })
    .from(treeVersions)
    .innerJoin(trees, and(eq(trees.fleetId, treeVersions.fleetId), eq(trees.id, treeVersions.treeId)))
    .where(and(eq(treeVersions.fleetId, scope.fleetId), eq(treeVersions.id, draft.id)))
    .for("update", { of: trees });
  if (!row) throw Problem.notFound();
  const [newest] = await scope.tx
    .select({ number: max(treeVersions.number) })
    .from(treeVersions)
    .where(and(eq(treeVersions.fleetId, scope.fleetId), eq(treeVersions.treeId, row.treeId), isNotNull(treeVersions.publishedAt)));
  return (newest?.number ?? 0) + 1;
}
