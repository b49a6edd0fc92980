import { beforeAll, describe, expect, test } from "vitest";
import type { FaultTree } from "@/lib/core/tree/schema";
import { shippedTree } from "../support/shipped-tree";
import { bandAt, edgeFigures, type EdgeFigure } from "./band-edges";
import { BAND_FIGURES, LIES_IN, WITHOUT_FIGURE } from "./band-figures";
import { inUnit } from "./exact-units";

let tree: FaultTree;
let edges: Map<string, EdgeFigure>;

beforeAll(async () => {
  tree = await shippedTree();
  edges = new Map(edgeFigures(tree).map((edge) => [edge.name, edge]));
});

const checkOf = (key: string) => {
  const check = tree.checks.find((one) => one.key === key);
  if (check === undefined) throw new Error(`the tree has no check "${key}"`);
  return check;
};

describe("each edge of a reading's bands stands where its figure puts it", () => {
  test.each(BAND_FIGURES)("$edge: $figure $unit ($standing)", ({ edge, figure, unit, within = 1e-9 }) => {
    const found = edges.get(edge);
    if (found === undefined) throw new Error(`no edge "${edge}" in the tree; has its band been renamed?`);
    const [least, most] = (typeof figure === "number" ? [figure, figure] : figure).map((one) => inUnit(one, unit, found.unit));
    expect(found.value).toBeGreaterThanOrEqual((least ?? NaN) - within);
    expect(found.value).toBeLessThanOrEqual((most ?? NaN) + within);
  });
});

describe("a published or usual value falls in the band that says the same", () => {
  test.each(LIES_IN)("$check, $value $unit: $finding ($source)", ({ check, value, unit, finding, kind }) => {
    const { reading } = checkOf(check);
    if (reading === undefined) throw new Error(`${check} is not read off an instrument`);
    const inReading = unit === "times" ? value : inUnit(value, unit, reading.unit);
    expect(bandAt(reading, inReading, kind)).toBe(finding);
  });
});

test("the allowances along the positive leg add up to the whole that the tree allows", () => {
  // tm256-4 p. CGES-230-8: cable of 3 to 6 ft, mechanical switch, solenoid, connections.
  const whole = 0.2 + 0.1 + 0.2 + 0;
  expect(edges.get("drop-positive: small | over [v12]")?.value).toBeCloseTo(whole, 9);
});

test("no edge of any reading is left without a figure or a reason", () => {
  const known = [...BAND_FIGURES.map(({ edge }) => edge), ...Object.keys(WITHOUT_FIGURE)];
  expect(known.toSorted()).toEqual([...edges.keys()].toSorted());
  expect(new Set(known).size).toBe(known.length);
});

test("a check cites the source of its published edges, as one that was read", () => {
  for (const { edge, source } of BAND_FIGURES.filter(({ standing }) => standing === "published")) {
    const key = source.split(/[ ,]/)[0] ?? "";
    const cited = checkOf(edges.get(edge)?.check ?? "").sources.map((citation) => citation.split(" ")[0]);
    expect(cited, edge).toContain(key);
    expect(tree.sources.find((one) => one.key === key)?.standing, edge).toBe("read");
  }
});

test("a check with an edge from memory, practice or judgement does not pass it off as read", () => {
  const unread = new Set(tree.sources.filter(({ standing }) => standing !== "read").map(({ key }) => key));
  const loose = [
    ...BAND_FIGURES.filter(({ standing }) => standing !== "published").map(({ edge }) => edge),
    ...Object.keys(WITHOUT_FIGURE),
  ];
  const passedOff = loose
    .map((edge) => checkOf(edges.get(edge)?.check ?? ""))
    .filter((check) => !check.sources.some((citation) => unread.has(citation.split(" ")[0] ?? "")))
    .map(({ key }) => key);
  expect([...new Set(passedOff)]).toEqual([]);
});

test("counts by standing, for the record", () => {
  const of = (standing: string) => BAND_FIGURES.filter((figure) => figure.standing === standing).length;
  const counts = {
    published: of("published"),
    "from-memory": of("from-memory"),
    "common-practice": of("common-practice"),
    "without a figure": Object.keys(WITHOUT_FIGURE).length,
  };
  console.info("band edges", counts);
  expect(Object.values(counts).reduce((sum, count) => sum + count, 0)).toBe(edges.size);
});
