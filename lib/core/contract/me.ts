import * as z from "zod";
import { ROLES } from "../access/roles";
import { Id } from "./id";

/** Who is signed in, and the fleets they belong to: GET /me. */
export const Me = z.object({
  user: z.object({ id: Id, name: z.string(), email: z.string() }),
  fleets: z.array(z.object({ id: Id, name: z.string(), roles: z.array(z.enum(ROLES)) })),
});
export type Me = z.infer<typeof Me>;
