import * as z from "zod";
import { ROLES } from "../access/roles";
import { Boat, Engine } from "./engine";
import { DiagnosisEvent, Multiplier } from "./event";
import { Id, Moment } from "./id";
import { LogEntry } from "./log";

/** A published version of a tree, without the document. */
export const TreeVersionStamp = z.object({ id: Id, hash: z.string(), number: z.number().int(), publishedAt: Moment });
export type TreeVersionStamp = z.infer<typeof TreeVersionStamp>;

/** An unfinished diagnosis with all its events, so that any phone of the fleet can take it up. */
export const OpenDiagnosis = z.object({ id: Id, engineId: Id, treeVersionId: Id, events: z.array(DiagnosisEvent) });
export type OpenDiagnosis = z.infer<typeof OpenDiagnosis>;

/** Everything the skipper's path needs of the fleet to work without a network: GET /fleets/{fleetId}/phone. Unknown keys are left alone, so that an old phone can read a new server. */
export const Phone = z.object({
  fleet: z.object({ id: Id, name: z.string() }),
  roles: z.array(z.enum(ROLES)),
  boats: z.array(Boat),
  engines: z.array(Engine),
  openDiagnoses: z.array(OpenDiagnosis),
  /** Newest first. */
  recentLog: z.array(LogEntry),
  treeVersion: TreeVersionStamp,
  /** By engine: why causes weigh more or less on it before the first question. */
  multipliers: z.record(Id, z.array(Multiplier)),
});
export type Phone = z.infer<typeof Phone>;
