import type { LogEntry } from "@/lib/core/contract/log";

/** Engine hours of a line of the log; "~" for estimated ones, a dash where they are not known. */
export const hoursInWords = ({ engineHours, hoursAreEstimated }: Pick<LogEntry, "engineHours" | "hoursAreEstimated">): string =>
  engineHours === null ? "–" : `${hoursAreEstimated ? "~" : ""}${Math.round(engineHours)}`;
