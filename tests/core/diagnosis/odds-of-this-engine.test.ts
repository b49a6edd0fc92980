import { describe, expect, it } from "vitest";
import type { LogEntry } from "../../../lib/core/contract/log";
import { compile } from "../../../lib/core/diagnosis/compile";
import { multipliersFor } from "../../../lib/core/diagnosis/odds-of-this-engine";
import { setting } from "./random-trees";
import { cause, remedy, tree } from "./small-trees";

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

  it("[B3] moves a cause both ways by what the fleet's other engines had, and reckons this engine's own cases beside that", () => {
    const fleet = [
      ...Array.from({ length: 4 }, () => entry("c-1", 100)),
      ...Array.from({ length: 196 }, (_, index) => entry(`c-${2 + (index % 90)}`, 100)),
    ];
    const of = (moved: ReturnType<typeof multipliersFor>, key: string) => moved.find(({ cause: one }) => one === key);
    const moved = multipliersFor(causes, [], { fleet });
    expect(of(moved, "c-1")?.times).toBeCloseTo((2 + 4) / (2 + 2), 10);
    expect(of(moved, "c-1")?.reason).toBe(
      "Found 4 times among 200 faults of the fleet\u2019s other engines, where about 2 would be usual.",
    );
    expect(of(moved, "c-99")?.times).toBeCloseTo(2 / 4, 10);
    const own = of(multipliersFor(causes, [entry("c-1", 40)], { fleet }), "c-1");
    expect(own?.times).toBeCloseTo(1.5 * (1.5 / (0.5 + 0.01 * 1.5)), 10);
    expect(own?.reason).toMatch(/^Found 4 times .* Found on this engine once before, last at 40 h\.$/);
  });

  describe("[B6] the service that guards a cause", () => {
    const kept = tree({
      remedies: [
        remedy("element", {
          title: "Change the element",
          upkeep: { everyHours: 200, everyMonths: 12, guards: ["choked"], sources: ["judgement"] },
        }),
      ],
      causes: [cause("choked", { curedBy: { element: "always" } }), cause("other")],
    });
    const serviced = (engineHours: number | null, at: string): LogEntry => ({
      ...entry(null, engineHours),
      at,
      remedy: { key: "element", title: "" },
    });
    const now = { at: "2025-06-01T10:00:00Z", hours: 1000 };
    const times = (...log: LogEntry[]) => multipliersFor(kept, log, { now }).find(({ cause: key }) => key === "choked");

    it("makes it likelier the longer ago it was, by hours or months, whichever is further on", () => {
      expect(times(serviced(950, "2025-05-20T10:00:00Z"))?.times).toBeCloseTo(0.5, 10);
      expect(times(serviced(700, "2025-05-01T10:00:00Z"))?.times).toBeCloseTo(3, 10);
      expect(times(serviced(700, "2025-05-01T10:00:00Z"))?.reason).toBe(
        "\u201cChange the element\u201d was last done 300 h ago, and is due every 200 h or 12 months.",
      );
      expect(times(serviced(990, "2023-12-01T10:00:00Z"))?.times).toBeCloseTo(3, 1);
      expect(times(serviced(990, "2023-12-01T10:00:00Z"))?.reason).toContain("18 months ago");
      expect(times(serviced(null, "2023-12-01T10:00:00Z"))?.times).toBeCloseTo(3, 1);
    });

    it("counts the latest, stays within x 5 either way, and says nothing where no service is known", () => {
      expect(times(serviced(100, "2020-05-01T10:00:00Z"), serviced(950, "2025-05-20T10:00:00Z"))?.times).toBeCloseTo(0.5, 10);
      expect(times(serviced(1000, "2025-06-01T10:00:00Z"))?.times).toBe(0.2);
      expect(times(serviced(1, "2015-06-01T10:00:00Z"))?.times).toBe(5);
      expect(times()).toBeUndefined();
      expect(multipliersFor(kept, [serviced(1, "2015-06-01T10:00:00Z")])).toEqual([]);
    });
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
