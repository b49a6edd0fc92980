import type { EngineProfile } from "@/lib/core/contract/engine";
import type { Feature } from "@/lib/core/tree/schema";

const MOST_FEATURES = 6;

/** What an engine is in one line: "4 cylinders, 33 kW at 3000 rpm, heat exchanger, glow plugs"; "" while nothing is known. */
export function profileInWords(profile: EngineProfile, features: readonly Feature[]): string {
  const { cylinders, ratedKw, figures, maker, model } = profile;
  const power = ratedKw === undefined ? null : `${ratedKw} kW`;
  const speed = figures.ratedRpm === undefined ? null : `${figures.ratedRpm} rpm`;
  return [
    [maker, model].filter(Boolean).join(" ") || null,
    cylinders === undefined ? null : cylinders === 1 ? "1 cylinder" : `${cylinders} cylinders`,
    power && speed ? `${power} at ${speed}` : (power ?? speed),
    ...features
      .map((feature) => inWords(feature, profile.features[feature.key]))
      .filter((words) => words !== null)
      .slice(0, MOST_FEATURES),
  ]
    .filter((part) => part !== null)
    .join(", ");
}

/** What is there is said; what is not there is left out. */
function inWords(feature: Feature, chosen: string | undefined): string | null {
  const option = feature.options.find(({ key }) => key === chosen);
  if (!option || option.key === "none" || option.key.startsWith("not-")) return null;
  const title = lower(feature.title);
  if (option.key === "fitted") return title;
  const words = lower(option.title.split(/[:,]/)[0] ?? option.title);
  // "wet" alone says nothing; "wet exhaust" does.
  return words.includes(" ") || words === title || words === "turbo" ? words : `${words} ${title}`;
}

const lower = (text: string) => text.charAt(0).toLowerCase() + text.slice(1);
