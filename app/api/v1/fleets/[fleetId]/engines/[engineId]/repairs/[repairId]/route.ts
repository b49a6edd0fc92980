import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { Repair, RepairChange } from "@/lib/core/contract/log";
import { correctRepair, takeBackRepair } from "@/lib/server/log/correct-repair";
import { getRepair } from "@/lib/server/log/repairs";
import { endpoint } from "@/lib/server/web/endpoint";

const params = z.object({ fleetId: Id, engineId: Id, repairId: Id });

export const GET = endpoint({
  permission: "log:read",
  summary: "A repair that was logged without a diagnosis, with all that was ever written of it",
  params,
  output: Repair,
  run: (scope, { params }) => getRepair(scope, params.engineId, params.repairId),
});

export const PUT = endpoint({
  permission: "log:write",
  summary: "Correct a repair; what it said stays readable",
  params,
  input: RepairChange,
  output: Repair,
  versioned: true,
  run: (scope, { params, input, version }) => correctRepair(scope, params.engineId, params.repairId, input, version),
});

export const DELETE = endpoint({
  permission: "log:write",
  summary: "Take a repair off the log that was written in by mistake; it stays readable and counts for nothing",
  params,
  versioned: true,
  run: (scope, { params, version }) => takeBackRepair(scope, params.engineId, params.repairId, version),
});
