import * as z from "zod";
import { Id } from "@/lib/core/contract/id";
import { Phone } from "@/lib/core/contract/phone";
import { readPhone } from "@/lib/server/phone/queries";
import { endpoint } from "@/lib/server/web/endpoint";

export const GET = endpoint({
  permission: "fleet:read",
  summary: "Everything the skipper's path needs to work without a network",
  params: z.object({ fleetId: Id }),
  output: Phone,
  run: (scope) => readPhone(scope),
});
