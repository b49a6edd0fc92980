import type { Feature, Reading } from "../tree/schema";
import { bandsOf, type Figures } from "./bands";

/**
 * The finding that a reading stands for: the band it falls in, lower edge in,
 * upper edge out. Beyond the scale counts as its end. Should healthy readings
 * have pushed two edges past each other, the nearest band stands. Rules [U4], [U6].
 *
 * @param value in the reading's own unit; convert() first.
 * @returns the finding's key, or null when the bands need a figure of this
 *   engine that nobody has told.
 */
export function findingOf(reading: Reading, value: number, engine: Figures, features: readonly Feature[] = []): string | null {
  const bands = bandsOf(reading, engine, features);
  if (!bands || bands.length === 0 || Number.isNaN(value)) return null;
  const distance = (from: number, to: number): number => (value < from ? from - value : value >= to ? value - to : -1);
  let nearest = bands[0];
  let least = Infinity;
  for (const band of bands) {
    const away = distance(band.from, band.to);
    // An empty band holds no reading.
    if (band.to > band.from && away < least) {
      least = away;
      nearest = band;
    }
  }
  return nearest?.finding ?? null;
}
