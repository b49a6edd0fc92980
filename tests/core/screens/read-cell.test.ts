import { expect, it } from "vitest";
import { readCell } from "@/components/workshop/table/read-cell";

it.each([
  ["usually", "usually"],
  ["Us", "usually"],
  ["nev", "never"],
  ["0,4", 0.4],
  ["x20", "x20"],
  ["×1/3", "x1/3"],
  ["  ", null],
  ["s", undefined],
  ["1.5", undefined],
  ["maybe", undefined],
])("what is typed into a cell of the strength table is read as meant: %s", (typed, link) => {
  expect(readCell(typed)).toBe(link);
});
