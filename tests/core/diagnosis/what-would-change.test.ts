import { describe, expect, it } from "vitest";
import { askedNext } from "../../../lib/core/diagnosis/asked-next";
import { believe } from "../../../lib/core/diagnosis/believe";
import { compile } from "../../../lib/core/diagnosis/compile";
import { NO_EVIDENCE, type Evidence } from "../../../lib/core/diagnosis/evidence";
import { hangsOn } from "../../../lib/core/diagnosis/hangs-on";
import { howSure } from "../../../lib/core/diagnosis/how-sure";
import { linksBeside, ratesBeside, strengthsBeside } from "../../../lib/core/diagnosis/one-word-off";
import { view } from "../../../lib/core/diagnosis/show";
import type { FaultTree } from "../../../lib/core/tree/schema";
import { Device } from "./logs";
import { setting } from "./random-trees";
import { cause, check, remedy, stopRule, symptom, tree } from "./small-trees";

/** Two rivals close to each other, a third far off. */
const close = tree({
  symptoms: [symptom("weak")],
  checks: [check("look", ["fine", "odd"], { minutes: 2 }), check("listen", ["quiet", "knock"], { minutes: 3 })],
  remedies: [remedy("mend-a"), remedy("mend-b")],
  causes: [
    cause("a", {
      base: "common",
      shows: { weak: "usually" },
      gives: { look: { odd: "often" }, listen: { knock: "x20" } },
      curedBy: { "mend-a": "always" },
    }),
    cause("b", { base: "common", shows: { weak: "often" }, gives: { look: { odd: "often" } }, curedBy: { "mend-b": "always" } }),
    cause("c", { base: "rare", shows: { weak: "seldom" }, curedBy: { "mend-b": "seldom" } }),
  ],
});
const told: Evidence = { ...NO_EVIDENCE, symptoms: [{ symptom: "weak", present: true }], findings: [{ check: "look", finding: "odd" }] };

describe("one word off", () => {
  it("[X10] is the next word up and down the scale, the ends have one only, and a number has the nearest words", () => {
    expect(strengthsBeside("usually")).toEqual(["nearly always", "often"]);
    expect(strengthsBeside("always")).toEqual(["nearly always"]);
    expect(strengthsBeside(0.27)).toEqual(["sometimes", "seldom"]);
    expect(linksBeside("x20")).toEqual(["x60", "x5"]);
    expect(linksBeside("x5")).toEqual(["x20", "x1"]);
    expect(linksBeside("x1/3")).toEqual(["x1", "x1/10"]);
    expect(ratesBeside("occasional")).toEqual(["common", "rare"]);
    expect(ratesBeside(5)).toEqual(["common", "occasional"]);
  });
});

describe("what the ranking hangs on", () => {
  it("[X10] names each word that would put another cause first, and what it would do is what the tree so changed does", () => {
    const moves = hangsOn(compile(close, setting), told);
    expect(moves.length).toBeGreaterThan(0);
    expect(moves.every(({ first, lead }) => first === "b" && lead > 1)).toBe(true);
    expect(moves.map(({ cause: of, to, moved }) => [of, to.kind, moved])).toContainEqual(["a", "base", "occasional"]);
    for (const { cause: of, to, moved, lead } of moves) {
      const causes = close.causes.map((one) => {
        if (one.key !== of) return one;
        if (to.kind === "base") return { ...one, base: moved as unknown as "rare" };
        if (to.kind === "symptom") return { ...one, shows: { ...one.shows, [to.key]: moved as "often" } };
        return { ...one, gives: { ...one.gives, [to.key]: { ...one.gives[to.key], [to.finding!]: moved } } };
      });
      const { shares } = believe(compile({ ...close, causes }, setting), told);
      expect(shares[1]! / shares[0]!).toBeCloseTo(lead, 10);
    }
  });

  it("[X10] says it in a sentence, strongest first", () => {
    const [first, ...others] = hangsOn(compile(close, setting), told);
    expect(others.every(({ lead }) => lead <= first!.lead)).toBe(true);
    expect(first?.says).toMatch(/^(Did|Were) \u201c[abc]\u201d .* and not .*, \u201cb\u201d would stand first\.$/);
  });

  it("[X10] names nothing where no single word would", () => {
    const settled = {
      ...told,
      findings: [...told.findings, { check: "listen", finding: "knock" }],
      remedies: [{ remedy: "mend-b", result: "no-change" as const }],
    };
    expect(hangsOn(compile(close, setting), settled)).toEqual([]);
  });
});

describe("how sure", () => {
  it("[X11] is said from what the first cause holds", () => {
    const says = (...shares: number[]) => howSure({ shares: Float64Array.from(shares) }).says;
    expect(says(0.85, 0.1, 0.05)).toBe("One cause holds 85 of 100: fairly sure.");
    expect(says(0.1, 0.6, 0.25, 0.05)).toBe("One cause holds 60 of 100: likelier than all others together, not sure.");
    expect(says(0.3, 0.3, 0.2, 0.15, 0.05)).toBe("Still open: the likeliest holds 30 of 100, and it takes 3 causes to hold most of it.");
    expect(says(0.2, 0.2, 0.6)).toBe("Something not in this tree is likelier than any one cause in it: 60 of 100 against 20 of 100.");
    expect(view(close, [new Device(1).begin({ symptoms: ["weak"] })]).possible.sure).toMatch(/ of 100/);
  });
});

describe("what would be asked next", () => {
  const log = (phone: Device) => [phone.begin({ symptoms: ["weak"], person: "mechanic" })];

  it("[X12] is for each answer the step that is then really due", () => {
    const phone = new Device(1);
    const begun = log(phone);
    const { step } = view(close, begun);
    if (step?.kind !== "check") throw new Error("a look comes first here");
    const next = askedNext(close, begun, step);
    const finds = close.checks.find(({ key }) => key === step.key)!.findings;
    expect(next.map(({ says }) => says).slice(0, -1)).toEqual(finds.map(({ title }) => title));
    finds.forEach(({ key }, index) => {
      const then = view(close, [...begun, phone.answer(step.key, key)]).step;
      expect(next[index]?.then).toMatchObject({ kind: then?.kind, key: then?.key });
    });
  });

  it("[X12] a remedy leads to the end where it cures, and on where it does not; a call leads nowhere", () => {
    const begun = log(new Device(1));
    const next = askedNext(close, begun, { kind: "remedy", key: "mend-a" });
    expect(next.map(({ then }) => then.kind)[0]).toBe("end");
    expect(next.slice(1).every(({ then }) => then.kind !== "end" && then.key !== "mend-a")).toBe(true);
    expect(askedNext(close, begun, { kind: "call", key: "call" })).toEqual([]);
  });

  it("[X12] puts a stop rule that the answer brings into force before any step", () => {
    const dangerous: FaultTree = {
      ...close,
      stopRules: [stopRule("knocking", { when: { symptoms: [], findings: [{ check: "listen", finding: "knock" }] } })],
    };
    const next = askedNext(dangerous, log(new Device(1)), { kind: "check", key: "listen" });
    expect(next.find(({ says }) => says === "knock")?.then).toEqual({ kind: "rule", key: "knocking", title: "knocking" });
    expect(next.find(({ says }) => says === "quiet")?.then.kind).not.toBe("rule");
  });
});
