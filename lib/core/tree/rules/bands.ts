import { findUnit } from "../../units/units";
import type { Check, Edge, FaultTree, Reading } from "../schema";
import { checkNode, type Found, type Rule } from "./rule";

type Band = Reading["bands"][number];

/** The findings that a link's key stands for, or null for a span that this check's bands do not have. */
export function findingsOfSpan(check: Pick<Check, "reading">, spec: string): string[] | null {
  const [from = spec, to] = spec.split("..");
  if (to === undefined) return [from];
  const order = [...new Set(check.reading?.bands.map(({ finding }) => finding) ?? [])];
  const [first, last] = [order.indexOf(from), order.indexOf(to)];
  return first < 0 || last < 0 || first === last ? null : order.slice(Math.min(first, last), Math.max(first, last) + 1);
}

/** Each kind of engine that the bands tell apart, as one option of each feature they name. */
function kindsOf(reading: Reading, tree: FaultTree): Record<string, string>[] {
  const named = [...new Set(reading.bands.flatMap(({ when }) => Object.keys(when?.features ?? {})))];
  return named.reduce<Record<string, string>[]>(
    (kinds, feature) => {
      const options = tree.features.find(({ key }) => key === feature)?.options ?? [];
      return kinds.flatMap((kind) => options.map((option) => ({ ...kind, [feature]: option.key })));
    },
    [{}],
  );
}

const holdsFor = ({ when }: Band, kind: Record<string, string>): boolean =>
  Object.entries(when?.features ?? {}).every(([feature, options]) => options.includes(kind[feature] ?? ""));

const same = (a: Edge, b: Edge): boolean => JSON.stringify(a) === JSON.stringify(b);

/** An edge as a number where it is known without an engine. */
const known = (edge: Edge): number | null => (typeof edge === "number" ? edge : "otherwise" in edge ? edge.otherwise : null);

function shown(edge: Edge): string {
  if (typeof edge === "number") return String(edge);
  return "of" in edge ? `${edge.times} x ${edge.of}` : `healthy ${edge.healthy} ${edge.plus < 0 ? "-" : "+"} ${Math.abs(edge.plus)}`;
}

/** What is wrong with the bands that hold for one kind of engine, taken in the order they are written: lowest first. */
function bandFault(reading: Reading, bands: readonly Band[]): string | null {
  const [first] = bands;
  const last = bands.at(-1);
  if (first === undefined || last === undefined) return "there are no bands at all";
  if (!same(first.from, reading.from)) return `the scale begins at ${reading.from}, the bands at ${shown(first.from)}`;
  for (const [index, band] of bands.entries()) {
    const [from, to] = [known(band.from), known(band.to)];
    const sameFigure =
      typeof band.from === "object" && typeof band.to === "object" && "of" in band.from && "of" in band.to && band.from.of === band.to.of;
    if (
      (from !== null && to !== null && from >= to) ||
      (sameFigure && (band.from as { times: number }).times >= (band.to as { times: number }).times)
    ) {
      return `the band of ${band.finding} runs from ${shown(band.from)} to ${shown(band.to)}`;
    }
    const next = bands[index + 1];
    if (next === undefined || same(band.to, next.from)) continue;
    const [end, start] = [known(band.to), known(next.from)];
    const what = end !== null && start !== null && start < end ? "overlap" : "leave a gap";
    return `the bands of ${band.finding} and ${next.finding} ${what}: one ends at ${shown(band.to)}, the next begins at ${shown(next.from)}`;
  }
  return same(last.to, reading.to) ? null : `the scale ends at ${reading.to}, the bands at ${shown(last.to)}`;
}

function bandsThatDoNotCover(tree: FaultTree): Found[] {
  return tree.checks.flatMap((check) => {
    const { reading } = check;
    if (reading === undefined) return [];
    const faults = kindsOf(reading, tree).flatMap((kind) => {
      const fault = bandFault(
        reading,
        reading.bands.filter((band) => holdsFor(band, kind)),
      );
      const whose = Object.entries(kind)
        .map(([feature, option]) => `${feature} ${option}`)
        .join(", ");
      return fault === null ? [] : [whose === "" ? fault : `for ${whose}: ${fault}`];
    });
    return faults.slice(0, 1).map((fault) => ({
      node: checkNode(check),
      says: `${fault}.`,
      mend: "Write the bands lowest first, each beginning where the one before ends, from the scale's end to its other end.",
    }));
  });
}

function unitsUnknown(tree: FaultTree): Found[] {
  return tree.checks.flatMap((check) => {
    const { reading } = check;
    if (reading === undefined) return [];
    const unit = findUnit(reading.unit);
    if (unit === null)
      return [
        { node: checkNode(check), says: `nobody knows the unit "${reading.unit}".`, mend: "Use a symbol of lib/core/units/units.ts." },
      ];
    if (unit.quantity !== reading.quantity)
      return [
        {
          node: checkNode(check),
          says: `"${reading.unit}" is a unit of ${unit.quantity}, and the reading is a ${reading.quantity}.`,
          mend: "Change the unit or the quantity.",
        },
      ];
    return [];
  });
}

export const bandRules: readonly Rule[] = [
  { name: "bands-do-not-cover", severity: "error", find: bandsThatDoNotCover },
  { name: "unit-unknown", severity: "error", find: unitsUnknown },
];
