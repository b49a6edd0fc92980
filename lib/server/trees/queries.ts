import "server-only";
import { and, desc, eq, isNotNull, sql } from "drizzle-orm";
import { shippedTreeVersions, trees, treeVersions } from "@/db/schema/trees";
import { Problem } from "@/lib/core/contract/problem";
import type { TreeVersionDocument, TreeVersionInfo } from "@/lib/core/contract/tree";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { FleetScope } from "@/lib/server/auth/scope";
import { keptDocument } from "./kept-documents";

const shipped = {
  id: shippedTreeVersions.id,
  key: shippedTreeVersions.key,
  title: shippedTreeVersions.title,
  number: shippedTreeVersions.number,
  hash: shippedTreeVersions.hash,
  publishedAt: shippedTreeVersions.publishedAt,
  note: sql<string | null>`null`,
};
const own = {
  id: treeVersions.id,
  key: trees.key,
  title: trees.title,
  number: treeVersions.number,
  hash: treeVersions.hash,
  publishedAt: treeVersions.publishedAt,
  note: treeVersions.note,
};
type Row = { id: string; key: string; title: string; number: number | null; hash: string; publishedAt: Date | null; note: string | null };

/** All published versions that this fleet can see: its own and the shipped ones, newest first; never a document. */
export async function listTreeVersions(scope: FleetScope): Promise<TreeVersionInfo[]> {
  const ours = await ownVersions(scope);
  const theirs = await scope.tx
    .select(shipped)
    .from(shippedTreeVersions)
    .orderBy(desc(shippedTreeVersions.publishedAt), desc(shippedTreeVersions.number));
  return [...ours.map((row) => infoOf(row, "own")), ...theirs.map((row) => infoOf(row, "shipped"))];
}

/** The version that a new diagnosis of this fleet is pinned to: its own newest, else the newest shipped. */
export async function getCurrentTreeVersion(scope: FleetScope): Promise<TreeVersionInfo> {
  const [ours] = await ownVersions(scope);
  if (ours) return infoOf(ours, "own");
  const [newest] = await scope.tx
    .select(shipped)
    .from(shippedTreeVersions)
    .orderBy(desc(shippedTreeVersions.publishedAt), desc(shippedTreeVersions.number))
    .limit(1);
  if (!newest)
    throw new Problem(
      503,
      "no-tree",
      "There is no fault tree yet",
      "The server has been started without its fault tree. Start it again with npm start.",
    );
  return infoOf(newest, "shipped");
}

/** One published version; null when this fleet cannot see it. */
export async function findTreeVersion(scope: FleetScope, id: string): Promise<TreeVersionInfo | null> {
  const [theirs] = await scope.tx.select(shipped).from(shippedTreeVersions).where(eq(shippedTreeVersions.id, id));
  if (theirs) return infoOf(theirs, "shipped");
  const ours = (await ownVersions(scope)).find((row) => row.id === id);
  return ours ? infoOf(ours, "own") : null;
}

/** One published version with its document. */
export async function getTreeVersion(scope: FleetScope, id: string): Promise<TreeVersionDocument> {
  const info = await findTreeVersion(scope, id);
  if (!info) throw Problem.notFound();
  return { ...info, document: await documentOf(scope, info), differences: await differencesOf(scope, id) };
}

/** What changed when this version was published, in words; nothing is kept of shipped versions. */
async function differencesOf(scope: FleetScope, id: string): Promise<string[]> {
  const [own] = await scope.tx
    .select({ differences: treeVersions.differences })
    .from(treeVersions)
    .where(and(eq(treeVersions.fleetId, scope.fleetId), eq(treeVersions.id, id)));
  return own?.differences ?? [];
}

/** The document of a version that this scope has been shown. Published documents never change, so the process keeps the last few. */
export function documentOf(scope: FleetScope, version: Pick<TreeVersionInfo, "id" | "from">): Promise<FaultTree> {
  const isShipped = version.from === "shipped";
  return keptDocument(isShipped ? version.id : `${scope.fleetId}/${version.id}`, async () => {
    const [row] = isShipped
      ? await scope.tx
          .select({ document: shippedTreeVersions.document })
          .from(shippedTreeVersions)
          .where(eq(shippedTreeVersions.id, version.id))
      : await scope.tx
          .select({ document: treeVersions.document })
          .from(treeVersions)
          .where(and(eq(treeVersions.fleetId, scope.fleetId), eq(treeVersions.id, version.id)));
    if (!row) throw Problem.notFound();
    return row.document;
  });
}

async function ownVersions(scope: FleetScope): Promise<Row[]> {
  return scope.tx
    .select(own)
    .from(treeVersions)
    .innerJoin(trees, and(eq(trees.fleetId, treeVersions.fleetId), eq(trees.id, treeVersions.treeId)))
    .where(and(eq(treeVersions.fleetId, scope.fleetId), isNotNull(treeVersions.publishedAt)))
    .orderBy(desc(treeVersions.publishedAt));
}

function infoOf(row: Row, from: TreeVersionInfo["from"]): TreeVersionInfo {
  return {
    id: row.id,
    key: row.key,
    title: row.title,
    number: row.number ?? 0,
    hash: row.hash,
    publishedAt: (row.publishedAt ?? new Date(0)).toISOString(),
    from,
    note: row.note,
  };
}
