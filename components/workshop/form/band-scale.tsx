import { bandsOf } from "@/lib/core/units/bands";
import type { Check, Feature, Reading } from "@/lib/core/tree/schema";

type Props = { reading: Reading; findings: Check["findings"]; features: readonly Feature[] };

/** For bands that hang on an engine's own figures: how they lie on an ordinary engine. */
const ORDINARY = { ratedRpm: 3000, noLoadRpm: 3200, idleRpm: 850, openingTemperatureC: 75 };

/** The bands along their scale, each as wide as it is. Edges that hang on the engine are drawn as on an ordinary one. */
export function BandScale({ reading, findings, features }: Props) {
  const bands = bandsOf(reading, { features: {}, figures: ORDINARY, healthy: {} }, features) ?? [];
  const width = reading.to - reading.from;
  const titleOf = (key: string) => findings.find((one) => one.key === key)?.title ?? key;
  if (bands.length === 0 || !(width > 0)) return null;
  return (
    <figure aria-label="The bands along the scale">
      <div className="flex overflow-hidden rounded-lg border-[1.5px] border-edge">
        {bands.map((band, index) => (
          <span
            key={`${band.finding}-${band.from}`}
            title={`${titleOf(band.finding)}: ${band.from} to ${band.to} ${reading.unit}`}
            className={index % 2 === 0 ? "min-w-0.5 truncate bg-sheet px-1 text-sm" : "min-w-0.5 truncate bg-shoal px-1 text-sm"}
            style={{ flexGrow: Math.max(0.004, (band.to - band.from) / width), flexBasis: 0 }}
          >
            {titleOf(band.finding)}
          </span>
        ))}
      </div>
      <figcaption className="dial flex justify-between text-sm text-ink-2">
        <span>
          {reading.from} {reading.unit}
        </span>
        <span>
          {bands
            .slice(1)
            .map(({ from }) => round(from))
            .join(" · ")}
        </span>
        <span>
          {reading.to} {reading.unit}
        </span>
      </figcaption>
    </figure>
  );
}

const round = (value: number): number => Math.round(value * 100) / 100;
