import * as z from "zod";
import { AppliesTo, Key } from "../tree/schema";

/** A part that the work uses up. `quantity` "cylinders": one for each. */
export const UpkeepPart = z.strictObject({
  key: Key,
  title: z.string().trim().min(1).max(120),
  quantity: z.union([z.number().positive().max(100), z.literal("cylinders")]).default(1),
});
export type UpkeepPart = z.infer<typeof UpkeepPart>;

/** Something done on an engine by hours or months, whichever comes first. */
export const UpkeepItem = z
  .strictObject({
    key: Key,
    title: z.string().trim().min(1).max(120),
    system: Key,
    everyHours: z.number().positive().max(50_000).nullable(),
    everyMonths: z.number().positive().max(240).nullable(),
    /** The first time on a new or rebuilt engine. */
    firstHours: z.number().positive().max(50_000).nullable().default(null),
    /** A part is put in, or it is only looked at, cleaned or drained. */
    renews: z.boolean(),
    parts: z.array(UpkeepPart).max(20).default([]),
    /** Causes of the tree that it keeps away. */
    guards: z.array(Key).max(20).default([]),
    /** Causes of the tree that the work itself may bring in. */
    mayBring: z.array(Key).max(20).default([]),
    appliesTo: AppliesTo.optional(),
    /** Where the interval comes from, in words. */
    source: z.string().trim().min(1).max(200),
  })
  .refine((item) => item.everyHours !== null || item.everyMonths !== null, "Say after how many hours or months.");
export type UpkeepItem = z.infer<typeof UpkeepItem>;

/** One time that it was done. */
export type UpkeepDone = { readonly item: string; readonly at: string; readonly hours: number | null };
