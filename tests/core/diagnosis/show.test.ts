import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ofHundred } from "../../../lib/core/diagnosis/of-hundred";
import { keepModels } from "../../../lib/core/diagnosis/keep-models";
import { view } from "../../../lib/core/diagnosis/show";
import type { DiagnosisEvent } from "../../../lib/core/contract/event";
import { Device } from "./logs";
import { cause, check, finding, remedy, symptom, tree } from "./small-trees";

const small = tree({
  symptoms: [symptom("weak"), symptom("smoke")],
  features: [
    {
      key: "gauge",
      title: "Gauge",
      ask: "?",
      options: [
        { key: "fitted", title: "Fitted", share: 0.4 },
        { key: "none", title: "None" },
      ],
    },
  ],
  checks: [
    check("vacuum", [finding("low", { usual: true }), finding("high")], {
      minutes: 2,
      appliesTo: { features: { gauge: ["fitted"] } },
      reading: {
        quantity: "pressure",
        unit: "kPa",
        from: 0,
        to: 100,
        bands: [
          { finding: "low", from: 0, to: 15 },
          { finding: "high", from: 15, to: 100 },
        ],
      },
    }),
    check("colour", [finding("clear", { usual: true }), finding("black", { restates: "smoke" })], { engine: "idling", minutes: 40 }),
  ],
  remedies: [
    remedy("element", { minutes: 60, parts: [{ key: "element", title: "Element", quantity: 1 }], flags: { opensFuelDirty: true } }),
    remedy("decoke", { minutes: 90 }),
  ],
  causes: [
    cause("filter", {
      base: "common",
      shows: { weak: "usually" },
      gives: { vacuum: { high: "x60" } },
      curedBy: { element: "nearly always" },
      broughtOnBy: { growth: "often" },
    }),
    cause("elbow", {
      base: "common",
      shows: { weak: "usually", smoke: "usually" },
      gives: { colour: { black: "x20" } },
      curedBy: { decoke: "usually" },
    }),
    cause("growth", { shows: {}, curedBy: {} }),
  ],
});
const begin = (phone: Device) => phone.begin({ symptoms: ["weak"], profile: { features: { gauge: "fitted" }, figures: {}, healthy: {} } });
const ask = (log: DiagnosisEvent[]) => view(small, log);

describe("what a screen shows", () => {
  it("[X1] counts that add up to 100, whatever is told", () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 1, maxLength: 14 }), (raw) => {
        const total = raw.reduce((sum, one) => sum + one, 0);
        fc.pre(total > 1e-6);
        const shares = raw.map((one) => one / total);
        const counts = ofHundred(shares);
        expect(counts.reduce((sum, one) => sum + one, 0)).toBe(100);
        shares.forEach((a, i) => shares.forEach((b, j) => a > b + 1e-9 && expect(counts[i]).toBeGreaterThanOrEqual(counts[j] ?? 0)));
      }),
      { seed: 3, numRuns: 500 },
    );
    const { possible } = ask([begin(new Device(1))]);
    const sum = possible.causes.reduce((all, one) => all + one.of100, possible.others.of100 + possible.unknown.of100);
    expect(sum).toBe(100);
  });

  it("[X2] says what speaks for and against each cause, by how much", () => {
    const phone = new Device(1);
    const log = [begin(phone), phone.tell("answered", { check: "vacuum", answer: { value: 0.31, unit: "bar" }, photos: [] })];
    const { possible, said } = ask(log);
    const filter = possible.causes.find(({ key }) => key === "filter");
    const elbow = possible.causes.find(({ key }) => key === "elbow");
    expect(filter?.speaksFor[0]).toMatchObject({ title: "vacuum", says: "high" });
    expect(filter?.speaksFor[0]?.factor).toBeGreaterThan(10);
    expect(elbow?.speaksAgainst[0]?.factor).toBeLessThan(0.2);
    expect(said.at(-1)?.says).toBe("0.31 bar: high");
  });

  it("[B3] shows with a cause what this engine's log says of it", () => {
    const phone = new Device(1);
    const multipliers = [{ cause: "elbow", times: 3, reason: "Found on this engine once before." }];
    const { possible } = ask([phone.begin({ symptoms: ["weak"], multipliers })]);
    const of = (key: string) => possible.causes.find((one) => one.key === key)?.ofThisEngine;
    expect(of("elbow")).toEqual({ times: 3, reason: "Found on this engine once before." });
    expect(of("filter")).toBeNull();
  });

  it("[X3] shows what brings a cause on behind it", () => {
    expect(ask([begin(new Device(1))]).possible.causes.find(({ key }) => key === "filter")?.behind).toEqual([
      { cause: "growth", title: "growth", share: 0.66 },
    ]);
  });

  it("[N11] shows what is best to do all the same where it says to call, with its reason, steps and answers", () => {
    const phone = new Device(1);
    const tried = (remedy: string) => phone.tell("remedy-tried", { remedy, result: "no-change", photos: [] });
    const { step } = ask([begin(phone), phone.answer("vacuum", "high"), tried("element"), tried("decoke")]);
    expect(step).toMatchObject({ kind: "call", minutes: 240, goOn: { kind: "check", key: "colour", ask: "colour?", goOn: null } });
    expect(step?.goOn?.steps.length).toBeGreaterThan(0);
    expect(step?.goOn?.answers.map(({ finding }) => finding)).toEqual(["clear", "black"]);
  });

  it("[X4] gives a reason from the numbers, [X5] and safety steps in place", () => {
    const phone = new Device(1);
    const log = [begin(phone)];
    const first = ask(log).step;
    expect(first).toMatchObject({ kind: "check", key: "vacuum", ifFitted: false });
    expect(first?.why).toMatch(/\u201cfilter\u201d.*of 100 now\. .*nothing has to be opened/);
    expect(first?.why.match(/[.](?= |$)/g)).toHaveLength(2);
    expect(first?.reading?.bands).toHaveLength(2);
    const then = ask([...log, phone.answer("vacuum", "high")]).step;
    expect(then).toMatchObject({ kind: "remedy", key: "element", proof: "It runs as it should." });
    expect(then?.parts[0]?.key).toBe("element");
    const marks = then?.steps.map(({ safety }) => safety) ?? [];
    expect(marks[0]).toBe(true);
    expect(marks.at(-1)).toBe(true);
    expect(marks).toContain(false);
    expect(then?.cautions.map(({ key }) => key)).toContain("fuel-spill");
  });

  it("[X5] names the step's drawing, or none", () => {
    const drawn = tree({ ...small, checks: small.checks.map((one) => (one.key === "vacuum" ? { ...one, drawing: "fuel-path" } : one)) });
    expect(view(drawn, [begin(new Device(1))]).step).toMatchObject({ key: "vacuum", drawing: "fuel-path" });
    expect(ask([begin(new Device(1))]).step).toMatchObject({ key: "vacuum", drawing: null });
  });

  it("[E4] offers to withdraw a symptom that a finding contradicts", () => {
    const phone = new Device(1);
    const model = tree({ ...small, checks: small.checks.map((one) => (one.key === "colour" ? { ...one, firstFor: { smoke: 1 } } : one)) });
    const step = view(model, [phone.begin({ symptoms: ["smoke"] })]).step;
    expect(step?.key).toBe("colour");
    expect(step?.answers).toEqual([
      { finding: "clear", title: "clear", withdraws: "smoke" },
      { finding: "black", title: "black", withdraws: null },
    ]);
  });

  it("[F6] 'not fitted' writes the profile, and goes with its answer", () => {
    const phone = new Device(1);
    const begun = phone.begin({ symptoms: ["weak"] });
    expect(ask([begun]).step).toMatchObject({ key: "vacuum", ifFitted: true });
    const not = phone.tell("answered", { check: "vacuum", answer: { notFitted: true }, photos: [] });
    expect(ask([begun, not]).profile.features).toEqual({ gauge: "none" });
    expect(ask([begun, not]).step?.key).not.toBe("vacuum");
    expect(ask([begun, not, phone.tell("taken-back", { event: not.id })]).profile.features).toEqual({});
  });

  it("[X7] shows no step after a cure, and names the cause that the remedy cures", () => {
    const phone = new Device(1);
    const log = [begin(phone), phone.tried("decoke", "cured")];
    expect(ask(log)).toMatchObject({ step: null, curedCause: { cause: "elbow", remedy: "decoke", temporary: false } });
    expect(ask([...log, phone.tell("taken-back", { event: log[1]!.id })]).step).not.toBeNull();
  });

  it("[X6] what was said may be changed until the end", () => {
    const phone = new Device(1);
    const log = [begin(phone), phone.answer("vacuum", "low")];
    expect(ask(log).said.map(({ mayChange }) => mayChange)).toEqual([false, true]);
    const ended = ask([...log, phone.tell("ended", { outcome: "broken-off", parts: [] })]);
    expect(ended.step).toBeNull();
    expect(ended.outcome?.outcome).toBe("broken-off");
    expect(ended.said.every(({ mayChange }) => !mayChange)).toBe(true);
  });

  it("[X6] a figure mistyped, a part found after all, and a note can be taken back too", () => {
    const phone = new Device(1);
    const log = [
      begin(phone),
      phone.tell("figure-told", { figure: "ratedRpm", value: 36 }),
      phone.tell("not-aboard", { item: "Vacuum gauge" }),
      phone.tell("noted", { note: "wrong boat", photos: [] }),
    ];
    expect(ask(log).said.map(({ mayChange }) => mayChange)).toEqual([false, true, true, true]);
    expect(ask([...log, phone.tell("taken-back", { event: log[1]!.id })]).profile.figures).toEqual(ask([log[0]!]).profile.figures);
  });

  it("[F4] shows both answers of a conflict, and reckons with neither", () => {
    const [one, two] = [new Device(1), new Device(2)];
    const log = [begin(one), one.answer("vacuum", "low"), two.answer("vacuum", "high")];
    const shown = ask(log);
    expect(shown.conflicts[0]?.answers.map(({ says }) => says).sort()).toEqual(["high", "low"]);
    expect(shown.possible).toEqual(ask([log[0]!]).possible);
  });

  it("is the same with kept models, and before anything was begun", () => {
    const models = keepModels();
    const log = [begin(new Device(1))];
    expect(view(small, log, models)).toEqual(view(small, log));
    expect(view(small, log, models)).toEqual(view(small, log));
    expect(view(small, []).begun).toBe(false);
    expect(view(small, []).step).toBeNull();
  });
});
