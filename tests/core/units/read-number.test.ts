import { expect, it } from "vitest";
import { readNumber } from "../../../lib/core/units/read-number";

it("[U3] reads numbers with a comma or a point", () => {
  const cases: [string, number | null][] = [
    ["12.4", 12.4],
    ["12,4", 12.4],
    [" 2 800 ", 2800],
    ["1,234", 1.234],
    ["1,234.5", 1234.5],
    ["1.234,5", 1234.5],
    ["-3", -3],
    ["\u22123,5", -3.5],
    [".5", 0.5],
    ["7.", 7],
    ["", null],
    ["12 V", null],
    ["1.2.3", null],
    ["about 5", null],
    ["1e5", null],
  ];
  for (const [typed, value] of cases) expect(readNumber(typed), typed).toBe(value);
});
