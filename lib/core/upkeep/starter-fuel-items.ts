import * as z from "zod";
import { UpkeepItem } from "./upkeep-item";

const fitted = (feature: string) => ({ features: { [feature]: ["fitted"] } });

/** The fuel side of the starter plan: three filter stages, each with its own interval, and the water under the tank. */
export const FUEL_ITEMS: readonly UpkeepItem[] = z.array(UpkeepItem).parse([
  {
    key: "primary-element",
    title: "First fuel filter: primary element",
    system: "fuel-supply",
    everyHours: 200,
    everyMonths: 12,
    renews: true,
    parts: [
      { key: "primary-element", title: "Primary filter element" },
      { key: "primary-seals", title: "Set of seals for the primary filter" },
    ],
    guards: ["primary-filter-blocked", "primary-filter-seal-leak"],
    mayBring: ["air-after-service", "primary-filter-seal-leak"],
    appliesTo: fitted("primary-filter"),
    source: "200 h or a year, or when the vacuum says so; from memory",
  },
  {
    key: "secondary-element",
    title: "Second fuel filter: the one on the engine",
    system: "fuel-supply",
    everyHours: 250,
    everyMonths: 12,
    renews: true,
    parts: [
      { key: "secondary-element", title: "Engine fuel filter" },
      { key: "secondary-seals", title: "Its seals and bleed washer" },
    ],
    guards: ["secondary-filter-blocked"],
    mayBring: ["air-after-service", "bleed-point-leak"],
    source: "250 to 400 h or a year; from memory",
  },
  {
    key: "third-element",
    title: "Third fuel filter or inlet screen at the injection pump",
    system: "fuel-supply",
    everyHours: 500,
    everyMonths: 24,
    renews: true,
    parts: [{ key: "third-element", title: "Last fuel filter and its seals" }],
    guards: ["final-filter-blocked", "inlet-screen-blocked"],
    mayBring: ["air-after-service"],
    appliesTo: fitted("third-filter"),
    source: "Twice the interval of the filter before it; judgement",
  },
  {
    key: "drain-tank-low-point",
    title: "Tank's low point and separator drained until clear",
    system: "fuel-quality",
    everyHours: 500,
    everyMonths: 1,
    renews: false,
    guards: ["water-in-fuel", "microbial-growth"],
    source: "Monthly from memory; 500 h in an army manual for its diesels (read)",
  },
]);
