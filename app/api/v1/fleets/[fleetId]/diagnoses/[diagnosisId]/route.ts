import * as z from "zod";
import { Diagnosis } from "@/lib/core/contract/diagnosis";
import { Id } from "@/lib/core/contract/id";
import { getDiagnosis } from "@/lib/server/diagnoses/queries";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "diagnosis:read",
  summary: "One diagnosis",
  params: z.object({ fleetId: Id, diagnosisId: Id }),
  output: Diagnosis,
  run: (scope, { params }) => getDiagnosis(scope, params.diagnosisId),
});
