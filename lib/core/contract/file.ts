import * as z from "zod";
import { Id, Moment } from "./id";

/** A photo as it is kept: encoded anew, without what the camera wrote beside the pixels. */
export const StoredFile = z.strictObject({
  id: Id,
  mediaType: z.literal("image/jpeg"),
  bytes: z.number().int(),
  widthPx: z.number().int(),
  heightPx: z.number().int(),
  createdAt: Moment,
});
export type StoredFile = z.infer<typeof StoredFile>;
