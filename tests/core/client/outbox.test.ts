import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { backoffSeconds } from "@/lib/client/exchange/backoff";
import { batches } from "@/lib/client/exchange/batches";
import { NOTHING_YET, standingInShort, standingInWords } from "@/lib/client/exchange/standing";
import { stamp } from "@/lib/client/store/stamp";
import { BEGUN, idOf, makeEvent } from "./make-event";

const answered = (n: number, at: { diagnosis?: number; device?: number; sequence?: number } = {}) =>
  makeEvent("answered", { check: "bowl-look", answer: { finding: "bright" }, photos: [] }, { n, ...at });

describe("the outbox", () => {
  it("sends the beginning first, then each device's entries by number, whatever order they were read in", () => {
    const log = [
      makeEvent("begun", BEGUN, { n: 1, sequence: 1 }),
      answered(4, { sequence: 2 }),
      answered(2, { sequence: 3 }),
      answered(3, { sequence: 4 }),
    ];
    fc.assert(
      fc.property(fc.shuffledSubarray(log, { minLength: log.length }), (shuffled) => {
        expect(batches(shuffled)).toEqual([{ diagnosisId: idOf(9001), events: log }]);
      }),
    );
  });

  it("goes by number, not by the clock: one that was set back changes nothing", () => {
    const late = makeEvent("noted", { note: "later", photos: [] }, { n: 3, sequence: 3, minute: 1 });
    const early = makeEvent("noted", { note: "earlier", photos: [] }, { n: 2, sequence: 2, minute: 50 });
    expect(batches([late, early])[0]?.events).toEqual([early, late]);
  });

  it("puts each diagnosis in requests of its own, none larger than a batch, and loses none", () => {
    fc.assert(
      fc.property(
        fc.array(fc.record({ diagnosis: fc.integer({ min: 1, max: 4 }), device: fc.integer({ min: 1, max: 3 }) }), { maxLength: 60 }),
        fc.integer({ min: 1, max: 7 }),
        (made, size) => {
          const waiting = made.map((at, index) => answered(index + 1, { ...at, sequence: index + 1 }));
          const sent = batches(waiting, size);
          for (const { diagnosisId, events } of sent) {
            expect(events.length).toBeLessThanOrEqual(size);
            expect(events.every((event) => event.diagnosisId === diagnosisId)).toBe(true);
          }
          expect(new Set(sent.flatMap(({ events }) => events.map(({ id }) => id)))).toEqual(new Set(waiting.map(({ id }) => id)));
        },
      ),
    );
  });

  it("numbers the next entry after this device's last, and says how far it knew the others", () => {
    const log = [
      answered(1, { device: 1, sequence: 1 }),
      answered(2, { device: 2, sequence: 7 }),
      answered(3, { device: 1, sequence: 2 }),
      answered(4, { device: 2, sequence: 5 }),
    ];
    expect(stamp(log, idOf(8001))).toEqual({ sequence: 3, seen: { [idOf(8002)]: 7 } });
    expect(stamp([], idOf(8001))).toEqual({ sequence: 1, seen: {} });
  });

  it("waits longer after each failure, but never more than five minutes", () => {
    const waits = [1, 2, 3, 4, 20].map((failures) => backoffSeconds(failures, 1));
    expect(waits).toEqual([2, 4, 8, 16, 300]);
    expect(backoffSeconds(1, 0)).toBe(1);
  });
});

describe("what is said of it", () => {
  const base = { ...NOTHING_YET, ashoreAt: new Date(2026, 0, 5, 14, 2).toISOString() };

  it("says that all is ashore, and when, only when nothing waits", () => {
    expect(standingInWords(base, false)).toBe("Everything is kept ashore, last at 14:02.");
    expect(standingInShort({ ...base, waiting: 2 }, false)).toBe("Kept here: 2 to send");
    expect(standingInShort({ ...base, waiting: 3, sending: true }, false)).toBe("Sending 3");
  });

  it("never says kept when the last write failed", () => {
    expect(standingInShort(base, true)).toBe("Not saved on this phone");
    expect(standingInWords({ ...base, trouble: "no-signal" }, true)).toContain("not saved");
  });

  it("says of each trouble that the entries are kept, and how many wait", () => {
    for (const trouble of ["no-signal", "sign-in", "not-in-fleet", "server"] as const)
      expect(standingInWords({ ...base, trouble }, false)).toContain("kept on this phone");
    expect(standingInWords({ ...base, trouble: "no-signal", waiting: 1 }, false)).toContain("1 entry waits");
  });
});
