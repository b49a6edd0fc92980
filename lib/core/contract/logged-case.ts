import * as z from "zod";
import { KnownCase } from "../tree/schema";
import { Id } from "./id";

/** A diagnosis of this fleet that ended in a proved cure, as a known case that a tree can be proved with. */
export const LoggedCase = z.strictObject({ diagnosisId: Id, known: KnownCase });
export type LoggedCase = z.infer<typeof LoggedCase>;
