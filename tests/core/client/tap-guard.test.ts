import { describe, expect, it } from "vitest";
import { burstSeconds } from "@/lib/client/crank-clock";
import { emptyDraft, takenUp } from "@/lib/client/store/draft";
import { GUARD_MS, TapGuard } from "@/lib/client/tap-guard";
import { idOf } from "./make-event";

describe("a finger that bounces", () => {
  it("taps one button once, and may tap it again later", () => {
    const taps = new TapGuard();
    expect([0, 150, 399, 400].map((now) => taps.allows("cured", now))).toEqual([true, false, false, true]);
  });

  it("is not taken for a bounce on another button that was there all along", () => {
    const taps = new TapGuard();
    expect(taps.allows("cured", 0)).toBe(true);
    expect(taps.allows("done, and it held", 120)).toBe(true);
  });

  it("cannot answer the next question, which came where the last one stood", () => {
    const taps = new TapGuard();
    taps.allows("bowl: bright", 1000);
    expect(taps.settlesIn(1030)).toBe(GUARD_MS - 30);
    expect(taps.settlesIn(1000 + GUARD_MS)).toBe(0);
    expect(new TapGuard().settlesIn(5)).toBe(0);
  });
});

describe("a burst of cranking", () => {
  it("is whole seconds, none lost to rounding", () => {
    expect(burstSeconds(1_000, 8_200)).toBe(8);
    expect(burstSeconds(1_000, 1_000)).toBe(0);
  });

  it("counts for something though the clock was set back meanwhile", () => expect(burstSeconds(9_000_000, 1_000)).toBe(10));

  it("that was forgotten counts a minute, not the night", () => expect(burstSeconds(0, 36_000_000)).toBe(60));
});

describe("a draft that is taken up again", () => {
  const kept = {
    ...emptyDraft(idOf(1), false),
    complaint: "wont rev",
    situation: "under-way" as const,
    mechanic: true,
    boatIsSafe: true,
    keptAt: "2026-06-01T08:00:00Z",
  };

  it("asks again whether the boat is safe, each time", () =>
    expect(takenUp(kept, Date.parse("2026-06-01T08:01:00Z"), false)).toEqual({ ...kept, boatIsSafe: false }));

  it.each(["2026-06-02T08:00:00Z", "2026-06-01T07:00:00Z"])(
    "at another time (%s) asks anew where the boat is and who is at the engine",
    (now) => expect(takenUp(kept, Date.parse(now), false)).toMatchObject({ complaint: "wont rev", situation: null, mechanic: false }),
  );

  it("of a time nobody noted counts as old", () => {
    const { keptAt, ...undated } = kept;
    expect(keptAt).toBeDefined();
    expect(takenUp(undated, 0, false).situation).toBeNull();
  });
});
