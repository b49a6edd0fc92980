import "server-only";
import { stringify } from "yaml";
import type { FaultTree } from "@/lib/core/tree/schema";

export const TREE_FILE_FORMATS = ["yaml", "json"] as const;
export type TreeFileFormat = (typeof TREE_FILE_FORMATS)[number];

/** A tree as one file to take along; readTreeText gives the identical document back. */
export function treeFile(tree: FaultTree, format: TreeFileFormat): string {
  return format === "json" ? `${JSON.stringify(tree, null, 2)}\n` : stringify(tree, { lineWidth: 140, aliasDuplicateObjects: false });
}

/** The same as an answer that a browser saves. `name`: without ending. */
export function treeFileResponse(tree: FaultTree, format: TreeFileFormat, name: string): Response {
  return new Response(treeFile(tree, format), {
    headers: {
      "content-type": format === "json" ? "application/json" : "application/yaml",
      "content-disposition": `attachment; filename="${name.replaceAll(/[^a-z0-9-]/g, "-")}.${format}"`,
    },
  });
}
