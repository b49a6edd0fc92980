import type { Lines } from "@/components/form/stale-notice";
import type { Feature } from "@/lib/core/tree/schema";
import type { EngineValues } from "./engine-values";
import { FIGURES, HEALTHY } from "./figures";

const orNot = (typed: string, unit = "") => (typed.trim() === "" ? "don't know" : `${typed.trim()}${unit && ` ${unit}`}`);

/** The engine's form in words, for comparing two versions of it. */
export function engineLines(values: EngineValues, features: readonly Feature[]): Lines {
  const lines: Record<string, string> = {
    Name: values.name,
    "Hour meter": values.meter === "yes" ? "has one" : "has none",
    "Hours a year": orNot(values.hoursPerYear, "h"),
    Maker: orNot(values.maker),
    Model: orNot(values.model),
    "Serial number": orNot(values.serialNumber),
    Cylinders: orNot(values.cylinders),
    Power: orNot(values.ratedKw, "kW"),
  };
  for (const feature of features) {
    const option = values.features[feature.key];
    lines[feature.title] = feature.options.find(({ key }) => key === option)?.title ?? "don't know";
  }
  for (const { key, title } of [...FIGURES, ...HEALTHY]) {
    const figure = values.figures[key] ?? values.healthy[key];
    lines[title] = figure ? orNot(figure.typed, figure.unit) : "don't know";
  }
  return lines;
}
