import * as z from "zod";
import { EngineFigure, HealthyReading, Key } from "../tree/schema";
import { FIGURE_LIMITS, HEALTHY_LIMITS, type FigureLimits } from "./figure-limits";
import { Correction } from "./correction";
import { Id, Moment } from "./id";

/** As many features as any tree will ask of. */
const MOST_FEATURES = 200;

/** What an engine is: features of the tree it has, and its maker's figures. An absent key means "don't know". */
export const EngineProfile = z.strictObject({
  features: z
    .record(Key, Key)
    .refine((features) => Object.keys(features).length <= MOST_FEATURES, "That is more than an engine has.")
    .default({}),
  figures: z.partialRecord(EngineFigure, z.number().positive()).default({}),
  healthy: z.partialRecord(HealthyReading, z.number()).default({}),
  maker: z.string().trim().max(80).optional(),
  model: z.string().trim().max(80).optional(),
  serialNumber: z.string().trim().max(80).optional(),
  cylinders: z.number().int().min(1).max(12).optional(),
  ratedKw: z.number().positive().max(2000).optional(),
});
export type EngineProfile = z.infer<typeof EngineProfile>;

/** A profile as it is taken in: figures no engine has are refused. What was kept before is read as it is. */
export const GivenProfile = EngineProfile.superRefine(({ figures, healthy }, ctx) => {
  const within = (at: string, given: Readonly<Record<string, number | undefined>>, limits: Readonly<Record<string, FigureLimits>>) => {
    for (const [key, value] of Object.entries(given)) {
      const limit = limits[key];
      if (value === undefined || !limit || (value >= limit.from && value <= limit.to)) continue;
      ctx.addIssue({ code: "custom", path: [at, key], message: `This lies between ${limit.from} and ${limit.to} on any engine.` });
    }
  };
  within("figures", figures, FIGURE_LIMITS);
  within("healthy", healthy, HEALTHY_LIMITS);
});

export const NewBoat = z.strictObject({
  id: Id,
  name: z.string().trim().min(1).max(80),
  /** Minutes that a call for help costs here, where they differ from the defaults. */
  callMinutes: z
    .strictObject({ alongside: z.number().positive(), atAnchor: z.number().positive(), underWay: z.number().positive() })
    .partial()
    .default({}),
});
export type NewBoat = z.infer<typeof NewBoat>;

export const BoatChange = NewBoat.omit({ id: true, callMinutes: true })
  .extend({ callMinutes: NewBoat.shape.callMinutes.unwrap() })
  .partial();
export type BoatChange = z.infer<typeof BoatChange>;

export const Boat = NewBoat.extend({ version: z.number().int(), createdAt: Moment });
export type Boat = z.infer<typeof Boat>;

export const NewEngine = z.strictObject({
  id: Id,
  boatId: Id,
  /** "main engine", "port", "starboard". */
  name: z.string().trim().min(1).max(80),
  hasHourMeter: z.boolean().default(true),
  /** For an engine without a meter: hours run in a usual year, from which hours are estimated. */
  estimatedHoursPerYear: z.number().positive().max(8760).optional(),
  profile: GivenProfile.prefault({}),
});
export type NewEngine = z.infer<typeof NewEngine>;

/** What is left out stays; a profile is replaced whole. null: the yearly hours are not known after all. */
export const EngineChange = z
  .strictObject({
    boatId: Id,
    name: NewEngine.shape.name,
    hasHourMeter: z.boolean(),
    estimatedHoursPerYear: z.number().positive().max(8760).nullable(),
    profile: GivenProfile,
  })
  .partial();
export type EngineChange = z.infer<typeof EngineChange>;

export const Engine = NewEngine.extend({
  profile: EngineProfile,
  version: z.number().int(),
  createdAt: Moment,
  boatName: z.string(),
  /** The last reading; null before the first. */
  hours: z.number().nonnegative().nullable(),
  /** As `hours`, but counted on over a replaced meter: what the log counts in. */
  hoursSinceNew: z.number().nonnegative().nullable(),
  hoursAreEstimated: z.boolean(),
  hoursReadAt: Moment.nullable(),
});
export type Engine = z.infer<typeof Engine>;

/** A reading of the hour meter. `reset`: the meter was replaced or set back; hours go on from `reading`. */
export const HourReading = z.strictObject({
  id: Id,
  engineId: Id,
  reading: z.number().nonnegative().max(200_000),
  readAt: Moment,
  reset: z.boolean().default(false),
});
export type HourReading = z.infer<typeof HourReading>;

/** A reading as it should have been written. */
export const ReadingChange = HourReading.omit({ id: true, engineId: true });
export type ReadingChange = z.infer<typeof ReadingChange>;

/** A reading in a list. `hours`: hours since new then. `doubtful`: it does not fit the others, so it is not counted. */
export const ListedReading = HourReading.extend({
  hours: z.number().nullable(),
  doubtful: z.boolean(),
  /** More than 1: it has been corrected. What If-Match names. */
  version: z.number().int(),
  /** The line of the log that it was written down with, and that it is corrected with: a repair, or a diagnosis' outcome. */
  partOf: z.enum(["repair", "diagnosis"]).nullable(),
});
export type ListedReading = z.infer<typeof ListedReading>;

/** A reading with all that was ever written of it. */
export const Reading = z.strictObject({
  id: Id,
  engineId: Id,
  reading: z.number(),
  readAt: Moment,
  reset: z.boolean(),
  by: z.string(),
  version: z.number().int(),
  takenBackAt: Moment.nullable(),
  /** Oldest first. */
  corrections: z.array(Correction(ReadingChange)),
});
export type Reading = z.infer<typeof Reading>;
