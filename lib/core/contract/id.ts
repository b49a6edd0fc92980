import * as z from "zod";

/** UUIDv7: made by the device that makes the thing, so that sending twice is harmless. */
export const Id = z.uuid().toLowerCase();
export type Id = z.infer<typeof Id>;

/** A moment, in UTC. */
export const Moment = z.iso.datetime({ offset: true });
export type Moment = z.infer<typeof Moment>;
