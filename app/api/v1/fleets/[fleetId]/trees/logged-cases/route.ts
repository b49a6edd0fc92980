import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { LoggedCase } from "@/lib/core/contract/logged-case";
import { listLoggedCases } from "@/lib/server/trees/logged-cases";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "tree:write",
  summary: "Diagnoses that ended in a proved cure, as known cases, the newest first",
  params: z.object({ fleetId: Id }),
  query: z.object({ limit: z.coerce.number().int().min(1).max(500).default(200) }),
  output: z.object({ items: z.array(LoggedCase) }),
  run: async (scope, { query }) => ({ items: await listLoggedCases(scope, query.limit) }),
});
