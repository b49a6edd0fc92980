import type { Check, FaultTree, Reading } from "@/lib/core/tree/schema";

/**
 * One figure of an edge between two bands. A number is one figure ("at"), a
 * factor of an engine figure is one ("times"), an edge that hangs on this
 * engine's healthy reading is two: what is added ("plus") and what stands
 * where nobody has read the engine when well ("otherwise").
 */
export type EdgeFigure = { name: string; check: string; value: number; unit: string };

type Band = Reading["bands"][number];

const kindOf = (band: Band): string =>
  Object.values(band.when?.features ?? {})
    .flat()
    .join(" or ");

/** Every inner edge of every reading, named "check: lower | upper [kind of engine] part". */
export function edgeFigures(tree: FaultTree): EdgeFigure[] {
  return tree.checks.flatMap((check) => (check.reading ? figuresOf(check, check.reading) : []));
}

function figuresOf(check: Check, reading: Reading): EdgeFigure[] {
  return [...new Set(reading.bands.map(kindOf))].flatMap((kind) => {
    const bands = reading.bands.filter((band) => kindOf(band) === kind);
    return bands.slice(1).flatMap((upper, index) => {
      const name = `${check.key}: ${bands[index]?.finding} | ${upper.finding}${kind === "" ? "" : ` [${kind}]`}`;
      const figure = (part: string, value: number, unit = reading.unit) => ({ name: name + part, check: check.key, value, unit });
      if (typeof upper.from === "number") return [figure("", upper.from)];
      if ("of" in upper.from) return [figure(" times", upper.from.times, "times")];
      return [figure(" plus", upper.from.plus), figure(" otherwise", upper.from.otherwise)];
    });
  });
}

/** The finding of a value in the reading's unit, on an engine of whose own readings nothing is known; factors of an engine figure count as they stand. */
export function bandAt(reading: Reading, value: number, kind = ""): string | undefined {
  const low = (band: Band): number =>
    typeof band.from === "number" ? band.from : "of" in band.from ? band.from.times : band.from.otherwise;
  return reading.bands.filter((band) => (kindOf(band) === "" || kindOf(band) === kind) && value >= low(band)).at(-1)?.finding;
}
