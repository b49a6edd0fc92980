import * as z from "zod";
import { NewDraft, TreeDraft, TreeEdit, type TreeEdit as Edit } from "@/lib/core/contract/draft";
import { Id } from "@/lib/core/contract/id";
import { beginDraft, changeDraft, discardDraft } from "@/lib/server/trees/draft/commands";
import { getDraft } from "@/lib/server/trees/draft/queries";
import { endpoint } from "@/lib/server/web/endpoint";

const params = z.object({ fleetId: Id });

export const GET = endpoint({
  permission: "tree:write",
  summary: "The draft of the fleet's fault tree",
  params,
  output: TreeDraft,
  run: (scope) => getDraft(scope),
});

export const POST = endpoint({
  permission: "tree:write",
  summary: "Begin a draft from a published version, or join the one that is there",
  params,
  input: NewDraft,
  output: TreeDraft,
  status: 201,
  run: (scope, { input }) => beginDraft(scope, input),
});

export const PATCH = endpoint({
  permission: "tree:write",
  summary: "Make an edit in the draft",
  params,
  input: TreeEdit,
  output: TreeDraft,
  versioned: true,
  maxBytes: 8_000_000,
  run: (scope, { input, version }) => changeDraft(scope, input as Edit, version),
});

export const DELETE = endpoint({
  permission: "tree:write",
  summary: "Give the draft up",
  params,
  query: z.object({ draft: Id.describe("The draft that was looked at") }),
  versioned: true,
  run: (scope, { query, version }) => discardDraft(scope, query.draft, version),
});
