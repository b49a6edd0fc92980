import { describe, expect, it } from "vitest";
import { repairChange, RepairValues, valuesOf } from "../../../components/log/repair-values";
import type { Repair } from "../../../lib/core/contract/log";

const repair: Repair = {
  entry: {
    id: "01900000-0000-7000-8000-000000000001",
    engineId: "01900000-0000-7000-8000-000000000002",
    engineName: "main engine",
    boatName: "Petrel",
    diagnosisId: null,
    at: "2026-03-01T17:20:00.000Z",
    engineHours: 912,
    hoursAreEstimated: false,
    symptoms: [
      { key: "lost-rpm", title: "Will not reach full revs" },
      { key: "smoke", title: "Black smoke" },
    ],
    outcome: "cured",
    cause: { key: "filter-blocked", title: "Primary filter blocked", system: "fuel" },
    remedy: { key: null, title: "Cleaned it" },
    proof: "Full revs",
    temporary: false,
    minutes: 40,
    parts: [{ title: "Element", quantity: 2 }],
    note: "By torch",
    by: "Ines",
    cameBackAfterHours: null,
    heldHours: null,
    timesHere: 1,
    version: 1,
  },
  meterShowed: 12,
  meterReset: true,
  version: 1,
  takenBackAt: null,
  corrections: [],
};

describe("a repair in the form that corrects it", () => {
  it("goes back as it stood where nothing was changed, its hour and every symptom too", () => {
    expect(repairChange(repair, RepairValues.parse(valuesOf(repair)))).toEqual({
      doneAt: "2026-03-01T17:20:00.000Z",
      outcome: "cured",
      symptoms: ["lost-rpm", "smoke"],
      cause: "filter-blocked",
      remedyInWords: "Cleaned it",
      proof: "Full revs",
      engineHours: 12,
      meterReset: true,
      minutes: 40,
      parts: [{ title: "Element", quantity: 2 }],
      note: "By torch",
    });
  });

  it("takes what was changed, and leaves out what was emptied", () => {
    const given = RepairValues.parse({ ...valuesOf(repair), day: "2026-02-27", hours: "", minutes: "", outcome: "held", note: "" });
    const change = repairChange(repair, given);
    expect(new Date(change.doneAt).toDateString()).toBe(new Date(2026, 1, 27).toDateString());
    expect(change).toMatchObject({ outcome: "held" });
    expect(change).not.toHaveProperty("engineHours");
    expect(change).not.toHaveProperty("meterReset");
    expect(change).not.toHaveProperty("note");
  });
});
