import * as z from "zod";
import { EngineFigure, Key, Situation, Who } from "../tree/schema";
import { EngineProfile } from "./engine";
import { Id, Moment } from "./id";
import { KeptText } from "./kept-text";

/**
 * What happens in a diagnosis, as the devices write it down: answers, never
 * conclusions. The log is append-only; a change of mind is an event that
 * supersedes another. Ordered by device and sequence, never by wall clock.
 */

/** Why a cause's weight was moved for this engine before the first question. */
export const Multiplier = z.strictObject({ cause: Key, times: z.number().min(0.2).max(5), reason: KeptText.max(200) });
export type Multiplier = z.infer<typeof Multiplier>;

export const Answer = z.union([
  z.strictObject({ finding: Key }),
  /** A reading as typed; the finding is derived, so that it survives moved bands. */
  z.strictObject({ value: z.number(), unit: z.string().min(1).max(20) }),
  z.strictObject({ cannotTell: z.literal(true) }),
  /** "Not fitted": the part that the check looks at is not there. */
  z.strictObject({ notFitted: z.literal(true) }),
]);
export type Answer = z.infer<typeof Answer>;

export const RemedyResult = z.enum(["cured", "better", "no-change", "could-not"]);
export type RemedyResult = z.infer<typeof RemedyResult>;

/** cured: proved. held: a temporary repair, or a cure not proved. handed-over: help was called. by-itself: it runs again, nothing found. broken-off: given up without an end. */
export const OutcomeKind = z.enum(["cured", "held", "handed-over", "by-itself", "broken-off"]);
export type OutcomeKind = z.infer<typeof OutcomeKind>;

export const OutcomePayload = z.strictObject({
  outcome: OutcomeKind,
  cause: Key.optional(),
  /** In the person's words, where the tree does not have the cause. */
  causeInWords: KeptText.trim().max(500).optional(),
  remedy: Key.optional(),
  remedyInWords: KeptText.trim().max(500).optional(),
  /** How the cure was proved; absent: it was not. */
  proof: KeptText.trim().max(500).optional(),
  engineHours: z.number().nonnegative().max(200_000).optional(),
  /** The meter was replaced or set back since the last reading: a lower figure is meant. */
  meterReset: z.literal(true).optional(),
  minutes: z.number().nonnegative().max(100_000).optional(),
  parts: z
    .array(z.strictObject({ key: Key.optional(), title: KeptText.trim().min(1).max(200), quantity: z.number().positive().max(1000) }))
    .max(100)
    .default([]),
  note: KeptText.max(4000).optional(),
});
export type OutcomePayload = z.infer<typeof OutcomePayload>;

const kinds = {
  begun: z.strictObject({
    engineId: Id,
    treeVersionId: Id,
    profile: EngineProfile,
    situation: Situation,
    person: Who,
    symptoms: z.array(Key).max(12),
    /** The complaint as typed. */
    complaint: KeptText.max(1000).optional(),
    multipliers: z.array(Multiplier).max(500).default([]),
    callMinutes: z.number().positive().optional(),
    coreVersion: z.number().int(),
  }),
  "symptom-told": z.strictObject({ symptom: Key, present: z.boolean() }),
  "situation-changed": z.strictObject({ situation: Situation }),
  answered: z.strictObject({ check: Key, answer: Answer, note: KeptText.max(4000).optional(), photos: z.array(Id).max(12).default([]) }),
  "rule-answered": z.strictObject({ rule: Key, answer: z.enum(["yes", "no", "cleared"]) }),
  "remedy-tried": z.strictObject({
    remedy: Key,
    result: RemedyResult,
    proof: KeptText.max(500).optional(),
    note: KeptText.max(4000).optional(),
    photos: z.array(Id).max(12).default([]),
  }),
  /** The starter turned for so long; `ran`: the engine then ran, which clears the exhaust of water. */
  cranked: z.strictObject({ seconds: z.number().min(0).max(600), ran: z.boolean() }),
  "feature-told": z.strictObject({ feature: Key, option: Key }),
  "figure-told": z.strictObject({ figure: EngineFigure, value: z.number().positive() }),
  /** A tool or part that is not aboard. */
  "not-aboard": z.strictObject({ item: KeptText.min(1).max(200) }),
  "runs-again": z.strictObject({ note: KeptText.max(4000).optional() }),
  noted: z.strictObject({ note: KeptText.max(4000), photos: z.array(Id).max(12).default([]) }),
  /** Takes back an event: an answer, a tried remedy, a rule. */
  "taken-back": z.strictObject({ event: Id }),
  /** Two devices answered one step at once; this one is right. */
  picked: z.strictObject({ event: Id }),
  ended: OutcomePayload,
  "taken-up-again": z.strictObject({}),
} as const;

export type EventKind = keyof typeof kinds;

const MOST_DEVICES = 200;

const base = {
  id: Id,
  diagnosisId: Id,
  device: Id,
  /** Counts up on that device within the diagnosis, from 1. */
  sequence: z.number().int().min(1).max(2_147_483_647),
  madeAt: Moment,
  /** The newest events this device had seen of the other devices, by device: how far it knew their log. */
  seen: z
    .record(Id, z.number().int().min(0))
    .refine((seen) => Object.keys(seen).length <= MOST_DEVICES, "No diagnosis is shared by so many devices.")
    .default({}),
  /** The event this one replaces. */
  supersedes: Id.optional(),
};

const shape = <K extends EventKind>(kind: K) => z.strictObject({ ...base, kind: z.literal(kind), payload: kinds[kind] });

export const DiagnosisEvent = z.discriminatedUnion("kind", [
  shape("begun"),
  shape("symptom-told"),
  shape("situation-changed"),
  shape("answered"),
  shape("rule-answered"),
  shape("remedy-tried"),
  shape("cranked"),
  shape("feature-told"),
  shape("figure-told"),
  shape("not-aboard"),
  shape("runs-again"),
  shape("noted"),
  shape("taken-back"),
  shape("picked"),
  shape("ended"),
  shape("taken-up-again"),
]);
export type DiagnosisEvent = z.infer<typeof DiagnosisEvent>;
export type EventOf<K extends EventKind> = Extract<DiagnosisEvent, { kind: K }>;

/** What the server says of each event posted. */
export const EventReceipt = z.strictObject({
  id: Id,
  result: z.enum(["stored", "duplicate", "rejected"]),
  because: z.string().optional(),
});
export type EventReceipt = z.infer<typeof EventReceipt>;

/** An event as the server keeps it. */
export const StoredEvent = z.intersection(DiagnosisEvent, z.object({ receivedAt: Moment, by: Id, byName: z.string() }));
export type StoredEvent = z.infer<typeof StoredEvent>;
