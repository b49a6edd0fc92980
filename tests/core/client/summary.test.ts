import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { summarize } from "@/lib/client/store/summary";
import { BEGUN, idOf, makeEvent } from "./make-event";

const bowl = { check: "bowl-look", answer: { finding: "bright" }, photos: [] };

describe("one line about a diagnosis", () => {
  const log = [
    makeEvent("begun", BEGUN, { n: 1 }),
    makeEvent("answered", bowl, { n: 2 }),
    makeEvent("answered", bowl, { n: 3, supersedes: 2 }),
    makeEvent("answered", { ...bowl, check: "filter-vacuum" }, { n: 4 }),
    makeEvent("taken-back", { event: idOf(4) }, { n: 5 }),
    makeEvent("remedy-tried", { remedy: "renew-primary-element", result: "no-change", photos: [] }, { n: 6 }),
  ];

  it("counts the answers that stand: not the replaced, not the taken back", () => {
    expect(summarize(log)).toMatchObject({ answers: 2, ended: false, symptoms: ["lost-top-end-rpm"], complaint: "wont rev" });
  });

  it("is the same in whatever order the events are read", () => {
    fc.assert(
      fc.property(fc.shuffledSubarray(log, { minLength: log.length }), (shuffled) => {
        expect(summarize(shuffled)).toEqual(summarize(log));
      }),
    );
  });

  it("is over after its outcome, and open again when taken up again", () => {
    const ended = makeEvent("ended", { outcome: "held", parts: [] }, { n: 7 });
    expect(summarize([...log, ended])?.ended).toBe(true);
    expect(summarize([...log, ended, makeEvent("taken-up-again", {}, { n: 8 })])?.ended).toBe(false);
  });

  it("is nothing while its beginning is not here", () => {
    expect(summarize(log.slice(1))).toBeNull();
  });
});
