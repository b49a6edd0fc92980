import { readFile } from "node:fs/promises";
import path from "node:path";
import { beforeAll, expect, test } from "vitest";
import { parse } from "yaml";
import * as z from "zod";
import { symptomFinder, type SymptomHit } from "@/lib/client/find-symptoms";
import { flatText } from "@/lib/client/plain-words";
import type { FaultTree } from "@/lib/core/tree/schema";
import { shippedTree } from "../support/shipped-tree";

const Complaints = z.array(z.object({ says: z.string().min(1), symptom: z.string().min(1) }));
type Asked = { says: string; symptom: string; half: "odd" | "even"; hits: readonly SymptomHit[] };

/** A phone's key repeats no faster than this by far: the list must be there before the next letter. */
const MOST_MS = 15;
const LEAST_IN_THREE = 0.95;

let tree: FaultTree;
let find: (text: string) => SymptomHit[];
let complaints: z.infer<typeof Complaints>;
let asked: Asked[];
beforeAll(async () => {
  tree = await shippedTree();
  find = symptomFinder(tree.symptoms);
  complaints = Complaints.parse(parse(await readFile(path.resolve(import.meta.dirname, "complaints.yaml"), "utf8")));
  const phrases = new Set(tree.symptoms.flatMap((symptom) => [symptom.title, ...symptom.phrases]).map(flatText));
  asked = complaints
    .map((one, at) => ({ ...one, half: at % 2 === 0 ? ("odd" as const) : ("even" as const) }))
    .filter(({ says }) => !phrases.has(flatText(says)))
    .map((one) => ({ ...one, hits: find(one.says) }));
});

const shareOf = (list: readonly Asked[], holds: (one: Asked) => boolean): number => list.filter(holds).length / list.length;
const inPlaces = (places: number) => (one: Asked) => one.hits.slice(0, places).some(({ key }) => key === one.symptom);
const tickedRight = (one: Asked) => one.hits.some(({ fits, key }) => fits && key === one.symptom);
const tickedOther = (one: Asked) => one.hits.some(({ fits, key }) => fits && key !== one.symptom);
const percent = (share: number): string => `${(100 * share).toFixed(1)} %`;

test("every complaint names a symptom of the tree, and every symptom is complained of", () => {
  const known = tree.symptoms.map(({ key }) => key).sort();
  expect([...new Set(complaints.map(({ symptom }) => symptom))].sort()).toEqual(known);
});

test("finds the right symptom among the first three for 95 in 100 complaints nobody wrote the phrases for", () => {
  for (const half of ["odd", "even"] as const) {
    const list = asked.filter((one) => one.half === half);
    console.info(
      `complaints at ${half} places: ${list.length}; first ${percent(shareOf(list, inPlaces(1)))}, in three ${percent(shareOf(list, inPlaces(3)))}; ` +
        `right one ticked ${percent(shareOf(list, tickedRight))}, another ticked ${percent(shareOf(list, tickedOther))}`,
    );
  }
  console.info(`left out as exact phrases: ${complaints.length - asked.length}; in three over all ${percent(shareOf(asked, inPlaces(3)))}`);
  expect(asked.length).toBeGreaterThan(250);
  expect(shareOf(asked, inPlaces(3))).toBeGreaterThanOrEqual(LEAST_IN_THREE);
});

test("a symptom is ticked unasked far more often rightly than wrongly", () => {
  expect(shareOf(asked, tickedRight)).toBeGreaterThan(0.6);
  expect(shareOf(asked, tickedOther)).toBeLessThan(0.1);
});

test("no complaint is left with a blank list", () => {
  for (const { says, hits } of asked) expect(hits.length, says).toBeGreaterThan(0);
});

test("answers within 15 ms of processor time a key, whole complaints typed letter by letter", () => {
  const fresh = symptomFinder(tree.symptoms);
  const typed = asked.filter((_, at) => at % 8 === 0).flatMap(({ says }) => [...says].map((_letter, at) => says.slice(0, at + 1)));
  const waits = typed.map((text) => {
    // Of this thread's work, not of whatever else the machine is doing.
    const before = process.cpuUsage();
    fresh(text);
    const { user, system } = process.cpuUsage(before);
    return (user + system) / 1000;
  });
  waits.sort((a, b) => a - b);
  const at = (share: number): number => waits[Math.min(waits.length - 1, Math.floor(share * waits.length))] ?? 0;
  console.info(
    `${waits.length} keys, ${tree.symptoms.length} symptoms: middle ${at(0.5).toFixed(2)} ms, 95th of 100 ${at(0.95).toFixed(2)} ms, worst ${at(1).toFixed(2)} ms`,
  );
  expect(at(0.95)).toBeLessThanOrEqual(MOST_MS);
});
