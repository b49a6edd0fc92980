import * as z from "zod";
import { Key } from "../tree/schema";
import { Id } from "./id";

const Limits = z.tuple([z.number(), z.number().nullable()]).describe("9 in 10; null where nothing bounds it");

/** What chance could have made of a fault that came back, in words and in the numbers behind them. */
export const RepeatEvidence = z.strictObject({
  engineId: Id,
  cause: Key,
  title: z.string(),
  words: z.array(z.string()),
  unit: z.enum(["hours", "days"]).describe("What times are counted in; days where hours are not known"),
  estimated: z.boolean(),
  /** From the beginning of the record; `now`: its end. */
  times: z.array(z.number()),
  now: z.number(),
  unproved: z.number().int().min(0),
  trend: z.enum(["too-few", "not-shown", "getting-worse", "was-getting-worse"]),
  laplace: z.strictObject({ u: z.number(), worsening: z.number(), exact: z.number() }).nullable(),
  chiSquare: z.strictObject({ x: z.number(), degrees: z.number(), worsening: z.number(), improving: z.number() }).nullable(),
  growth: z
    .strictObject({ beta: z.number(), betaLimits: Limits, mtbfNow: z.number(), mtbfNowLimits: Limits, fits: z.boolean().nullable() })
    .nullable(),
  frequency: z.enum(["no-fleet", "too-few", "not-shown", "oftener"]),
  mtbf: z.number().nullable(),
  mtbfLimits: Limits,
  /** How many the fleet's own rate would make in that time, and the chance of so many or more. */
  expected: z.number().nullable(),
  byPoisson: z.number().nullable(),
  byChance: z.number().nullable(),
});
export type RepeatEvidence = z.infer<typeof RepeatEvidence>;
