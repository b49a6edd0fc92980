import * as z from "zod";
import { Engine, EngineChange } from "@/lib/core/contract/engine";
import { Id } from "@/lib/core/contract/id";
import { changeEngine, removeEngine } from "@/lib/server/engines/commands";
import { getEngine } from "@/lib/server/engines/queries";
import { endpoint } from "@/lib/server/web/endpoint";

const params = z.object({ fleetId: Id, engineId: Id });

export const GET = endpoint({
  permission: "fleet:read",
  summary: "One engine",
  params,
  output: Engine,
  run: (scope, { params }) => getEngine(scope, params.engineId),
});

export const PATCH = endpoint({
  permission: "engine:write",
  summary: "Change an engine or its profile",
  params,
  input: EngineChange,
  output: Engine,
  versioned: true,
  run: (scope, { params, input, version }) => changeEngine(scope, params.engineId, input, version),
});

export const DELETE = endpoint({
  permission: "boat:remove",
  summary: "Take an engine off the lists; its log stays",
  params,
  versioned: true,
  run: (scope, { params, version }) => removeEngine(scope, params.engineId, version),
});
