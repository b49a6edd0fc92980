import { describe, expect, it } from "vitest";
import type { DiagnosisEvent } from "../../../lib/core/contract/event";
import { crankSeconds } from "../../../lib/core/diagnosis/crank-seconds";
import { fold } from "../../../lib/core/diagnosis/fold";
import { forbidden, rulesInForce, rulesToAsk } from "../../../lib/core/diagnosis/stop-rules";
import { view } from "../../../lib/core/diagnosis/show";
import { Device } from "./logs";
import { cause, check, remedy, stopRule, symptom, tree } from "./small-trees";

const hot = stopRule("hot", {
  when: { symptoms: ["overheat"], findings: [{ check: "gauge", finding: "red" }] },
  ask: "Is the needle in the red?",
  clearedBy: [{ check: "hand", finding: "cool" }],
});
const flood = stopRule("flood", {
  kind: "no-crank",
  when: { symptoms: [], findings: [], crankSeconds: 30 },
  forbids: ["cranking"],
  clearedWhen: "The exhaust has been drained",
});
const always = stopRule("fire", {
  kind: "call",
  when: { symptoms: "*", findings: [] },
  ask: "Is there smoke below?",
  forbids: [],
  runOnIfStoppingEndangers: false,
});
const small = tree({
  symptoms: [symptom("overheat")],
  stopRules: [hot, flood, always],
  checks: [
    check("gauge", ["green", "red"], { engine: "idling" }),
    check("hand", ["cool", "hot"]),
    check("crank", ["turns", "slow"], { engine: "cranking", flags: { cranks: 10 } }),
    check("load", ["fine", "odd"], { engine: "under-load", minutes: 1 }),
  ],
  remedies: [remedy("mend", { minutes: 60 }), remedy("mend-b", { minutes: 60 })],
  causes: [
    cause("a", { shows: { overheat: "usually" }, gives: { load: { odd: "x60" }, crank: { slow: "x20" } }, curedBy: { mend: "usually" } }),
    cause("b", { shows: { overheat: "usually" }, curedBy: { "mend-b": "usually" } }),
  ],
});
const keys = (rules: readonly { key: string }[]) => rules.map(({ key }) => key);

describe("stop rules", () => {
  it("[T1] are asked with their symptoms before anything else, once", () => {
    const phone = new Device(1);
    const begun = phone.begin({ symptoms: ["overheat"] });
    expect(keys(rulesToAsk(small, fold([begun])))).toEqual(["hot", "fire"]);
    expect(view(small, [begun]).step).toBeNull();
    const no = [phone.tell("rule-answered", { rule: "hot", answer: "no" }), phone.tell("rule-answered", { rule: "fire", answer: "no" })];
    expect(rulesToAsk(small, fold([begun, ...no]))).toEqual([]);
    expect(view(small, [begun, ...no]).step).not.toBeNull();
  });

  it("[T1] stay to be seen and changed, whatever was answered and whether they fit the complaint or not", () => {
    const phone = new Device(1);
    const standing = (events: readonly DiagnosisEvent[]) =>
      view(small, events).rules.map(({ key, due, answer, event }) => ({ key, due, answer, event }));
    const log: DiagnosisEvent[] = [phone.begin()];
    expect(standing(log)).toEqual([
      { key: "hot", due: false, answer: null, event: null },
      { key: "fire", due: true, answer: null, event: null },
    ]);
    const no = phone.tell("rule-answered", { rule: "fire", answer: "no" });
    log.push(no);
    expect(standing(log)[1]).toEqual({ key: "fire", due: false, answer: "no", event: no.id });
    log.push(phone.answer("gauge", "red"));
    expect(standing(log)[0]).toEqual({ key: "hot", due: false, answer: "yes", event: null });
  });

  it("[T3] that were lifted come into force again with the next yes, not with one in the lifting's place", () => {
    const phone = new Device(1);
    const liftable = tree({ ...small, stopRules: [stopRule("fire", { ...always, clearedWhen: "It is out" })] });
    const log: DiagnosisEvent[] = [phone.begin(), phone.tell("rule-answered", { rule: "fire", answer: "yes" })];
    log.push(phone.tell("rule-answered", { rule: "fire", answer: "cleared" }));
    expect(view(liftable, log).rules).toMatchObject([{ answer: "no", event: null }]);
    log.push(phone.tell("rule-answered", { rule: "fire", answer: "yes" }));
    expect(view(liftable, log).rules).toMatchObject([{ answer: "yes" }]);
    expect(keys(rulesInForce(liftable, fold(log)))).toEqual(["fire"]);
  });

  it("[T2] come into force on a finding at once", () => {
    const phone = new Device(1);
    expect(keys(rulesInForce(small, fold([phone.begin(), phone.answer("gauge", "red")])))).toEqual(["hot"]);
  });

  it("[T3] only the clearing finding, told by someone who knew, lifts them", () => {
    const [phone, other] = [new Device(1), new Device(2)];
    const yes = phone.tell("rule-answered", { rule: "hot", answer: "yes" });
    const log = [phone.begin(), yes];
    expect(keys(rulesInForce(small, fold(log)))).toEqual(["hot"]);
    expect(keys(rulesInForce(small, fold([...log, phone.tell("rule-answered", { rule: "hot", answer: "no" })])))).toEqual(["hot"]);
    expect(keys(rulesInForce(small, fold([...log, phone.tell("rule-answered", { rule: "hot", answer: "cleared" })])))).toEqual(["hot"]);
    expect(keys(rulesInForce(small, fold([...log, other.answer("hand", "cool")])))).toEqual(["hot"]);
    expect(keys(rulesInForce(small, fold([...log, phone.answer("hand", "cool")])))).toEqual([]);
    expect(
      keys(rulesInForce(small, fold([...log, phone.tell("rule-answered", { rule: "hot", answer: "no" }, { supersedes: yes.id })]))),
    ).toEqual([]);
  });

  it("[T3] a danger that one of two devices saw holds until they agree", () => {
    const [one, two] = [new Device(1), new Device(2)];
    const log = [one.answer("gauge", "red"), two.answer("gauge", "green")];
    expect(fold(log).conflicts).toHaveLength(1);
    expect(keys(rulesInForce(small, fold(log)))).toEqual(["hot"]);
  });

  it("[T4] every second of cranking counts until the engine runs or the exhaust is drained", () => {
    const phone = new Device(1);
    const log = [phone.begin(), phone.tell("cranked", { seconds: 8, ran: false }), phone.answer("crank", "slow")];
    expect(crankSeconds(small, fold(log))).toBe(10);
    const more = [...log, phone.answer("crank", "turns", { supersedes: log[2]!.id }), phone.tell("cranked", { seconds: 12, ran: false })];
    expect(crankSeconds(small, fold(more))).toBe(22);
    const over = [...more, phone.tell("cranked", { seconds: 10, ran: false })];
    expect(keys(rulesInForce(small, fold(over)))).toEqual(["flood"]);
    const drained = [...over, phone.tell("rule-answered", { rule: "flood", answer: "cleared" })];
    expect(crankSeconds(small, fold(drained))).toBe(0);
    expect(rulesInForce(small, fold(drained))).toEqual([]);
    expect(crankSeconds(small, fold([...over, phone.tell("cranked", { seconds: 2, ran: true })]))).toBe(0);
    expect(crankSeconds(small, fold([...over, phone.answer("load", "fine")]))).toBe(0);
  });

  it("[T4] bursts timed at a step are part of what it asks for, and the longer of the two counts", () => {
    const [short, long] = [new Device(1), new Device(2)];
    const timed = (phone: Device, seconds: number) => phone.tell("cranked", { seconds, ran: false });
    expect(crankSeconds(small, fold([short.begin(), timed(short, 4), short.answer("crank", "slow")]))).toBe(10);
    const bursts = [long.begin(), timed(long, 10), timed(long, 6), long.answer("crank", "slow")];
    expect(crankSeconds(small, fold(bursts))).toBe(16);
    expect(crankSeconds(small, fold([...bursts, long.answer("crank", "turns")]))).toBe(26);
  });

  it("[T4] a changed answer takes no second off: the starter has turned, whatever was read", () => {
    const phone = new Device(1);
    const first = phone.answer("crank", "slow");
    const log = [phone.begin(), first];
    const changed = phone.answer("crank", "turns", { supersedes: first.id });
    const again = phone.answer("crank", "slow", { supersedes: changed.id });
    expect(crankSeconds(small, fold([...log, changed, again]))).toBe(10);
    const putOff = phone.tell("answered", { check: "crank", answer: { cannotTell: true }, photos: [] }, { supersedes: again.id });
    expect(crankSeconds(small, fold([...log, changed, again, putOff]))).toBe(10);
  });

  it("[T4] a step that was put off and then done has cranked; one that was taken back has not", () => {
    const phone = new Device(1);
    const putOff = phone.tell("answered", { check: "crank", answer: { cannotTell: true }, photos: [] });
    const done = phone.answer("crank", "slow", { supersedes: putOff.id });
    expect(crankSeconds(small, fold([phone.begin(), putOff, done]))).toBe(10);
    expect(crankSeconds(small, fold([phone.begin(), putOff, done, phone.tell("taken-back", { event: done.id })]))).toBe(0);
  });

  it("[T5] steps in engine states that they forbid are gone", () => {
    expect(forbidden(flood)).toEqual(["cranking", "idling", "under-load"]);
    const phone = new Device(1);
    const log = [phone.begin({ symptoms: ["overheat"] }), phone.tell("rule-answered", { rule: "fire", answer: "no" })];
    const calm = view(small, [...log, phone.tell("rule-answered", { rule: "hot", answer: "no" })]);
    expect(calm.step?.key).toBe("load");
    const danger = view(small, [...log, phone.tell("rule-answered", { rule: "hot", answer: "yes" })]);
    expect(danger.rulesInForce[0]).toMatchObject({ key: "hot", runOn: true });
    expect(danger.step?.key).toBe("hand");
    expect(danger.step?.why).toContain("hot");
  });

  it("[T5] a cold start is cranking too: it is not offered to an engine that may not be cranked", () => {
    const risky = tree({
      symptoms: [symptom("slow-start")],
      stopRules: [{ ...flood, ask: "Did it stop dead?", when: { symptoms: ["slow-start"], findings: [] } }],
      checks: [
        check("cold-start", ["no-better", "starts"], { engine: "cold", minutes: 1, flags: { cranks: 10 } }),
        check("look", ["even", "odd"]),
      ],
      remedies: [remedy("mend"), remedy("mend-b")],
      causes: [
        cause("a", {
          shows: { "slow-start": "usually" },
          gives: { "cold-start": { starts: "x60" }, look: { odd: "x5" } },
          curedBy: { mend: "usually" },
        }),
        cause("b", { shows: { "slow-start": "usually" }, curedBy: { "mend-b": "usually" } }),
      ],
    });
    const phone = new Device(1);
    const begun = phone.begin({ symptoms: ["slow-start"] });
    const answered = (answer: "yes" | "no") => view(risky, [begun, phone.tell("rule-answered", { rule: "flood", answer })]);
    expect(answered("no").step?.key).toBe("cold-start");
    expect(answered("yes").step?.key).not.toBe("cold-start");
  });

  it("[T6] a rule that says to call leaves nothing but the call", () => {
    const phone = new Device(1);
    const log = [
      phone.begin({ symptoms: ["overheat"] }),
      phone.tell("rule-answered", { rule: "hot", answer: "no" }),
      phone.tell("rule-answered", { rule: "fire", answer: "yes" }),
    ];
    expect(view(small, log).step?.kind).toBe("call");
  });

  it("[T7] leave out what has to be tried out while it must not be started, but not what lifts them", () => {
    const phone = new Device(1);
    const locked = tree({
      ...small,
      stopRules: [
        stopRule("water", {
          kind: "no-crank",
          forbids: ["cranking"],
          ask: "Water in the cylinders?",
          clearedBy: [{ check: "hand", finding: "cool" }],
        }),
      ],
      remedies: [remedy("dry", { minutes: 10 }), ...small.remedies],
      checks: small.checks.map((one) => (one.key === "hand" ? { ...one, after: [{ remedy: "dry" }] } : one)),
    });
    const log: DiagnosisEvent[] = [phone.begin({ symptoms: ["overheat"] }), phone.tell("rule-answered", { rule: "water", answer: "yes" })];
    expect(view(locked, log).step).toMatchObject({ kind: "remedy", key: "dry" });
    log.push(phone.tell("remedy-tried", { remedy: "dry", result: "no-change", photos: [] }), phone.answer("hand", "hot"));
    expect(view(locked, log).step).toMatchObject({
      kind: "call",
      goOn: null,
      why: "While it must not be started no repair can be proved here: first do what lifts the rule, if that can be done.",
    });
    log.push(phone.answer("hand", "cool", { supersedes: log.at(-1)!.id }));
    expect(view(locked, log).step?.kind).not.toBe("call");
  });
});

describe("an engine that does not turn", () => {
  const dead = tree({
    symptoms: [{ ...symptom("silent"), rulesOut: ["cranking", "idling", "under-load"] }],
    stopRules: [
      stopRule("locked", {
        forbids: ["cranking"],
        kind: "no-crank",
        when: { symptoms: ["silent"], findings: [] },
        ask: "Did it stop dead?",
        clearedWhen: "It turns by hand",
      }),
    ],
    checks: [
      check("try", ["nothing", "turns"], { engine: "any", flags: { cranks: 2 } }),
      check("smoke", ["none", "white"], { engine: "cranking", flags: { cranks: 5 } }),
      check("cold-start", ["none", "starts"], { engine: "cold", flags: { cranks: 10 } }),
    ],
    remedies: [remedy("mend", { minutes: 60 }), remedy("mend-b", { minutes: 60 })],
    causes: [
      cause("a", {
        shows: { silent: "usually" },
        gives: { try: { turns: "x20" }, smoke: { white: "x60" }, "cold-start": { starts: "x60" } },
        curedBy: { mend: "usually" },
      }),
      cause("b", { shows: { silent: "usually" }, curedBy: { "mend-b": "usually" } }),
    ],
  });
  const stepAfter = (answer: "no" | "yes") => {
    const phone = new Device(1);
    return view(dead, [phone.begin({ symptoms: ["silent"] }), phone.tell("rule-answered", { rule: "locked", answer })]).step;
  };

  it("[G6] can still be tried, but is not asked what only a turning engine shows", () => {
    expect(stepAfter("no")).toMatchObject({ kind: "check", key: "try" });
  });

  it("[G6] is not even tried while a rule says not to crank", () => {
    // Nor is a repair offered, since none could be tried out: what is left is to call.
    expect(stepAfter("yes")).toMatchObject({ kind: "call" });
  });

  it("[T2] what was found or cranked into force says so: it is no answer that could be changed to a no", () => {
    const phone = new Device(1);
    const log = [phone.begin({ symptoms: ["overheat"] }), phone.tell("rule-answered", { rule: "hot", answer: "no" })];
    const standing = (events: readonly DiagnosisEvent[], rule: string) => view(small, events).rules.find(({ key }) => key === rule);
    expect(standing(log, "hot")).toMatchObject({ answer: "no", found: false });
    expect(standing([...log, phone.answer("gauge", "red")], "hot")).toMatchObject({ answer: "yes", found: true });
    expect(standing([...log, phone.tell("cranked", { seconds: 31, ran: false })], "flood")).toMatchObject({ answer: "yes", found: true });
    expect(standing([...log, phone.tell("rule-answered", { rule: "fire", answer: "yes" })], "fire")).toMatchObject({ found: false });
  });

  it("[T8] offer no running on where nothing runs, and leave every other exception as it is", () => {
    const dead = {
      ...small,
      symptoms: [...small.symptoms, { ...symptom("dead"), rulesOut: ["idling", "under-load"] as const }],
    } as typeof small;
    const phone = new Device(1);
    const runsOn = (symptoms: string[]) => {
      const log = [
        phone.begin({ symptoms }),
        phone.tell("cranked", { seconds: 31, ran: false }),
        phone.tell("rule-answered", { rule: "hot", answer: "yes" }),
      ];
      return Object.fromEntries(view(dead, log).rulesInForce.map(({ key, runOn }) => [key, runOn]));
    };
    expect(runsOn(["dead"])).toEqual({ hot: true, flood: false });
    expect(runsOn(["overheat"])).toEqual({ hot: true, flood: true });
  });
});
