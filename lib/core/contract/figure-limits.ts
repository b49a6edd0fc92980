import type * as z from "zod";
import type { EngineFigure, HealthyReading } from "../tree/schema";

export type FigureLimits = { from: number; to: number };

/** Between what any small marine diesel has: rpm and °C. A figure outside is a slip, and every reading would be judged by it. */
export const FIGURE_LIMITS: Readonly<Record<z.infer<typeof EngineFigure>, FigureLimits>> = {
  ratedRpm: { from: 500, to: 8000 },
  noLoadRpm: { from: 500, to: 9000 },
  idleRpm: { from: 300, to: 2000 },
  openingTemperatureC: { from: 30, to: 110 },
};

/** The same for what an engine showed when it was well: rpm, kPa, s, V, °C. */
export const HEALTHY_LIMITS: Readonly<Record<z.infer<typeof HealthyReading>, FigureLimits>> = {
  topRpmInGear: { from: 500, to: 9000 },
  filterVacuumKpa: { from: 0, to: 100 },
  startSeconds: { from: 0.1, to: 60 },
  crankingVolts: { from: 4, to: 30 },
  cruiseTemperatureC: { from: 20, to: 130 },
  oilPressureKpa: { from: 20, to: 1500 },
};
