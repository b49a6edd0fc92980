import * as z from "zod";
import { Story } from "@/lib/core/contract/diagnosis";
import { Id } from "@/lib/core/contract/id";
import { readStory } from "@/lib/server/diagnoses/story";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "diagnosis:read",
  summary: "A diagnosis step by step: what was said, why it was asked, what was believed then",
  params: z.object({ fleetId: Id, diagnosisId: Id }),
  output: Story,
  run: (scope, { params }) => readStory(scope, params.diagnosisId),
});
