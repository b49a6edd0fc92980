import * as z from "zod";
import { HourReading, ListedReading } from "@/lib/core/contract/engine";
import { Id } from "@/lib/core/contract/id";
import { PageQuery, pageOf } from "@/lib/core/contract/page";
import { addHourReading } from "@/lib/server/engines/commands";
import { listHourReadings } from "@/lib/server/engines/readings";
import { endpoint } from "@/lib/server/web/endpoint";
import { inPlace } from "@/lib/server/web/in-place";

const params = z.object({ fleetId: Id, engineId: Id });

export const GET = endpoint({
  permission: "fleet:read",
  summary: "Readings of the engine's hour meter, newest first",
  params,
  query: PageQuery,
  output: pageOf(ListedReading),
  run: (scope, { params, query }) => listHourReadings(scope, params.engineId, query),
});

export const POST = endpoint({
  permission: "engine:write",
  summary: "Write down what the hour meter shows",
  params,
  input: HourReading,
  output: HourReading,
  status: 201,
  run: (scope, { params, input }) => addHourReading(scope, inPlace("engineId", params.engineId, input)),
});
