import * as z from "zod";
import { asTyped, typedNumber } from "@/components/form/typed-number";
import type { Engine, EngineChange, EngineProfile } from "@/lib/core/contract/engine";
import { FIGURE_LIMITS, HEALTHY_LIMITS, type FigureLimits } from "@/lib/core/contract/figure-limits";
import { convert } from "@/lib/core/units/units";
import { FIGURES, HEALTHY, type FigureAsked } from "./figures";

const number = typedNumber();
const positive = typedNumber({ from: 0.001 });
const text = z.string().trim().max(80, "Keep it under 80 characters.");

/** An engine as its form holds it, all as typed: "" is "don't know". Figures carry the unit they are typed in. */
export const EngineValues = z
  .object({
    name: z.string().trim().min(1, "Give the engine a name.").max(80, "Keep it under 80 characters."),
    meter: z.enum(["yes", "no"]),
    hoursPerYear: typedNumber({ from: 1, to: 8760 }),
    maker: text,
    model: text,
    serialNumber: text,
    cylinders: typedNumber({ from: 1, to: 12, whole: true }),
    ratedKw: typedNumber({ from: 0.5, to: 2000 }),
    features: z.record(z.string(), z.string()),
    figures: z.record(z.string(), z.object({ typed: positive, unit: z.string() })),
    healthy: z.record(z.string(), z.object({ typed: number, unit: z.string() })),
  })
  .superRefine(({ figures, healthy }, ctx) => {
    const check = (
      at: string,
      typed: typeof figures,
      asked: readonly FigureAsked<string>[],
      limits: Readonly<Record<string, FigureLimits>>,
    ) => {
      for (const [key, figure] of Object.entries(typed)) {
        const value = inUnit(figure, asked, key);
        const limit = limits[key];
        if (value === null || !limit || (value >= limit.from && value <= limit.to)) continue;
        ctx.addIssue({
          code: "custom",
          path: [at, key, "typed"],
          message: outside(value, limit, asked.find((one) => one.key === key)?.unit ?? ""),
        });
      }
    };
    check("figures", figures, FIGURES, FIGURE_LIMITS);
    check("healthy", healthy, HEALTHY, HEALTHY_LIMITS);
  })
  .transform(({ name, meter, hoursPerYear, features, figures, healthy, maker, model, serialNumber, cylinders, ratedKw }): EngineGiven => ({
    name,
    hasHourMeter: meter === "yes",
    estimatedHoursPerYear: hoursPerYear,
    profile: {
      features: given(features, (option) => option || null),
      figures: given(figures, (f, key) => inUnit(f, FIGURES, key)),
      healthy: given(healthy, (f, key) => inUnit(f, HEALTHY, key)),
      ...given({ maker, model, serialNumber }, (words) => words || null),
      ...given({ cylinders, ratedKw }, (n) => n),
    },
  }));
export type EngineValues = z.input<typeof EngineValues>;
export type EngineGiven = Required<Omit<EngineChange, "boatId">>;

/** What is known, without what is not. */
function given<V, R>(record: Readonly<Record<string, V>>, read: (value: V, key: string) => R | null): Record<string, R> {
  return Object.fromEntries(
    Object.entries(record).flatMap(([key, value]) => {
      const result = read(value, key);
      return result === null ? [] : [[key, result]];
    }),
  );
}

function inUnit(figure: { typed: number | null; unit: string }, asked: readonly FigureAsked<string>[], key: string): number | null {
  const kept = asked.find((one) => one.key === key)?.unit;
  return figure.typed === null || kept === undefined ? null : convert(figure.typed, figure.unit, kept);
}

/** "3.000" is three to one reader and three thousand to another: what was understood is said, so that it can be put right. */
function outside(value: number, { from, to }: FigureLimits, unit: string): string {
  const thousand = value < from && value * 1000 >= from && value * 1000 <= to;
  const meant = thousand ? ` For ${asTyped(value * 1000)} leave out the sign between the thousands.` : "";
  return `This reads as ${asTyped(value)} ${unit}; between ${from} and ${to} ${unit} is likely.${meant}`;
}

/** A new engine: nothing is known but what nearly all have. */
export const NOTHING_KNOWN: Pick<Engine, "name" | "hasHourMeter" | "profile"> = {
  name: "",
  hasHourMeter: true,
  profile: { features: {}, figures: {}, healthy: {} },
};

export function engineValues(
  engine: Pick<Engine, "name" | "hasHourMeter" | "profile"> & { estimatedHoursPerYear?: number | undefined },
  features: readonly { key: string }[],
): EngineValues {
  const { profile } = engine;
  // Features of an older tree that this one does not ask stay as they are.
  const keys = new Set([...features.map(({ key }) => key), ...Object.keys(profile.features)]);
  return {
    name: engine.name,
    meter: engine.hasHourMeter ? "yes" : "no",
    hoursPerYear: asTyped(engine.estimatedHoursPerYear),
    maker: profile.maker ?? "",
    model: profile.model ?? "",
    serialNumber: profile.serialNumber ?? "",
    cylinders: asTyped(profile.cylinders),
    ratedKw: asTyped(profile.ratedKw),
    features: Object.fromEntries([...keys].map((key) => [key, profile.features[key] ?? ""])),
    figures: asFigures(FIGURES, profile.figures),
    healthy: asFigures(HEALTHY, profile.healthy),
  };
}

const asFigures = (asked: readonly FigureAsked<string>[], known: EngineProfile["figures"] | EngineProfile["healthy"]) =>
  Object.fromEntries(asked.map(({ key, unit }) => [key, { typed: asTyped((known as Readonly<Record<string, number>>)[key]), unit }]));
