import * as z from "zod";
import { Reading, ReadingChange } from "@/lib/core/contract/engine";
import { Id } from "@/lib/core/contract/id";
import { correctReading, takeBackReading } from "@/lib/server/engines/correct-reading";
import { getReading } from "@/lib/server/engines/readings";
import { endpoint } from "@/lib/server/web/endpoint";

const params = z.object({ fleetId: Id, engineId: Id, readingId: Id });

export const GET = endpoint({
  permission: "fleet:read",
  summary: "A reading of the hour meter with all that was ever written of it",
  params,
  output: Reading,
  run: (scope, { params }) => getReading(scope, params.engineId, params.readingId),
});

export const PUT = endpoint({
  permission: "engine:write",
  summary: "Correct a reading; what it said stays readable",
  params,
  input: ReadingChange,
  output: Reading,
  versioned: true,
  run: (scope, { params, input, version }) => correctReading(scope, params.engineId, params.readingId, input, version),
});

export const DELETE = endpoint({
  permission: "engine:write",
  summary: "Take a reading back that was written down by mistake; it stays readable and counts for nothing",
  params,
  versioned: true,
  run: (scope, { params, version }) => takeBackReading(scope, params.engineId, params.readingId, version),
});
