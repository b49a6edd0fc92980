import type { EngineFigure, HealthyReading, Quantity } from "@/lib/core/tree/schema";
import type * as z from "zod";

export type FigureKey = z.infer<typeof EngineFigure>;
export type HealthyKey = z.infer<typeof HealthyReading>;

export type FigureAsked<K extends string> = {
  key: K;
  title: string;
  hint: string;
  quantity: Quantity;
  /** The unit it is kept in. */ unit: string;
};

/** Figures of the maker's that a check's bands hang on. */
export const FIGURES: readonly FigureAsked<FigureKey>[] = [
  {
    key: "ratedRpm",
    title: "Rated speed",
    hint: "Where it gives its full power: on the plate, or in the manual.",
    quantity: "speed",
    unit: "rpm",
  },
  { key: "noLoadRpm", title: "Top speed in neutral", hint: "Above the rated speed by about a tenth.", quantity: "speed", unit: "rpm" },
  { key: "idleRpm", title: "Idle speed", hint: "Warm, in neutral.", quantity: "speed", unit: "rpm" },
  {
    key: "openingTemperatureC",
    title: "Thermostat opens at",
    hint: "Stamped on the thermostat, or in the manual.",
    quantity: "temperature",
    unit: "C",
  },
];

/** What this engine showed when it was well: the best thing to compare a reading with. */
export const HEALTHY: readonly FigureAsked<HealthyKey>[] = [
  { key: "topRpmInGear", title: "Top speed in gear", hint: "Clean hull, flat water, full throttle.", quantity: "speed", unit: "rpm" },
  { key: "cruiseTemperatureC", title: "Temperature at cruise", hint: "Off its own gauge.", quantity: "temperature", unit: "C" },
  { key: "oilPressureKpa", title: "Oil pressure at cruise", hint: "Warm, off its own gauge.", quantity: "pressure", unit: "kPa" },
  { key: "startSeconds", title: "Time to start", hint: "Of cranking, cold, at about 10 °C.", quantity: "time", unit: "s" },
  { key: "crankingVolts", title: "Voltage while cranking", hint: "At the starter battery.", quantity: "voltage", unit: "V" },
  {
    key: "filterVacuumKpa",
    title: "Vacuum at the primary filter",
    hint: "Full throttle, with a new element, where a gauge is fitted.",
    quantity: "pressure",
    unit: "kPa",
  },
];
