import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { TreeVersionDocument } from "@/lib/core/contract/tree";
import { getTreeVersion } from "@/lib/server/trees/queries";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "tree:read",
  summary: "One published version with its document",
  params: z.object({ fleetId: Id, versionId: Id }),
  output: TreeVersionDocument,
  run: (scope, { params }) => getTreeVersion(scope, params.versionId),
});
