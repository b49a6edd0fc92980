import * as z from "zod";

/** UUIDv7: made by the device that makes the thing, so that sending twice is harmless. */
export const Id = z.uuid().toLowerCase();
export type Id = z.infer<typeof Id>;

const EARLIEST = Date.parse("1900-01-01T00:00:00Z");
const LATEST = Date.parse("3000-01-01T00:00:00Z");

/** A moment. However wrong a phone's clock is, it is one that every database and every reader can keep. */
export const Moment = z.iso.datetime({ offset: true }).refine((moment) => {
  const ms = Date.parse(moment);
  return ms >= EARLIEST && ms < LATEST;
}, "That is no moment of ours.");
export type Moment = z.infer<typeof Moment>;
