import type { AppliesTo, Edge, EngineFigure, Feature, HealthyReading, Reading } from "../tree/schema";
import { convert } from "./units";

/** What a band needs to know of an engine; an EngineProfile has it all. */
export type Figures = {
  readonly features: Readonly<Record<string, string>>;
  readonly figures: Partial<Readonly<Record<EngineFigure, number>>>;
  readonly healthy: Partial<Readonly<Record<HealthyReading, number>>>;
};

/** A band with its edges as numbers in the reading's unit. */
export type Band = { readonly finding: string; readonly from: number; readonly to: number };

/** Units in which profiles keep these figures. */
const FIGURE_UNITS: Readonly<Record<EngineFigure | HealthyReading, string>> = {
  ratedRpm: "rpm",
  noLoadRpm: "rpm",
  idleRpm: "rpm",
  openingTemperatureC: "C",
  topRpmInGear: "rpm",
  filterVacuumKpa: "kPa",
  startSeconds: "s",
  crankingVolts: "V",
  cruiseTemperatureC: "C",
  oilPressureKpa: "kPa",
};

function edgeIn(edge: Edge, unit: string, engine: Figures): number | null {
  if (typeof edge === "number") return edge;
  if ("of" in edge) {
    const figure = engine.figures[edge.of];
    return figure === undefined ? null : convert(figure * edge.times, FIGURE_UNITS[edge.of], unit);
  }
  const healthy = engine.healthy[edge.healthy];
  return healthy === undefined ? edge.otherwise : convert(healthy, FIGURE_UNITS[edge.healthy], unit) + edge.plus;
}

/** An engine whose owner does not know a feature is judged as the likeliest kind [U5]. */
function likeliest(feature: string, rows: readonly (AppliesTo | undefined)[], features: readonly Feature[]): string | undefined {
  const options = features.find((one) => one.key === feature)?.options ?? [];
  const best = [...options].sort((a, b) => (b.share ?? 0) - (a.share ?? 0))[0];
  return best?.key ?? rows.find((row) => row?.features?.[feature])?.features?.[feature]?.[0];
}

/**
 * The bands that hold for this engine, with numbers for edges, lowest first.
 * Rules [U4], [U5].
 *
 * @returns null when an edge hangs on an engine figure that nobody has told.
 */
export function bandsOf(reading: Reading, engine: Figures, features: readonly Feature[] = []): readonly Band[] | null {
  const whens = reading.bands.map((band) => band.when);
  const holds = (when: AppliesTo | undefined): boolean =>
    Object.entries(when?.features ?? {}).every(([feature, options]) =>
      options.includes(engine.features[feature] ?? likeliest(feature, whens, features) ?? ""),
    );
  const bands: Band[] = [];
  for (const band of reading.bands) {
    if (!holds(band.when)) continue;
    const from = edgeIn(band.from, reading.unit, engine);
    const to = edgeIn(band.to, reading.unit, engine);
    if (from === null || to === null) return null;
    bands.push({ finding: band.finding, from, to });
  }
  return bands.sort((a, b) => a.from - b.from || a.to - b.to);
}
