import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { believe } from "../../../lib/core/diagnosis/believe";
import { compile } from "../../../lib/core/diagnosis/compile";
import { AT_REST, NO_EVIDENCE, type Evidence } from "../../../lib/core/diagnosis/evidence";
import type { Setting } from "../../../lib/core/diagnosis/model";
import { nextStep } from "../../../lib/core/diagnosis/next-step";
import type { FaultTree } from "../../../lib/core/tree/schema";
import { anyCase, setting } from "./random-trees";
import { cause, check, finding, remedy, symptom, tree } from "./small-trees";

const step = (of: FaultTree, evidence: Partial<Evidence> = {}, over: Partial<Setting> = {}) =>
  nextStep(compile(of, { ...setting, ...over }), { ...NO_EVIDENCE, ...evidence });
const weak = [{ symptom: "weak", present: true }];

/** Two likely causes with dear remedies, and a cheap look that tells them apart. */
const pair = (over: Partial<FaultTree> = {}) =>
  tree({
    checks: [check("look", ["fine", "odd"], { minutes: 2 })],
    remedies: [remedy("mend-a", { minutes: 60 }), remedy("mend-b", { minutes: 60 })],
    causes: [
      cause("a", { shows: { weak: "usually" }, gives: { look: { odd: "usually" } }, curedBy: { "mend-a": "nearly always" } }),
      cause("b", { shows: { weak: "usually" }, curedBy: { "mend-b": "nearly always" } }),
    ],
    ...over,
  });

describe("the next step", () => {
  it("[N3] looks before it mends where a look is cheap, then mends what is likely", () => {
    expect(step(pair(), { symptoms: weak })).toMatchObject({ kind: "check", key: "look", because: "tells-most" });
    expect(step(pair(), { symptoms: weak, findings: [{ check: "look", finding: "odd" }] })).toMatchObject({
      kind: "remedy",
      key: "mend-a",
      because: "likely-cure",
    });
    expect(step(pair(), { symptoms: weak, findings: [{ check: "look", finding: "fine" }] })).toMatchObject({
      kind: "remedy",
      key: "mend-b",
    });
  });

  it("[N3] does not pay for a look that costs more than it saves", () => {
    expect(step(pair({ checks: [check("look", ["fine", "odd"], { minutes: 200 })] }), { symptoms: weak }).kind).toBe("remedy");
  });

  it("[N4] calls when everything here has been tried", () => {
    const remedies = [
      { remedy: "mend-a", result: "no-change" as const },
      { remedy: "mend-b", result: "no-change" as const },
    ];
    expect(step(pair(), { symptoms: weak, findings: [{ check: "look", finding: "fine" }], remedies })).toMatchObject({
      kind: "call",
      because: "nothing-better",
    });
  });

  it("[N4] calls sooner where a call is cheap", () => {
    const told = { symptoms: weak, findings: [{ check: "look", finding: null }] };
    // Whoever comes mends at once what he has found; who tries here first mends the wrong thing half the time.
    const found = { remedies: [remedy("mend-a", { minutes: 600 }), remedy("mend-b", { minutes: 600 })] };
    expect(step(pair(found), told, { callMinutes: 1 }).kind).toBe("call");
    expect(step(pair(found), told, { callMinutes: 2400 }).kind).toBe("remedy");
  });

  it("[C7] asks what is cheaper to look at now than for whoever is called, though it will be called", () => {
    const looking = (minutes: number) =>
      pair({
        checks: [check("look", ["fine", "odd"], { minutes })],
        remedies: [remedy("mend-a", { who: "workshop" }), remedy("mend-b", { who: "workshop" })],
      });
    expect(step(looking(2), { symptoms: weak })).toMatchObject({ kind: "check", key: "look" });
    expect(step(looking(200), { symptoms: weak }).kind).toBe("call");
  });

  it("[N5] puts off what would not change the next try until that has failed", () => {
    // "look" tells b from c; a is so likely that its mending comes first whatever is seen.
    const three = tree({
      checks: [check("look", ["fine", "odd"], { minutes: 4 })],
      remedies: ["a", "b", "c"].map((key) => remedy(`mend-${key}`, { minutes: 30 })),
      causes: [
        cause("a", { base: 20, shows: { weak: "usually" }, curedBy: { "mend-a": "nearly always" } }),
        cause("b", { base: 2, shows: { weak: "usually" }, gives: { look: { odd: 0.5 } }, curedBy: { "mend-b": "nearly always" } }),
        cause("c", { base: 2, shows: { weak: "usually" }, curedBy: { "mend-c": "nearly always" } }),
      ],
    });
    expect(step(three, { symptoms: weak })).toMatchObject({ kind: "remedy", key: "mend-a" });
    const failed = [{ remedy: "mend-a", result: "no-change" as const }];
    expect(step(three, { symptoms: weak, remedies: failed })).toMatchObject({ kind: "check", key: "look" });
  });

  it("[N9] offers a stronger look at what has been seen already, and not a weaker one", () => {
    const seen = (links: Record<string, FaultTree["causes"][number]["gives"][string]>) =>
      pair({
        checks: [
          check("glance", ["fine", "odd"], { minutes: 1, sameSight: "part" }),
          check("measure", ["fine", "odd"], { minutes: 2, sameSight: "part" }),
        ],
        causes: [
          cause("a", { shows: { weak: "usually" }, gives: links, curedBy: { "mend-a": "nearly always" } }),
          cause("b", { shows: { weak: "usually" }, curedBy: { "mend-b": "nearly always" } }),
        ],
      });
    const glanced = { symptoms: weak, findings: [{ check: "glance", finding: "odd" }] };
    expect(step(seen({ glance: { odd: "x5" }, measure: { odd: "x60" } }), glanced).key).toBe("measure");
    expect(step(seen({ glance: { odd: "x60" }, measure: { odd: "x5" } }), glanced).kind).toBe("remedy");
  });

  it("[N11] says with a call what is best to do here all the same", () => {
    const dear = (over: Partial<FaultTree>) =>
      step(pair({ checks: [check("look", ["fine", "odd"], { minutes: 200 })], ...over }), { symptoms: weak }, { callMinutes: 1 });
    const long = ["mend-a", "mend-b"].map((key) => remedy(key, { minutes: 900 }));
    expect(dear({ remedies: long })).toMatchObject({ kind: "call", goOn: { kind: "check", key: "look" } });
    expect(dear({ remedies: long, checks: [] })).toMatchObject({ kind: "call", goOn: { kind: "remedy", key: "mend-a" } });
    const workshop = ["mend-a", "mend-b"].map((key) => remedy(key, { who: "workshop" }));
    expect(dear({ remedies: workshop, checks: [] })).toMatchObject({ kind: "call", goOn: null });
    const mustCall = { ...AT_REST, mustCall: true };
    expect(step(pair(), { symptoms: weak, standing: mustCall })).toMatchObject({ kind: "call", goOn: null });
  });

  it("[N10] asks less of someone who cannot tell", () => {
    const aside = Array.from({ length: 12 }, (_, index) => `aside-${index}`);
    const asked = pair({
      checks: [check("look", ["fine", "odd"], { minutes: 8 }), ...aside.map((key) => check(key, ["fine", "odd"]))],
    });
    const after = (finding: string | null) => step(asked, { symptoms: weak, findings: aside.map((key) => ({ check: key, finding })) });
    expect(after("fine").key).toBe("look");
    expect(after(null).kind).toBe("remedy");
  });

  it("[N12] asks on where no single answer would change the plan but many would settle it", () => {
    const bits = [0, 1, 2, 3, 4, 5];
    const causes = Array.from({ length: 64 }, (_, index) =>
      cause(`c-${index}`, {
        shows: { weak: "usually" },
        gives: Object.fromEntries(bits.filter((bit) => (index >> bit) & 1).map((bit) => [`bit-${bit}`, { yes: 0.98 }])),
        curedBy: { [`mend-${index}`]: "always" },
      }),
    );
    const many = tree({
      causes,
      remedies: causes.map((_, index) => remedy(`mend-${index}`, { minutes: 30 })),
      checks: bits.map((bit) =>
        check(`bit-${bit}`, [finding("no", { usual: true, sound: 0.95 }), finding("yes", { sound: 0.05 })], { minutes: 3 }),
      ),
    });
    expect(step(many, { symptoms: weak })).toMatchObject({ kind: "check", key: "bit-0" });
  });

  it("[N1] asks what was changed last before any reckoning, then the mechanic's own order", () => {
    const ordered = pair({
      checks: [
        check("look", ["fine", "odd"], { minutes: 1 }),
        check("touched", ["nothing", "filter"], { asksWhatChanged: true, minutes: 30 }),
        check("second", ["fine", "odd"], { minutes: 30, firstFor: { weak: 2 } }),
        check("first", ["fine", "odd"], { minutes: 30, firstFor: { weak: 1 } }),
        check("idle-talk", ["fine", "odd"], { firstFor: { weak: 1 } }),
      ],
      causes: [
        cause("a", {
          shows: { weak: "usually" },
          gives: { look: { odd: "usually" }, first: { odd: "x5" }, second: { odd: "x5" } },
          curedBy: { "mend-a": "usually" },
        }),
        cause("b", { shows: { weak: "usually" }, curedBy: { "mend-b": "usually" } }),
      ],
    });
    const asked: string[] = [];
    for (let turn = 0; turn < 4; turn++)
      asked.push(step(ordered, { symptoms: weak, findings: asked.map((key) => ({ check: key, finding: null })) }).key);
    // A pinned check on which no cause over 1 % hangs is skipped.
    expect(asked).toEqual(["touched", "first", "second", "look"]);
  });

  it("[G1] a step that waits for another lends it its worth", () => {
    const gated = pair({
      checks: [
        check("bleed", ["done", "not-done"], { minutes: 1 }),
        check("look", ["fine", "odd"], { minutes: 2, after: [{ check: "bleed" }] }),
      ],
    });
    expect(step(gated, { symptoms: weak })).toMatchObject({ key: "bleed", gateTo: { kind: "check", key: "look" } });
    expect(step(gated, { symptoms: weak, findings: [{ check: "bleed", finding: null }] })).toMatchObject({ key: "look", gateTo: null });
  });

  it("[G2] a gate on a finding opens on that finding and no other", () => {
    const gated = pair({
      checks: [
        check("bar-over", ["free", "stops"], { minutes: 1 }),
        check("look", ["fine", "odd"], { minutes: 2, after: [{ check: "bar-over", finding: "free" }] }),
      ],
    });
    expect(step(gated, { symptoms: weak, findings: [{ check: "bar-over", finding: "free" }] }).key).toBe("look");
    for (const told of ["stops", null])
      expect(step(gated, { symptoms: weak, findings: [{ check: "bar-over", finding: told }] }).key).not.toBe("look");
  });

  it("[G3] a gate that does not apply to this engine is open, unless a finding is asked of it", () => {
    const without = (after: FaultTree["checks"][number]["after"]) =>
      pair({
        features: [
          {
            key: "lever",
            title: "Lever",
            ask: "?",
            options: [
              { key: "fitted", title: "Fitted" },
              { key: "none", title: "None" },
            ],
          },
        ],
        checks: [
          check("lever", ["up", "down"], { appliesTo: { features: { lever: ["fitted"] } } }),
          check("look", ["fine", "odd"], { minutes: 2, after }),
        ],
      });
    const profile = { ...setting.profile, features: { lever: "none" } };
    expect(step(without([{ check: "lever" }]), { symptoms: weak }, { profile }).key).toBe("look");
    expect(step(without([{ check: "lever", finding: "up" }]), { symptoms: weak }, { profile }).key).not.toBe("look");
  });

  it("[G4] a circle of gates is never entered", () => {
    const circle = pair({
      checks: [check("one", ["a", "b"], { after: [{ check: "look" }] }), check("look", ["fine", "odd"], { after: [{ check: "one" }] })],
    });
    expect(step(circle, { symptoms: weak }).kind).toBe("remedy");
  });

  it("[W1] offers nothing that this person may not do", () => {
    const hard = pair({
      checks: [check("look", ["fine", "odd"], { who: "mechanic" })],
      remedies: [remedy("mend-a", { who: "skipper-in-port", minutes: 60 }), remedy("mend-b", { who: "mechanic", minutes: 60 })],
    });
    expect(step(hard, { symptoms: weak }, { person: "mechanic" }).key).toBe("look");
    expect(step(hard, { symptoms: weak }, { person: "skipper-in-port" })).toMatchObject({ kind: "remedy", key: "mend-a" });
    expect(step(hard, { symptoms: weak }, { person: "skipper-in-port", situation: "under-way" }).kind).toBe("call");
  });

  it("[W2] opens no union of the high-pressure side for a skipper, nor where it may be common rail", () => {
    const union = pair({ checks: [check("look", ["fine", "odd"], { who: "skipper-at-sea", flags: { opensHighPressureFuel: true } })] });
    const inLine = { ...setting.profile, features: { injection: "in-line-pump" } };
    expect(step(union, { symptoms: weak }, { profile: inLine }).key).toBe("look");
    expect(step(union, { symptoms: weak }, { profile: inLine, person: "skipper-in-port" }).kind).toBe("remedy");
    for (const features of [{} as Record<string, string>, { injection: "common-rail" }, { injection: "unit-injectors" }])
      for (const person of ["mechanic", "workshop"] as const)
        expect(step(union, { symptoms: weak }, { profile: { ...setting.profile, features }, person }).kind).toBe("remedy");
  });

  it("[W5] opens clean fuel only where the kind of injection is known to bear it, and for a skipper never on rail", () => {
    const applies = { features: { injection: ["in-line-pump", "common-rail"] } };
    const opened = pair({ checks: [check("look", ["fine", "odd"], { flags: { opensFuelClean: true }, appliesTo: applies })] });
    const kindFor = (person: Setting["person"], injection?: string) =>
      step(opened, { symptoms: weak }, { person, profile: { ...setting.profile, features: injection ? { injection } : {} } }).kind;
    expect(kindFor("skipper-in-port")).toBe("remedy");
    expect(kindFor("mechanic")).toBe("remedy");
    expect(kindFor("workshop")).toBe("check");
    expect(kindFor("skipper-in-port", "in-line-pump")).toBe("check");
    expect(kindFor("skipper-in-port", "common-rail")).toBe("remedy");
    expect(kindFor("mechanic", "common-rail")).toBe("check");
  });

  it("[W3] what is not aboard is not offered at sea, and fetched alongside only if worth it", () => {
    const tooled = pair({ checks: [check("look", ["fine", "odd"], { tools: ["vacuum gauge"], minutes: 2 })] });
    expect(step(tooled, { symptoms: weak }, { notAboard: ["vacuum gauge"], situation: "at-anchor" }).kind).toBe("remedy");
    expect(step(tooled, { symptoms: weak }, { notAboard: ["vacuum gauge"] }).kind).toBe("remedy");
    expect(step(tooled, { symptoms: weak }).key).toBe("look");
  });

  it("[C3] pays for an opening once", () => {
    const boxed = pair({ checks: [check("look", ["fine", "odd"], { minutes: 2, opens: { area: "box", minutes: 100 } })] });
    expect(step(boxed, { symptoms: weak }).kind).toBe("remedy");
    expect(step(boxed, { symptoms: weak, standing: { ...AT_REST, open: new Set(["box"]) } }).key).toBe("look");
  });

  it("[C4] counts the wait for a cold engine", () => {
    const cold = pair({ checks: [check("look", ["fine", "odd"], { minutes: 2, engine: "cold" })] });
    expect(step(cold, { symptoms: weak }).key).toBe("look");
    expect(step(cold, { symptoms: weak, standing: { ...AT_REST, hot: true } }).kind).toBe("remedy");
  });

  it("[N7] never repeats a step, never offers what is ruled out, and always ends", () => {
    fc.assert(
      fc.property(anyCase, ({ tree, evidence }) => {
        const model = compile(tree, setting);
        let known: Evidence = evidence;
        for (let turn = 0; turn < 40; turn++) {
          const next = nextStep(model, known);
          if (next.kind === "call") return;
          const done =
            next.kind === "check"
              ? known.findings.some(({ check }) => check === next.key)
              : known.remedies.some(({ remedy }) => remedy === next.key);
          expect(done).toBe(false);
          known =
            next.kind === "check"
              ? { ...known, findings: [...known.findings, { check: next.key, finding: null }] }
              : { ...known, remedies: [...known.remedies, { remedy: next.key, result: "no-change" }] };
        }
        throw new Error("it did not end");
      }),
      { seed: 5, numRuns: 150 },
    );
  });

  it("[N8] is the same whatever order the tree lists things in, and leaves belief as it is", () => {
    fc.assert(
      fc.property(anyCase, ({ tree, evidence }) => {
        const turned = { ...tree, checks: [...tree.checks].reverse(), remedies: [...tree.remedies].reverse() };
        const model = compile(tree, setting);
        const next = nextStep(model, evidence);
        expect(nextStep(compile(turned, setting), evidence).key).toBe(next.key);
        expect([...next.shares]).toEqual([...believe(model, evidence).shares]);
      }),
      { seed: 6, numRuns: 150 },
    );
  });

  it("[E4] does not ask again what was reported", () => {
    const again = pair({
      symptoms: [symptom("weak"), symptom("smoke")],
      checks: [check("colour", [finding("clear", { usual: true }), finding("black", { restates: "smoke" })], { minutes: 1 })],
      causes: [
        cause("a", {
          shows: { weak: "usually", smoke: "usually" },
          gives: { colour: { black: "usually" } },
          curedBy: { "mend-a": "usually" },
        }),
        cause("b", {
          shows: { weak: "usually", smoke: "usually" },
          gives: { colour: { black: "usually" } },
          curedBy: { "mend-b": "usually" },
        }),
      ],
    });
    expect(step(again, { symptoms: [...weak, { symptom: "smoke", present: true }] }).kind).toBe("remedy");
  });
});
