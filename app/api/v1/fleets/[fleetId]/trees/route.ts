import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { listOf } from "@/lib/core/contract/page";
import { TreeVersionInfo } from "@/lib/core/contract/tree";
import { listTreeVersions } from "@/lib/server/trees/queries";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "tree:read",
  summary: "Published versions of the fault trees this fleet can use, newest first",
  params: z.object({ fleetId: Id }),
  output: listOf(TreeVersionInfo),
  run: async (scope) => ({ items: await listTreeVersions(scope) }),
});
