import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { DiagnosisEvent } from "../../../lib/core/contract/event";
import { fold, type DiagnosisState } from "../../../lib/core/diagnosis/fold";
import { Device, deviceId } from "./logs";

/** What of a state must be alike, whatever way the log came. */
const gist = (state: DiagnosisState) => ({
  order: state.order.events.map(({ id }) => id),
  live: state.order.events.filter((event) => state.live.has(event)).map(({ id }) => id),
  symptoms: state.symptoms,
  situation: state.situation,
  answers: [...state.answers].map(([step, event]) => [step, event.id]),
  remedies: [...state.remedies].map(([step, event]) => [step, event.id]),
  partCure: state.partCure && [state.partCure.event.id, state.order.events.filter(state.partCure.isLeft).map(({ id }) => id)],
  conflicts: state.conflicts.map((events) => events.map(({ id }) => id)),
  ended: state.ended?.id,
  runsAgain: state.runsAgain,
});

const answered = (state: DiagnosisState, check: string): string | undefined => {
  const answer = state.answers.get(check)?.payload.answer;
  return answer && "finding" in answer ? answer.finding : undefined;
};

/** A log of two or three devices that see each other now and then. */
const anyLog: fc.Arbitrary<DiagnosisEvent[]> = fc
  .array(fc.tuple(fc.nat(2), fc.nat(9), fc.nat(3), fc.boolean(), fc.nat(99)), { minLength: 1, maxLength: 25 })
  .map((moves) => {
    const devices = [new Device(1), new Device(2), new Device(3)];
    const log: DiagnosisEvent[] = [devices[0]!.begin({ symptoms: ["weak"] })];
    for (const [which, what, step, sees, past] of moves) {
      const device = devices[which]!;
      const seen = sees
        ? Object.fromEntries(devices.filter((one) => one !== device && one.count > 0).map((one) => [one.id, one.count]))
        : {};
      const target = log[past % log.length]!.id;
      if (what < 4) log.push(device.answer(`check-${step}`, `finding-${past % 2}`, { seen }));
      else if (what === 4) log.push(device.answer(`check-${step}`, `finding-${past % 2}`, { seen, supersedes: target }));
      else if (what === 5) log.push(device.tell("taken-back", { event: target }, { seen }));
      else if (what === 6) log.push(device.tell("picked", { event: target }, { seen }));
      else if (what === 7) log.push(device.tried(`remedy-${step}`, past % 2 ? "no-change" : "better", { seen }));
      else if (what === 8) log.push(device.tell("symptom-told", { symptom: "smoke", present: past % 2 === 0 }, { seen }));
      else log.push(device.tell(past % 2 ? "taken-up-again" : "runs-again", {}, { seen }));
    }
    return log;
  });

describe("the fold of a log", () => {
  it("[F1] is the same in any order of arrival and with any repeats", () => {
    fc.assert(
      fc.property(anyLog, fc.infiniteStream(fc.nat()), (log, dice) => {
        const twice = [...log, ...log.filter(() => dice.next().value % 2)];
        const shuffled = twice.map((event) => ({ event, at: dice.next().value })).sort((a, b) => a.at - b.at);
        const copied = shuffled.map(({ event }) => structuredClone(event));
        expect(gist(fold(copied))).toEqual(gist(fold(log)));
      }),
      { seed: 11, numRuns: 300 },
    );
  });

  it("[F2] never puts an event before one that its device knew of", () => {
    fc.assert(
      fc.property(anyLog, (log) => {
        const { events, before } = fold(log).order;
        events.forEach((event, place) => expect(events.slice(0, place).some((earlier) => before(event, earlier))).toBe(false));
      }),
      { seed: 12, numRuns: 200 },
    );
  });

  it("[F3] a superseded answer is gone, and a taken-back one too", () => {
    const phone = new Device(1);
    const first = phone.answer("bowl", "bright");
    const second = phone.answer("bowl", "slime", { supersedes: first.id });
    expect(answered(fold([phone.begin(), first, second]), "bowl")).toBe("slime");
    const back = phone.tell("taken-back", { event: second.id });
    expect(answered(fold([first, second, back]), "bowl")).toBeUndefined();
    const backAgain = phone.tell("taken-back", { event: back.id });
    expect(answered(fold([first, second, back, backAgain]), "bowl")).toBe("slime");
  });

  describe("two devices answer one step without having seen each other", () => {
    const [one, two] = [new Device(1), new Device(2)];
    const mine = one.answer("bowl", "bright");
    const theirs = two.answer("bowl", "slime");

    it("[F4] belief uses neither", () => {
      const state = fold([mine, theirs]);
      expect(answered(state, "bowl")).toBeUndefined();
      expect(state.conflicts).toHaveLength(1);
    });

    it("[F4] until one is picked", () => {
      const pick = new Device(3).tell("picked", { event: theirs.id }, { seen: { [one.id]: 1, [two.id]: 1 } });
      expect(answered(fold([pick, mine, theirs]), "bowl")).toBe("slime");
    });

    it("[F4] or someone who saw both answers anew", () => {
      const later = new Device(3).answer("bowl", "grit", { seen: { [one.id]: 1, [two.id]: 1 } });
      expect(answered(fold([later, mine, theirs]), "bowl")).toBe("grit");
    });

    it("[F4] a pick settles only what it had seen", () => {
      const pick = one.tell("picked", { event: mine.id });
      expect(fold([mine, theirs, pick]).conflicts).toHaveLength(1);
    });

    it("[F4] the same answer twice is no conflict", () => {
      const same = new Device(4).answer("bowl", "bright");
      expect(answered(fold([mine, same]), "bowl")).toBe("bright");
    });
  });

  it("[F4] the newer answer stands where its device had seen the older", () => {
    const [one, two] = [new Device(1), new Device(2)];
    const older = one.answer("bowl", "bright");
    const newer = two.answer("bowl", "slime", { seen: { [one.id]: 1 } });
    expect(answered(fold([newer, older]), "bowl")).toBe("slime");
  });

  it("[F7] an end stands until someone who knew of it takes the diagnosis up again", () => {
    const [one, two] = [new Device(1), new Device(2)];
    const end = one.tell("ended", { outcome: "cured", parts: [] });
    const unaware = two.tell("taken-up-again", {});
    expect(fold([end, unaware]).ended?.id).toBe(end.id);
    const aware = two.tell("taken-up-again", {}, { seen: { [one.id]: 1 } });
    expect(fold([end, unaware, aware]).ended).toBeNull();
  });

  it("[F8] a remedy that made it better parts what was told before from what is told of what is left", () => {
    const phone = new Device(1);
    const before = phone.answer("bowl", "slime");
    const better = phone.tried("element", "better");
    const after = phone.answer("smoke", "black");
    const log = [phone.begin({ symptoms: ["weak", "smoky"] }), before, better, after];
    const { partCure } = fold(log);
    expect(partCure?.event.id).toBe(better.id);
    expect([before, after].map((event) => partCure?.isLeft(event))).toEqual([false, true]);
    const gone = phone.tell("symptom-told", { symptom: "weak", present: false });
    expect(fold([...log, gone]).symptoms).toEqual([
      { symptom: "weak", present: false, left: { before: true } },
      { symptom: "smoky", present: true },
    ]);
  });

  it("[F8] a cure counts as one of two as soon as a symptom is told after it; a corrected answer keeps its place", () => {
    const phone = new Device(1);
    const begun = phone.begin({ symptoms: ["weak", "smoky"] });
    const cured = phone.tried("element", "cured");
    expect(fold([begun, cured]).partCure).toBeNull();
    const still = phone.tell("symptom-told", { symptom: "smoky", present: true });
    expect(fold([begun, cured, still]).partCure?.event.id).toBe(cured.id);
    expect(fold([begun, cured, still]).symptoms[1]).toEqual({ symptom: "smoky", present: true, left: { before: true } });
    const tried = phone.tried("vent", "no-change");
    const later = phone.answer("smoke", "black");
    const corrected = phone.tried("vent", "better", { supersedes: tried.id });
    const { partCure } = fold([begun, tried, later, corrected]);
    expect(partCure?.event.id).toBe(corrected.id);
    expect(partCure?.isLeft(later)).toBe(true);
    expect(fold([begun, corrected, phone.tell("taken-back", { event: corrected.id })]).partCure).toBeNull();
  });

  it("[F8] the first of two such remedies counts; a device that did not know of it speaks of both faults", () => {
    const [one, two] = [new Device(1), new Device(2)];
    const first = one.tried("element", "better");
    const second = one.tried("vent", "better");
    const unaware = two.answer("bowl", "slime");
    const aware = two.answer("smoke", "black", { seen: { [one.id]: 1 } });
    const { partCure } = fold([second, aware, first, unaware]);
    expect(partCure?.event.id).toBe(first.id);
    expect([second, unaware, aware].map((event) => partCure?.isLeft(event))).toEqual([true, false, true]);
  });

  it("[F6] what is told of the engine stands over what the diagnosis began with", () => {
    const phone = new Device(1);
    const state = fold([
      phone.begin({ profile: { features: { turbo: "none", voltage: "v12" }, figures: {}, healthy: {} } }),
      phone.tell("feature-told", { feature: "turbo", option: "turbo" }),
      phone.tell("figure-told", { figure: "ratedRpm", value: 3000 }),
    ]);
    expect(state.profile.features).toEqual({ turbo: "turbo", voltage: "v12" });
    expect(state.profile.figures.ratedRpm).toBe(3000);
  });

  describe("[F9] heads that the log does not have", () => {
    /** A log in which some events claim to have seen far more than was ever said. */
    const boastfulLog = fc
      .tuple(anyLog, fc.array(fc.tuple(fc.nat(99), fc.integer({ min: 1, max: 4 }), fc.constantFrom(1, 7, 40, 2 ** 31 - 1))))
      .map(([log, boasts]) => {
        const boasting = structuredClone(log);
        for (const [place, device, head] of boasts) boasting[place % boasting.length]!.seen[deviceId(device)] = head;
        return boasting;
      });

    it("fold to one state in any order of arrival and with any repeats", () => {
      fc.assert(
        fc.property(boastfulLog, fc.infiniteStream(fc.nat()), (log, dice) => {
          const twice = [...log, ...log.filter(() => dice.next().value % 2)];
          const shuffled = twice.map((event) => ({ event, at: dice.next().value })).sort((a, b) => a.at - b.at);
          expect(gist(fold(shuffled.map(({ event }) => structuredClone(event))))).toEqual(gist(fold(log)));
        }),
        { seed: 18, numRuns: 300 },
      );
    });

    it("count as the newest there is, so a huge one is worth no more than the true one", () => {
      const [one, two] = [new Device(1), new Device(2)];
      const older = one.answer("bowl", "bright");
      const said = (head: number) => ({ ...new Device(2).answer("bowl", "slime", { seen: { [one.id]: head } }) });
      expect(gist(fold([older, said(1_000_000)]))).toEqual(gist(fold([older, said(1)])));
      const stranger = two.answer("bowl", "slime", { seen: { [deviceId(7)]: 1_000_000 } });
      expect(fold([older, stranger]).conflicts).toHaveLength(1);
      expect(fold([older, stranger]).order.events.map(({ id }) => id)).toEqual([older.id, stranger.id]);
    });

    it("do not outrank what was answered to them", () => {
      const [one, two] = [new Device(1), new Device(2)];
      const first = one.answer("bowl", "bright");
      const boast = two.answer("bowl", "slime", { seen: { [one.id]: 1_000_000 } });
      const reply = one.answer("bowl", "grit", { seen: { [two.id]: 1 } });
      const state = fold([boast, reply, first]);
      expect(answered(state, "bowl")).toBe("grit");
      expect(state.order.before(reply, boast)).toBe(false);
    });
  });
});
