import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { getDraft } from "@/lib/server/trees/draft/queries";
import { TREE_FILE_FORMATS, treeFileResponse } from "@/lib/server/trees/tree-file";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "tree:write",
  summary: "The draft as a file to take along",
  params: z.object({ fleetId: Id }),
  query: z.object({ format: z.enum(TREE_FILE_FORMATS).default("yaml") }),
  run: async (scope, { query }) => {
    const { document } = await getDraft(scope);
    return treeFileResponse(document, query.format, `${document.key}-draft`);
  },
});
