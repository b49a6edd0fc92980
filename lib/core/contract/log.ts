import * as z from "zod";
import { Key } from "../tree/schema";
import { Correction } from "./correction";
import { Id, Moment } from "./id";
import { OutcomeKind, OutcomePayload } from "./event";
import { PageQuery } from "./page";

/** A repair done without a diagnosis, written into the engine's log afterwards. `causes` and remedies may be in the person's own words. */
export const NewRepair = OutcomePayload.omit({ outcome: true }).extend({
  id: Id,
  engineId: Id,
  doneAt: Moment,
  outcome: OutcomeKind.extract(["cured", "held"]),
  symptoms: z.array(Key).max(12).default([]),
});
export type NewRepair = z.infer<typeof NewRepair>;

/** A repair as it should have been written: it takes the place of all that was said. */
export const RepairChange = NewRepair.omit({ id: true, engineId: true });
export type RepairChange = z.infer<typeof RepairChange>;

/** One line of an engine's log: the outcome of a diagnosis, or a repair. A projection that can be rebuilt. */
export const LogEntry = z.strictObject({
  id: Id,
  engineId: Id,
  engineName: z.string(),
  boatName: z.string(),
  /** null for a repair logged without a diagnosis. */
  diagnosisId: Id.nullable(),
  at: Moment,
  engineHours: z.number().nullable(),
  hoursAreEstimated: z.boolean(),
  symptoms: z.array(z.strictObject({ key: Key, title: z.string() })),
  outcome: OutcomeKind.nullable().describe("null while the diagnosis is open"),
  cause: z.strictObject({ key: Key.nullable(), title: z.string(), system: Key.nullable() }).nullable(),
  remedy: z.strictObject({ key: Key.nullable(), title: z.string() }).nullable(),
  proof: z.string().nullable(),
  /** The remedy only gets one home: the cause stays open. */
  temporary: z.boolean(),
  minutes: z.number().nullable(),
  parts: z.array(z.strictObject({ key: Key.optional(), title: z.string(), quantity: z.number() })),
  note: z.string().nullable(),
  by: z.string(),
  /** Hours until the same cause came back on this engine; null while it has not. */
  cameBackAfterHours: z.number().nullable(),
  /** Hours it has held so far; null where it came back or hours are unknown. */
  heldHours: z.number().nullable(),
  /** Was this cause here before on this engine? How many times, this one counted. */
  timesHere: z.number().int().min(0),
  /** Of a repair: counts up with each correction; what If-Match names. Absent on a diagnosis' line. */
  version: z.number().int().optional(),
});
export type LogEntry = z.infer<typeof LogEntry>;

/** What a repair said before it was corrected. */
const RepairThen = z.strictObject({
  doneAt: Moment,
  outcome: OutcomeKind.nullable(),
  symptoms: LogEntry.shape.symptoms,
  cause: LogEntry.shape.cause,
  remedy: LogEntry.shape.remedy,
  proof: z.string().nullable(),
  /** What the meter showed, where it was written down. */
  meterShowed: z.number().nullable(),
  meterReset: z.boolean(),
  minutes: z.number().nullable(),
  parts: LogEntry.shape.parts,
  note: z.string().nullable(),
});
export type RepairThen = z.infer<typeof RepairThen>;

/** A repair with all that was ever written of it. */
export const Repair = z.strictObject({
  entry: LogEntry,
  /** As it was typed in; hours since new stand in `entry`. */
  meterShowed: z.number().nullable(),
  meterReset: z.boolean(),
  version: z.number().int(),
  takenBackAt: Moment.nullable(),
  /** Oldest first. */
  corrections: z.array(Correction(RepairThen)),
});
export type Repair = z.infer<typeof Repair>;

/** The same cause again on the same engine after a cure: a fact, said from the second case. */
export const RepeatFault = z.strictObject({
  engineId: Id,
  cause: Key,
  title: z.string(),
  system: Key.nullable(),
  count: z.number().int().min(2),
  /** Engine hours at each case, first to last; null where unknown. */
  hours: z.array(z.number().nullable()),
  hoursAreEstimated: z.boolean(),
  dates: z.array(Moment),
  /** Hours between the cases; empty where hours are not known. */
  gapsHours: z.array(z.number()),
  gapsDays: z.array(z.number()),
  /** Cases whose cure before them had not been proved. */
  unprovedBefore: z.number().int().min(0),
  /** What lies upstream: causes of the tree, with how often they bring it on, and roots in words. */
  upstream: z.array(z.strictObject({ cause: Key.nullable(), title: z.string(), share: z.number().nullable() })),
});
export type RepeatFault = z.infer<typeof RepeatFault>;

/** What the log can be narrowed to. `outcome` "open": diagnoses that have not ended. */
export const LogQuery = PageQuery.extend({
  engineId: Id.optional(),
  boatId: Id.optional(),
  cause: Key.optional(),
  system: Key.optional(),
  outcome: z.enum([...OutcomeKind.options, "open"]).optional(),
});
export type LogQuery = z.infer<typeof LogQuery>;
