import "server-only";
import { desc, eq, sql } from "drizzle-orm";
import { drizzle } from "drizzle-orm/node-postgres";
import { Client } from "pg";
import { uuidv7 } from "uuidv7";
import { shippedTreeVersions } from "@/db/schema/trees";
import { parseTree } from "@/lib/core/tree/parse-tree";
import type { FaultTree } from "@/lib/core/tree/schema";
import { findFlaws } from "@/lib/core/tree/soundness";
import { contentHash } from "./content-hash";
import { readTreeFolder } from "./read-tree-folder";

export const SHIPPED_TREE_FOLDER = "trees/small-marine-diesel";

export type Loaded = { id: string; number: number; hash: string; isNew: boolean };

/**
 * Puts the shipped tree into the database, as its owner: a new numbered
 * version if the newest one has other content, else nothing. May run at every
 * start, and in two starts at once.
 *
 * @throws Error with every flaw in words when the tree is not sound
 */
export async function loadShippedTree(ownerUrl: string, folder = SHIPPED_TREE_FOLDER): Promise<Loaded> {
  const tree = await soundTree(folder);
  const client = new Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    return await drizzle(client, { casing: "snake_case" }).transaction(async (tx) => {
      await tx.execute(sql`select pg_advisory_xact_lock(hashtext('shipped tree'), hashtext(${tree.key}))`);
      const [newest] = await tx
        .select({ id: shippedTreeVersions.id, number: shippedTreeVersions.number, hash: shippedTreeVersions.hash })
        .from(shippedTreeVersions)
        .where(eq(shippedTreeVersions.key, tree.key))
        .orderBy(desc(shippedTreeVersions.number))
        .limit(1);
      const hash = contentHash(tree);
      if (newest?.hash === hash) return { ...newest, isNew: false };
      const next = { id: uuidv7(), number: (newest?.number ?? 0) + 1, hash };
      await tx.insert(shippedTreeVersions).values({ ...next, key: tree.key, title: tree.title, document: tree });
      return { ...next, isNew: true };
    });
  } finally {
    await client.end();
  }
}

async function soundTree(folder: string): Promise<FaultTree> {
  const read = await readTreeFolder(folder);
  if ("faults" in read)
    throw new Error(
      [`The tree in ${folder} cannot be read:`, ...read.faults.map((f) => `${f.file}:${f.line}: ${f.says} ${f.mend}`)].join("\n"),
    );
  const parsed = parseTree(read.document);
  const flaws = "flaws" in parsed ? parsed.flaws : findFlaws(parsed.tree).filter((flaw) => flaw.severity === "error");
  if ("flaws" in parsed || flaws.length > 0)
    throw new Error([`The tree in ${folder} is not sound:`, ...flaws.map((flaw) => flaw.says)].join("\n"));
  return parsed.tree;
}
