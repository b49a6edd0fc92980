import * as z from "zod";
import { Publication } from "@/lib/core/contract/draft";
import { Id } from "@/lib/core/contract/id";
import { TreeVersionInfo } from "@/lib/core/contract/tree";
import { publishDraft } from "@/lib/server/trees/draft/publish";
import { slowEndpoint } from "@/lib/server/web/endpoint";

export const POST = slowEndpoint({
  permission: "tree:write",
  summary: "Publish the draft: the next diagnosis uses it",
  params: z.object({ fleetId: Id }),
  input: Publication,
  output: TreeVersionInfo,
  versioned: true,
  status: 201,
  run: (pass, { input, version }) => publishDraft(pass, input, version),
});
