import * as z from "zod";
import { Key } from "../tree/schema";
import { EventReceipt, OutcomeKind, StoredEvent } from "./event";
import { Id, Moment } from "./id";
import { PageQuery } from "./page";

/** One run from complaint to outcome, in a list. */
export const Diagnosis = z.strictObject({
  id: Id,
  engineId: Id,
  engineName: z.string(),
  boatName: z.string(),
  treeVersionId: Id,
  begunAt: Moment,
  begunBy: z.string(),
  symptoms: z.array(z.strictObject({ key: Key, title: z.string() })),
  /** null while it is open. */
  outcome: OutcomeKind.nullable(),
  endedAt: Moment.nullable(),
  lastEventAt: Moment,
});
export type Diagnosis = z.infer<typeof Diagnosis>;

export const DiagnosisQuery = PageQuery.extend({ engineId: Id.optional(), open: z.enum(["yes", "no"]).optional() });
export type DiagnosisQuery = z.infer<typeof DiagnosisQuery>;

/** Events as a device posts them. Each is read by itself, so that one of a kind the server does not know holds up no other. */
export const PostedEvents = z.strictObject({
  events: z
    .array(z.looseObject({ id: Id }))
    .min(1)
    .max(500)
    .meta({ description: "Each item is a DiagnosisEvent; one that is not is rejected in its receipt." }),
});
export type PostedEvents = z.infer<typeof PostedEvents>;

export const EventReceipts = z.strictObject({ receipts: z.array(EventReceipt) });
export const StoredEvents = z.strictObject({ events: z.array(StoredEvent) });

/** One step of a diagnosis as it is read afterwards: what was said, why it was asked, and what was believed when it had been said. */
export const StoryStep = z.strictObject({
  event: Id,
  kind: z.string(),
  key: z.string().nullable(),
  title: z.string(),
  says: z.string(),
  at: Moment,
  by: z.string(),
  note: z.string().nullable(),
  photos: z.array(Id),
  /** Why this step came next; null where it was said out of turn. */
  askedWhy: z.string().nullable(),
  /** The earlier step that this one takes the place of, and what was said there; null where it changes none. */
  changes: z.strictObject({ event: Id, was: z.string() }).nullable(),
  /** The likeliest causes then, as counts out of 100 that add up to 100 with `others` and `unknown`. */
  believed: z.array(z.strictObject({ key: Key, title: z.string(), of100: z.number().int() })),
  others: z.number().int(),
  unknown: z.number().int(),
});
export type StoryStep = z.infer<typeof StoryStep>;

export const Story = z.strictObject({
  diagnosis: Diagnosis,
  complaint: z.string().nullable(),
  steps: z.array(StoryStep),
  treeNumber: z.number().int(),
});
export type Story = z.infer<typeof Story>;
