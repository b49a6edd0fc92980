import { beforeAll, expect, test } from "vitest";
import type { FaultTree } from "@/lib/core/tree/schema";
import { unitsOf } from "@/lib/core/units/units";
import { barred } from "@/scripts/tree/bars";
import { shippedTree } from "../support/shipped-tree";
import { KNOWN_READINGS } from "./known-readings";

let tree: FaultTree;
beforeAll(async () => {
  tree = await shippedTree();
});

const readingOf = (key: string) => {
  const reading = tree.checks.find((check) => check.key === key)?.reading;
  if (reading === undefined) throw new Error(`"${key}" is no reading of the tree`);
  return reading;
};

test.each(KNOWN_READINGS)("$look: read with a unit and bands, or left out with the reason", ({ readings = [], leftOut }) => {
  expect(readings.length > 0).toBe(leftOut === undefined);
  if (leftOut !== undefined) expect(leftOut.length).toBeGreaterThan(10);
  for (const key of readings) {
    expect(readingOf(key).bands.length, key).toBeGreaterThanOrEqual(2);
    expect(unitsOf(readingOf(key).quantity).map(({ symbol }) => symbol).length, key).toBeGreaterThan(0);
  }
});

test("what people read in more than one unit may be typed in each of them", () => {
  const units = (check: string) => unitsOf(readingOf(check).quantity).map(({ symbol }) => symbol);
  expect(units("oil-pressure-gauge")).toEqual(expect.arrayContaining(["kPa", "bar", "psi", "kgf/cm2"]));
  expect(units("filter-vacuum")).toEqual(expect.arrayContaining(["inHg", "mmHg", "mbar"]));
  expect(units("full-load-temperature")).toEqual(expect.arrayContaining(["C", "F"]));
  expect(units("hx-rise")).toEqual(expect.arrayContaining(["K", "C-diff", "F-diff"]));
  expect(units("water-ppm")).toEqual(expect.arrayContaining(["ppm", "mg/kg", "%-weight"]));
  expect(units("crank-pressure")).toEqual(expect.arrayContaining(["mmH2O", "inH2O", "kPa"]));
  expect(units("compression")).toEqual(expect.arrayContaining(["bar", "MPa", "kgf/cm2", "psi"]));
  expect(units("belt-tension")).toEqual(expect.arrayContaining(["mm", "in"]));
});

test("the bar for readings is what this list names", () => {
  const named = new Set(KNOWN_READINGS.flatMap(({ readings = [] }) => readings));
  expect(barred("readings", named.size, tree)).toMatchObject({ bar: named.size, holds: true });
});
