import * as z from "zod";

const number = (most: number) => z.coerce.number().min(0).max(most);

/** A passage: engine hours, litres to burn, months away; a dirty tank by the litres in it, and what was counted of it so far. */
export const PassageQuery = z
  .strictObject({
    hours: number(5000).default(0),
    litres: number(50_000).default(0),
    months: number(60).default(0),
    dirtyLitres: number(50_000).optional(),
    clogged: number(500).optional().describe("Elements clogged over `cloggedLitres` burnt so far"),
    cloggedLitres: number(50_000).optional(),
  })
  .refine((asked) => (asked.clogged === undefined) === (asked.cloggedLitres === undefined), {
    path: ["cloggedLitres"],
    message: "Give both: how many elements, over how many litres.",
  });
export type PassageQuery = z.infer<typeof PassageQuery>;

/** One part to carry. `carry`: enough 90, 95 and 99 times in 100. `reasons`: what needs it, the figure that drives it first. */
export const PassageLine = z.strictObject({
  part: z.string(),
  title: z.string(),
  /** Those engines of the boat that take it, where they do not take the same. */
  fits: z.string().nullable(),
  mean: z.number(),
  carry: z.strictObject({ at90: z.number().int(), at95: z.number().int(), at99: z.number().int() }),
  reasons: z.array(
    z.strictObject({ kind: z.enum(["upkeep", "fault", "dirty-tank"]), title: z.string(), mean: z.number(), words: z.string() }),
  ),
});
export type PassageLine = z.infer<typeof PassageLine>;
