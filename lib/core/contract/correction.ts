import * as z from "zod";
import { Id, Moment } from "./id";

export const CorrectedKind = z.enum(["repair", "reading"]);
export type CorrectedKind = z.infer<typeof CorrectedKind>;

/** What a line said until somebody corrected it or took it back. Nothing that was written is thrown away. */
export const Correction = <S extends z.ZodType>(was: S) =>
  z.strictObject({
    /** The version that was put aside. */
    version: z.number().int(),
    was,
    /** Taken back, not replaced by other words. */
    takenBack: z.boolean(),
    at: Moment,
    by: z.string(),
    byId: Id,
  });
