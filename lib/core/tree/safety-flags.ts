import * as z from "zod";

/** What a step does that can hurt; first and last steps and cautions are written from these, once (safety-steps.ts). */
export const SafetyFlags = z.strictObject({
  /** Seconds of cranking that this step asks for. */
  cranks: z.number().int().min(1).max(60).optional(),
  /** The stop is held while it cranks: the engine must not fire. */
  fuelOff: z.literal(true).optional(),
  opensRawWater: z.literal(true).optional(),
  opensHoseBelowWater: z.literal(true).optional(),
  opensCoolant: z.literal(true).optional(),
  opensFuelDirty: z.literal(true).optional(),
  opensFuelClean: z.literal(true).optional(),
  opensHighPressureFuel: z.literal(true).optional(),
  beltsExposed: z.literal(true).optional(),
  handsAtShaft: z.literal(true).optional(),
  hotParts: z.literal(true).optional(),
  worksOnBattery: z.literal(true).optional(),
  inWater: z.literal(true).optional(),
  underLoad: z.literal(true).optional(),
});
export type SafetyFlags = z.infer<typeof SafetyFlags>;
