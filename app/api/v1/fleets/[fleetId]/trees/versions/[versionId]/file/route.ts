import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { getTreeVersion } from "@/lib/server/trees/queries";
import { TREE_FILE_FORMATS, treeFileResponse } from "@/lib/server/trees/tree-file";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "tree:read",
  summary: "A published version as a file to take along",
  params: z.object({ fleetId: Id, versionId: Id }),
  query: z.object({ format: z.enum(TREE_FILE_FORMATS).default("yaml") }),
  run: async (scope, { params, query }) => {
    const { document, number } = await getTreeVersion(scope, params.versionId);
    return treeFileResponse(document, query.format, `${document.key}-${number}`);
  },
});
