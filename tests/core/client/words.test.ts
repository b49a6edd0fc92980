import { describe, expect, it } from "vitest";
import { beenHere } from "@/lib/client/been-here";
import { agoInWords, durationInWords } from "@/lib/client/duration";
import { readAddress, writeAddress } from "@/lib/client/screen/use-address";
import type { LogEntry } from "@/lib/core/contract/log";
import type { FaultTree } from "@/lib/core/tree/schema";
import { idOf } from "./make-event";

describe("how long", () => {
  it("is said as one would", () => {
    expect([0.4, 11, 59.6, 130, 60 * 26, 60 * 24 * 3].map(durationInWords)).toEqual([
      "0 min",
      "11 min",
      "1 h",
      "2 h 10 min",
      "1 day",
      "3 days",
    ]);
  });

  it("takes a clock that was set back for now", () => {
    expect(agoInWords("2026-06-01T08:00:00Z", Date.parse("2026-06-01T07:00:00Z"))).toBe("just now");
    expect(agoInWords("2026-06-01T08:00:00Z", Date.parse("2026-06-01T08:12:00Z"))).toBe("12 min ago");
  });
});

describe("the address", () => {
  it("comes back from a link as it went in", () => {
    const address = { at: "change" as const, fleet: idOf(1), engine: null, d: idOf(2), which: idOf(3) };
    expect(readAddress(writeAddress(address).replace("/diagnose", ""))).toEqual(address);
  });

  it("leads to the step of a diagnosis, to the words for an engine, or to the engines", () => {
    expect(readAddress(`?d=${idOf(1)}`).at).toBe("step");
    expect(readAddress(`?engine=${idOf(1)}`).at).toBe("say");
    expect(readAddress("?at=nonsense").at).toBe("engines");
  });
});

describe("a cause that has been here before", () => {
  const entry = (n: number, engine: number, outcome: LogEntry["outcome"], at: string): LogEntry =>
    ({
      id: idOf(n),
      engineId: idOf(engine),
      diagnosisId: idOf(n + 100),
      at,
      engineHours: n * 10,
      outcome,
      cause: { key: "filter", title: "Filter", system: null },
    }) as LogEntry;
  const tree = {
    causes: [
      { key: "filter", broughtOnBy: { growth: "often", dirt: 0.9 }, roots: ["Tank never drained"] },
      { key: "growth", title: "Growth in the tank" },
      { key: "dirt", title: "Dirty fuel taken on" },
    ],
  } as unknown as FaultTree;
  const log = [
    entry(3, 1, "cured", "2026-03-01T00:00:00Z"),
    entry(1, 1, "held", "2026-01-01T00:00:00Z"),
    entry(2, 1, "broken-off", "2026-02-01T00:00:00Z"),
    entry(4, 2, "cured", "2026-01-15T00:00:00Z"),
    entry(5, 1, "cured", "2026-04-01T00:00:00Z"),
  ];

  it("counts its appearances on this engine alone, and not this diagnosis itself", () => {
    expect(beenHere(log, tree, idOf(1), "filter", idOf(105))).toMatchObject({ times: 2, last: { engineHours: 30 } });
    expect(beenHere(log, tree, idOf(3), "filter", idOf(105))).toMatchObject({ times: 0, last: null });
  });

  it("says what the engine's log says: what only got one home is the same appearance as the cure that followed", () => {
    const held = log.map((one) => (one.outcome === "held" ? { ...one, temporary: true } : one));
    expect(beenHere(held, tree, idOf(1), "filter", idOf(105)).times).toBe(1);
  });

  it("names what lies upstream, the likelier first, then the roots in words", () => {
    expect(beenHere(log, tree, idOf(1), "filter", idOf(105)).upstream.map(({ title }) => title)).toEqual([
      "Dirty fuel taken on",
      "Growth in the tank",
      "Tank never drained",
    ]);
  });
});
