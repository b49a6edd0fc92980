import * as z from "zod";

/** What every list that can grow is asked with; `after`: the `next` of the page before. */
export const PageQuery = z.strictObject({
  after: z.string().max(200).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});
export type PageQuery = z.infer<typeof PageQuery>;

/** A page of a list; `next` is null on the last. */
export const pageOf = <S extends z.ZodType>(item: S) => z.strictObject({ items: z.array(item), next: z.string().nullable() });

/** A list that cannot grow beyond one page. */
export const listOf = <S extends z.ZodType>(item: S) => z.strictObject({ items: z.array(item) });
