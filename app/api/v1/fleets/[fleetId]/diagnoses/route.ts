import * as z from "zod";
import { Diagnosis, DiagnosisQuery } from "@/lib/core/contract/diagnosis";
import { Id } from "@/lib/core/contract/id";
import { pageOf } from "@/lib/core/contract/page";
import { listDiagnoses } from "@/lib/server/diagnoses/queries";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "diagnosis:read",
  summary: "The fleet's diagnoses, the newest begun first",
  params: z.object({ fleetId: Id }),
  query: DiagnosisQuery,
  output: pageOf(Diagnosis),
  run: (scope, { query }) => listDiagnoses(scope, query),
});
