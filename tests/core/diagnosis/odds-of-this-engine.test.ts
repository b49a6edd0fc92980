import { describe, expect, it } from "vitest";
import type { LogEntry } from "../../../lib/core/contract/log";
import { compile } from "../../../lib/core/diagnosis/compile";
import { multipliersFor } from "../../../lib/core/diagnosis/odds-of-this-engine";
import { setting } from "./random-trees";
import { cause, tree } from "./small-trees";

const entry = (key: string | null, engineHours: number | null, outcome: LogEntry["outcome"] = "cured"): LogEntry => ({
  id: "0197d1a4-0000-7000-8000-000000000001",
  engineId: "0197d1a4-0000-7000-8000-000000000002",
  engineName: "main engine",
  boatName: "Tern",
  diagnosisId: null,
  at: "2025-06-01T10:00:00Z",
  engineHours,
  hoursAreEstimated: false,
  symptoms: [],
  outcome,
  cause: { key, title: "as said", system: null },
  remedy: null,
  proof: null,
  temporary: false,
  minutes: null,
  parts: [],
  note: null,
  by: "someone",
  cameBackAfterHours: null,
  heldHours: null,
  timesHere: 1,
});

const causes = tree({ causes: Array.from({ length: 100 }, (_, index) => cause(`c-${index}`)) });

describe("the odds of this engine", () => {
  it("[B3] a cause that was here before moves up, shrunk towards what any engine would show", () => {
    const [once] = multipliersFor(causes, [entry("c-1", 400)]);
    expect(once?.times).toBeCloseTo(1.5 / 0.51, 10);
    expect(once?.reason).toBe("Found on this engine once before, last at 400 h.");
    const [amongMany] = multipliersFor(causes, [
      entry("c-1", 400),
      ...Array.from({ length: 30 }, () => entry(null, 1)),
      ...[2, 3, 4, 5, 6].map((index) => entry(`c-${index}`, 500)),
    ]);
    expect(amongMany?.times).toBeLessThan(once?.times ?? 0);
  });

  it("[B3] never by more than 5, and not at all for what was not found", () => {
    const many = multipliersFor(
      causes,
      [1, 2, 3, 4, 5, 6].map((hours) => entry("c-1", hours * 100)),
    );
    expect(many).toEqual([{ cause: "c-1", times: 5, reason: "Found on this engine 6 times before, last at 600 h." }]);
    expect(multipliersFor(causes, [entry("c-1", 1, "handed-over"), entry("c-1", 1, "broken-off"), entry(null, 2)])).toEqual([]);
  });

  it("[B3] moves the weight in the model by just that factor", () => {
    const weight = (multipliers: ReturnType<typeof multipliersFor>) => {
      const model = compile(causes, { ...setting, multipliers });
      return Math.exp((model.logPrior[1] ?? 0) - (model.logPrior[2] ?? 0));
    };
    expect(weight([])).toBeCloseTo(1, 10);
    expect(weight([{ cause: "c-1", times: 3, reason: "" }])).toBeCloseTo(3, 10);
  });
});
