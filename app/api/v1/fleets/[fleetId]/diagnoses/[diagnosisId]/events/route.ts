import * as z from "zod";
import { EventReceipts, PostedEvents, StoredEvents } from "@/lib/core/contract/diagnosis";
import { Id } from "@/lib/core/contract/id";
import { recordEvents } from "@/lib/server/diagnoses/commands";
import { getEvents } from "@/lib/server/diagnoses/queries";
import { endpoint } from "@/lib/server/web/endpoint";

const params = z.object({ fleetId: Id, diagnosisId: Id });

export const GET = endpoint({
  permission: "diagnosis:read",
  summary: "The whole log of a diagnosis, by device and sequence",
  params,
  output: StoredEvents,
  run: async (scope, { params }) => ({ events: await getEvents(scope, params.diagnosisId) }),
});

export const POST = endpoint({
  permission: "diagnosis:write",
  summary: "Hand in events of a diagnosis; the first begins it, sending again is harmless",
  params,
  input: PostedEvents,
  itemByItem: true,
  output: EventReceipts,
  run: async (scope, { params, input }) => ({ receipts: await recordEvents(scope, params.diagnosisId, input.events) }),
});
