import * as z from "zod";
import { Engine, NewEngine } from "@/lib/core/contract/engine";
import { Id } from "@/lib/core/contract/id";
import { listOf } from "@/lib/core/contract/page";
import { addEngine } from "@/lib/server/engines/commands";
import { listEngines } from "@/lib/server/engines/queries";
import { endpoint } from "@/lib/server/web/endpoint";

const params = z.object({ fleetId: Id });

export const GET = endpoint({
  permission: "fleet:read",
  summary: "The fleet's engines",
  params,
  output: listOf(Engine),
  run: async (scope) => ({ items: await listEngines(scope) }),
});

export const POST = endpoint({
  permission: "engine:write",
  summary: "Add an engine",
  params,
  input: NewEngine,
  output: Engine,
  status: 201,
  run: (scope, { input }) => addEngine(scope, input),
});
