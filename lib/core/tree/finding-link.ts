import * as z from "zod";
import { STRENGTHS, type StrengthWord } from "./strength";

const words = Object.keys(STRENGTHS) as [StrengthWord, ...StrengthWord[]];

/** A word of the scale, or a probability where there is a figure. */
export const Strength = z.union([z.enum(words), z.number().gt(0).lt(1)]);
export type Strength = z.infer<typeof Strength>;

/** Evidence as the trade grades it: so many times the odds that a sound engine shows this finding ("x20", "x1/3"). */
export const OddsFactor = z.string().regex(/^x(1\/)?[1-9][0-9]*(\.[0-9]+)?$/, 'a factor reads like "x20" or "x1/3"');
export type OddsFactor = z.infer<typeof OddsFactor>;

/** How a cause shifts one finding: said as a strength, or as a factor on a sound engine's odds. */
export const FindingLink = z.union([Strength, OddsFactor]);
export type FindingLink = z.infer<typeof FindingLink>;
