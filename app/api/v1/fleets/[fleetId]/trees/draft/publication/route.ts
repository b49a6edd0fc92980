import * as z from "zod";
import { Publication } from "@/lib/core/contract/draft";
import { Id } from "@/lib/core/contract/id";
import { TreeVersionInfo } from "@/lib/core/contract/tree";
import { publishDraft } from "@/lib/server/trees/draft/publish";
import { endpoint } from "@/lib/server/web/endpoint";

export const POST = endpoint({
  permission: "tree:write",
  summary: "Publish the draft: the next diagnosis uses it",
  params: z.object({ fleetId: Id }),
  input: Publication,
  output: TreeVersionInfo,
  versioned: true,
  status: 201,
  run: (scope, { input, version }) => publishDraft(scope, input, version),
});
