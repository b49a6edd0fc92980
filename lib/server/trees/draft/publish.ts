import "server-only";
import { and, eq, isNotNull, max } from "drizzle-orm";
import { trees, treeVersions } from "@/db/schema/trees";
import type { Publication, TreeDraft } from "@/lib/core/contract/draft";
import { Problem } from "@/lib/core/contract/problem";
import type { TreeVersionInfo } from "@/lib/core/contract/tree";
import { compareTrees } from "@/lib/core/tree/differences";
import type { FaultTree } from "@/lib/core/tree/schema";
import { findFlaws } from "@/lib/core/tree/soundness";
import type { FleetScope, Pass } from "@/lib/server/auth/scope";
import { documentOf, findTreeVersion } from "../queries";
import { itself } from "./commands";
import { getDraft, getDraftAsSeen } from "./queries";

/**
 * Makes the draft the fleet's newest version, which the next diagnosis is
 * pinned to; diagnoses that have begun stay with theirs. It is looked over
 * between two transactions, and holds no connection meanwhile.
 *
 * @throws Problem 412 when somebody saved it since `version`, or it is not the draft that was seen; 422 when the tree is
 *   not sound, when a known case fails that was not accepted, or when nothing was changed
 */
export async function publishDraft(pass: Pass<"tree:write">, publication: Publication, version: number): Promise<TreeVersionInfo> {
  const { draft, differences } = await pass.enter(async (scope) => {
    const draft = await getDraftAsSeen(scope, publication.draft, version);
    return { draft, differences: await differencesOf(scope, draft) };
  });
  refuseUnsound(draft.document);
  refuseFailing(draft.document, publication);
  return pass.enter(async (scope) => {
    const published = await scope.tx
      .update(treeVersions)
      .set({ number: await nextNumber(scope, draft), note: publication.note, differences, publishedAt: new Date(), by: scope.actor.userId })
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

/**
 * The replay is run where the mechanic works: seconds of reckoning here would hold up everybody's answers, and who may
 * publish may accept a failing case anyway. What is refused is to publish past one without saying so.
 */
function refuseFailing(tree: FaultTree, { failing, accept }: Publication): void {
  const accepted = new Set(accept);
  const left = tree.knownCases.filter(({ key }) => failing.includes(key) && !accepted.has(key));
  if (left.length > 0)
    throw Problem.invalid(
      left.map(({ key, title }) => ({
        path: `known case ${key}`,
        says: `"${title}": its cause is not among the first three. Mend the links, or accept it by name.`,
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
