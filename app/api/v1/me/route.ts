import { Me } from "@/lib/core/contract/me";
import { fleetsOf } from "@/lib/server/people/queries";
import { personalEndpoint } from "@/lib/server/web/personal-endpoint";

export const GET = personalEndpoint({
  permission: "signed-in",
  summary: "Who is signed in, and their fleets",
  output: Me,
  run: async (person) => ({ user: { id: person.userId, name: person.name, email: person.email }, fleets: await fleetsOf(person) }),
});
