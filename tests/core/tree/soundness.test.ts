import { describe, expect, test } from "vitest";
import { findFlaws, RULES } from "@/lib/core/tree/soundness";
import type { FaultTree } from "@/lib/core/tree/schema";
import { smallTree } from "../../support/small-tree";

/** One of a list, that has to be there. */
function the<T extends { key: string }>(nodes: readonly T[], key: string): T {
  const node = nodes.find((one) => one.key === key);
  if (node === undefined) throw new Error(`the small tree has no ${key}`);
  return node;
}

type Breach = { breaks: string; change: (tree: FaultTree) => void; node: string; says?: RegExp };

/** The dirty tank acts by itself, and so is a rival of the blocked filter that stands behind it otherwise. */
const asRivals =
  (change: Breach["change"]): Breach["change"] =>
  (tree) => {
    the(tree.causes, "filter-blocked").broughtOnBy = {};
    change(tree);
  };

/** Rule -> ways to break it, each by one change to a sound tree. */
const breaches: Record<string, Breach[]> = {
  "guarded-is-cured": [
    {
      breaks: "upkeep that guards a cause it does not cure",
      change: (t) => (the(t.remedies, "change-filter").upkeep = { everyHours: 200, guards: ["tank-dirty"], sources: ["judgement"] }),
      node: "remedy change-filter",
      says: /guards tank-dirty, which it does not cure/,
    },
  ],
  "guarded-once": [
    {
      breaks: "two kinds of upkeep for one cause",
      change: (t) => {
        the(t.causes, "tank-dirty").curedBy["change-filter"] = "seldom";
        for (const key of ["change-filter", "clean-tank"])
          the(t.remedies, key).upkeep = { everyHours: 200, guards: ["tank-dirty"], sources: ["judgement"] };
      },
      node: "remedy clean-tank",
    },
  ],
  "key-twice": [
    {
      breaks: "two checks with one key",
      change: (t) => void t.checks.push(structuredClone(the(t.checks, "bowl-look"))),
      node: "check bowl-look",
    },
    {
      breaks: "a remedy with a cause's key",
      change: (t) => (the(t.remedies, "clean-tank").key = "tank-dirty"),
      node: "remedy tank-dirty",
      says: /a cause has this key/,
    },
    {
      breaks: "a stop rule with a caution's key",
      change: (t) => (the(t.stopRules, "overheat").key = "fuel-ashore"),
      node: "stop rule fuel-ashore",
    },
  ],
  "unknown-drawing": [
    {
      breaks: "a drawing that nobody has drawn",
      change: (t) => (the(t.checks, "bowl-look").drawing = "separator-bowel"),
      node: "check bowl-look",
      says: /"separator-bowel".*no such drawing/,
    },
    {
      breaks: "a remedy with the name of a thing that every object has",
      change: (t) => (the(t.remedies, "clean-tank").drawing = "constructor"),
      node: "remedy clean-tank",
    },
    {
      breaks: "a stop rule with a drawing that nobody has drawn",
      change: (t) => (the(t.stopRules, "overheat").drawing = "runaway-water"),
      node: "stop rule overheat",
      says: /no such drawing/,
    },
  ],
  "part-twice": [
    {
      breaks: "two findings with one key",
      change: (t) => (the(t.checks, "bowl-look").findings[1]!.key = "bright"),
      node: "check bowl-look",
    },
    { breaks: "two options with one key", change: (t) => (the(t.features, "voltage").options[1]!.key = "v12"), node: "feature voltage" },
  ],
  "unknown-key": [
    {
      breaks: "an unknown system",
      change: (t) => (the(t.causes, "tank-dirty").system = "fule"),
      node: "cause tank-dirty",
      says: /system "fule"/,
    },
    {
      breaks: "an unknown symptom shown",
      change: (t) => (the(t.causes, "tank-dirty").shows = { "lost-rpn": "often" }),
      node: "cause tank-dirty",
      says: /symptom "lost-rpn"/,
    },
    {
      breaks: "an unknown check linked",
      change: (t) => (the(t.causes, "tank-dirty").gives["bowl-lock"] = { slime: "often" }),
      node: "cause tank-dirty",
      says: /check "bowl-lock"/,
    },
    {
      breaks: "an unknown finding linked",
      change: (t) => (the(t.causes, "tank-dirty").gives["bowl-look"] = { slimy: "often" }),
      node: "cause tank-dirty",
      says: /finding "slimy" of check bowl-look/,
    },
    {
      breaks: "an unknown remedy",
      change: (t) => (the(t.causes, "tank-dirty").curedBy = { "wash-tank": "often" }),
      node: "cause tank-dirty",
      says: /remedy "wash-tank"/,
    },
    {
      breaks: "an unknown cause behind",
      change: (t) => (the(t.causes, "tank-dirty").broughtOnBy = { growth: "often" }),
      node: "cause tank-dirty",
      says: /cause "growth"/,
    },
    {
      breaks: "an unknown caution",
      change: (t) => void the(t.checks, "bowl-look").cautions.push("no-smoking"),
      node: "check bowl-look",
      says: /caution "no-smoking"/,
    },
    {
      breaks: "an unknown source",
      change: (t) => (the(t.checks, "bowl-look").sources = ["en2 p. 3-23"]),
      node: "check bowl-look",
      says: /source "en2"/,
    },
    {
      breaks: "an unknown feature",
      change: (t) => (the(t.checks, "bowl-look").appliesTo = { features: { turbo: ["fitted"] } }),
      node: "check bowl-look",
      says: /feature "turbo"/,
    },
    {
      breaks: "an unknown option",
      change: (t) => (the(t.checks, "bowl-look").appliesTo = { features: { voltage: ["v48"] } }),
      node: "check bowl-look",
      says: /option "v48" of feature voltage/,
    },
    {
      breaks: "an unknown check to come after",
      change: (t) => (the(t.checks, "bowl-look").after = [{ check: "sea-room" }]),
      node: "check bowl-look",
      says: /"after"/,
    },
    {
      breaks: "an unknown finding to come after",
      change: (t) => (the(t.checks, "crank-volts").after = [{ check: "crank-sound", finding: "groans" }]),
      node: "check crank-volts",
      says: /finding "groans"/,
    },
    {
      breaks: "a pin for an unknown symptom",
      change: (t) => (the(t.checks, "bowl-look").firstFor = { slow: 1 }),
      node: "check bowl-look",
      says: /"firstFor"/,
    },
    {
      breaks: "a finding that restates an unknown symptom",
      change: (t) => (the(t.checks, "crank-sound").findings[1]!.restates = "chatters"),
      node: "check crank-sound",
      says: /"restates"/,
    },
    {
      breaks: "a band of an unknown finding",
      change: (t) => (the(t.checks, "filter-vacuum").reading!.bands[3]!.finding = "sky-high"),
      node: "check filter-vacuum",
      says: /finding "sky-high"/,
    },
    {
      breaks: "a stop rule on an unknown finding",
      change: (t) => (the(t.stopRules, "overheat").clearedBy = [{ check: "bowl-look", finding: "cool" }]),
      node: "stop rule overheat",
      says: /"clearedBy"/,
    },
    {
      breaks: "an unknown cause listed as inseparable",
      change: (t) => (t.inseparable = [{ causes: ["tank-dirty", "gremlins"], because: "Nobody saw one." }]),
      node: "tree small",
      says: /"inseparable"/,
    },
    {
      breaks: "a known case with an unknown cause",
      change: (t) => (the(t.knownCases, "case-1").causes = ["gremlins"]),
      node: "known case case-1",
      says: /cause "gremlins"/,
    },
  ],
  "symptom-no-cause-shows": [
    {
      breaks: "a symptom that no cause shows",
      change: (t) => (the(t.causes, "battery-flat").shows = { "lost-rpm": "seldom" }),
      node: "symptom no-crank",
    },
  ],
  "check-nothing-hangs-on": [
    {
      breaks: "a check without a link",
      change: (t) => delete the(t.causes, "filter-blocked").gives["filter-vacuum"],
      node: "check filter-vacuum",
    },
  ],
  "remedy-no-cause-needs": [
    {
      breaks: "a remedy that cures nothing",
      change: (t) => (the(t.causes, "tank-dirty").curedBy = { "change-filter": "often" }),
      node: "remedy clean-tank",
    },
  ],
  "caution-nobody-cites": [
    { breaks: "a caution that nobody cites", change: (t) => (the(t.remedies, "change-filter").cautions = []), node: "caution fuel-ashore" },
  ],
  "cause-shows-nothing": [
    { breaks: "a cause without a symptom", change: (t) => (the(t.causes, "battery-flat").shows = {}), node: "cause battery-flat" },
  ],
  unused: [
    {
      breaks: "a source that nobody cites",
      change: (t) => void t.sources.push({ key: "en2", title: "A manual", standing: "read" }),
      node: "source en2",
    },
  ],
  "usual-finding": [
    { breaks: "no usual finding", change: (t) => delete the(t.checks, "bowl-look").findings[0]!.usual, node: "check bowl-look" },
    { breaks: "two usual findings", change: (t) => (the(t.checks, "bowl-look").findings[1]!.usual = true), node: "check bowl-look" },
  ],
  "sound-adds-up": [
    {
      breaks: "more than 1 in all",
      change: (t) => Object.assign(the(t.checks, "bowl-look").findings[0]!, { sound: 0.98 }),
      node: "check bowl-look",
      says: /1\.03, more than 1/,
    },
    {
      breaks: "less than 1 where all is said",
      change: (t) => Object.assign(the(t.checks, "bowl-look").findings[0]!, { sound: 0.7 }),
      node: "check bowl-look",
      says: /less than 1/,
    },
  ],
  "usual-under-half": [
    {
      breaks: "a usual finding left with less than half",
      change: (t) => (the(t.checks, "filter-vacuum").findings[2]!.sound = 0.45),
      node: "check filter-vacuum",
      says: /0\.47/,
    },
  ],
  "bands-do-not-cover": [
    {
      breaks: "a gap",
      change: (t) => (the(t.checks, "filter-vacuum").reading!.bands[1]!.from = 3),
      node: "check filter-vacuum",
      says: /leave a gap: one ends at 2, the next begins at 3/,
    },
    {
      breaks: "an overlap",
      change: (t) => (the(t.checks, "filter-vacuum").reading!.bands[3]!.from = 24),
      node: "check filter-vacuum",
      says: /overlap/,
    },
    {
      breaks: "a start beyond the scale's",
      change: (t) => (the(t.checks, "filter-vacuum").reading!.bands[0]!.from = 1),
      node: "check filter-vacuum",
      says: /begins at 0/,
    },
    {
      breaks: "an end before the scale's",
      change: (t) => (the(t.checks, "filter-vacuum").reading!.bands[3]!.to = 50),
      node: "check filter-vacuum",
      says: /ends at 60/,
    },
    {
      breaks: "a band turned round",
      change: (t) => Object.assign(the(t.checks, "filter-vacuum").reading!.bands[0]!, { to: -1 }),
      node: "check filter-vacuum",
      says: /runs from 0 to -1/,
    },
    {
      breaks: "a gap for one kind of engine only",
      change: (t) => (the(t.checks, "crank-volts").reading!.bands[3]!.from = 20),
      node: "check crank-volts",
      says: /for voltage v24/,
    },
    {
      breaks: "no band at all for one kind of engine",
      change: (t) => void the(t.checks, "crank-volts").reading!.bands.splice(2, 2),
      node: "check crank-volts",
      says: /for voltage v24: there are no bands/,
    },
  ],
  "unit-unknown": [
    {
      breaks: "a unit nobody knows",
      change: (t) => (the(t.checks, "filter-vacuum").reading!.unit = "furlong"),
      node: "check filter-vacuum",
    },
    {
      breaks: "a unit of another quantity",
      change: (t) => (the(t.checks, "filter-vacuum").reading!.unit = "V"),
      node: "check filter-vacuum",
      says: /unit of voltage/,
    },
  ],
  "cause-without-remedy": [
    { breaks: "a cause without a remedy", change: (t) => (the(t.causes, "battery-flat").curedBy = {}), node: "cause battery-flat" },
  ],
  "cause-without-telling-check": [
    {
      breaks: "a cause without a link",
      change: (t) => (the(t.causes, "tank-dirty").gives = {}),
      node: "cause tank-dirty",
      says: /no check is linked/,
    },
    {
      breaks: "a cause with weak links only",
      change: (t) => (the(t.causes, "tank-dirty").gives = { "bowl-look": { slime: "x3" } }),
      node: "cause tank-dirty",
      says: /slime of bowl-look, only 2\.7 times/,
    },
  ],
  "row-over-one": [
    {
      breaks: "findings that add up to more than 1",
      change: (t) => (the(t.causes, "battery-flat").gives["crank-sound"] = { chatter: "usually", nothing: "sometimes" }),
      node: "cause battery-flat",
      says: /1\.13/,
    },
  ],
  "row-short-of-one": [
    {
      breaks: "strengths for all findings that fall short",
      change: (t) => (the(t.causes, "tank-dirty").gives["bowl-look"] = { slime: "often", bright: "seldom" }),
      node: "cause tank-dirty",
      says: /0\.78/,
    },
  ],
  "finding-linked-twice": [
    {
      breaks: "a finding inside a span linked again",
      change: (t) => (the(t.causes, "filter-blocked").gives["filter-vacuum"]!.high = "often"),
      node: "cause filter-blocked",
    },
  ],
  "span-unknown": [
    {
      breaks: "a span of a check without bands",
      change: (t) => (the(t.causes, "tank-dirty").gives["bowl-look"] = { "bright..slime": "often" }),
      node: "cause tank-dirty",
      says: /no span of bands/,
    },
    {
      breaks: "a span of one",
      change: (t) => (the(t.causes, "filter-blocked").gives["filter-vacuum"] = { "high..high": "often" }),
      node: "cause filter-blocked",
    },
  ],
  "brought-on-by-cycle": [
    {
      breaks: "a cause that brings itself on",
      change: (t) => (the(t.causes, "tank-dirty").broughtOnBy = { "filter-blocked": "seldom" }),
      node: "cause filter-blocked",
      says: /filter-blocked by tank-dirty by filter-blocked/,
    },
  ],
  "link-says-nothing": [
    {
      breaks: "a link that moves nothing",
      change: (t) => (the(t.causes, "battery-flat").gives["bowl-look"] = { slime: 0.051 }),
      node: "cause battery-flat",
    },
  ],
  "precedence-cycle": [
    {
      breaks: "steps that wait for each other",
      change: (t) => (the(t.checks, "crank-sound").after = [{ check: "crank-volts" }]),
      node: "check crank-volts",
      says: /crank-volts after crank-sound after crank-volts/,
    },
  ],
  "pins-tie": [
    {
      breaks: "two checks that are both first",
      change: (t) => (the(t.checks, "crank-sound").firstFor = { "lost-rpm": 1 }),
      node: "check crank-sound",
    },
  ],
  "symptom-without-a-look": [
    {
      breaks: "a first check that needs tools",
      change: (t) => (the(t.checks, "filter-vacuum").firstFor = { "no-crank": 1 }),
      node: "symptom no-crank",
      says: /vacuum gauge/,
    },
    {
      breaks: "causes that only tools can tell",
      change: (t) => delete the(t.causes, "battery-flat").gives["crank-sound"],
      node: "symptom no-crank",
      says: /linked to its cause/,
    },
    {
      breaks: "a look that speaks of one cause only",
      change: (t) => delete the(t.causes, "tank-dirty").gives["bowl-look"],
      node: "symptom lost-rpm",
      says: /linked to 2 of its causes/,
    },
    {
      breaks: "a look that the symptom rules out",
      change: (t) => (the(t.symptoms, "lost-rpm").rulesOut = ["stopped"]),
      node: "symptom lost-rpm",
    },
  ],
  "phrase-twice": [
    {
      breaks: "one phrase in two symptoms",
      change: (t) => (the(t.symptoms, "no-crank").phrases[0] = "No top end!"),
      node: "symptom no-crank",
      says: /symptom lost-rpm too/,
    },
    {
      breaks: "one phrase twice in a symptom",
      change: (t) => void the(t.symptoms, "no-crank").phrases.push("Dead"),
      node: "symptom no-crank",
      says: /stands twice/,
    },
  ],
  "strays-heavy": [
    {
      breaks: "a symptom that only one very rare cause shows",
      change: (t) => (the(t.causes, "battery-flat").base = 0.01),
      node: "symptom no-crank",
      says: /%/,
    },
  ],
  "rare-in-vain": [
    {
      breaks: "a symptom called rare that common causes show",
      change: (t) => (the(t.symptoms, "no-crank").rare = "Few engines are as silent as this."),
      node: "symptom no-crank",
      says: /often enough/,
    },
  ],
  "state-against-flags": [
    { breaks: "cranking a stopped engine", change: (t) => (the(t.checks, "crank-sound").engine = "stopped"), node: "check crank-sound" },
    {
      breaks: "cranking without seconds",
      change: (t) => (the(t.checks, "crank-sound").flags = {}),
      node: "check crank-sound",
      says: /for how long/,
    },
    {
      breaks: "a held stop without cranking",
      change: (t) => (the(t.checks, "bowl-look").flags = { fuelOff: true }),
      node: "check bowl-look",
    },
    {
      breaks: "a held stop on a running engine",
      change: (t) => (the(t.checks, "crank-volts").engine = "idling"),
      node: "check crank-volts",
      says: /cannot run/,
    },
    {
      breaks: "load without the engine under load",
      change: (t) => (the(t.checks, "bowl-look").flags = { underLoad: true }),
      node: "check bowl-look",
    },
    {
      breaks: "the engine under load without the flag",
      change: (t) => (the(t.checks, "filter-vacuum").flags = {}),
      node: "check filter-vacuum",
    },
    {
      breaks: "hands at a turning shaft",
      change: (t) => Object.assign(the(t.checks, "bowl-look"), { engine: "idling", flags: { handsAtShaft: true } }),
      node: "check bowl-look",
    },
    {
      breaks: "a swimmer with the engine turning",
      change: (t) => Object.assign(the(t.checks, "bowl-look"), { engine: "idling", flags: { inWater: true } }),
      node: "check bowl-look",
    },
    {
      breaks: "coolant opened under load",
      change: (t) => Object.assign(the(t.checks, "filter-vacuum").flags, { opensCoolant: true }),
      node: "check filter-vacuum",
    },
    {
      breaks: "a hose below water open on a running engine",
      change: (t) => Object.assign(the(t.checks, "bowl-look"), { engine: "idling", flags: { opensHoseBelowWater: true } }),
      node: "check bowl-look",
    },
  ],
  "hazard-without-who": [
    {
      breaks: "high-pressure fuel for a skipper",
      change: (t) =>
        Object.assign(the(t.checks, "bowl-look"), {
          flags: { opensHighPressureFuel: true },
          appliesTo: { features: { injection: ["in-line-pump"] } },
        }),
      node: "check bowl-look",
    },
    {
      breaks: "open belts under load for a skipper",
      change: (t) => Object.assign(the(t.checks, "filter-vacuum").flags, { beltsExposed: true }),
      node: "check filter-vacuum",
    },
  ],
  "union-on-a-rail": [
    {
      breaks: "unions on any engine",
      change: (t) => Object.assign(the(t.checks, "bowl-look"), { flags: { opensHighPressureFuel: true }, who: "mechanic" }),
      node: "check bowl-look",
    },
    {
      breaks: "unions on a common rail",
      change: (t) =>
        Object.assign(the(t.checks, "bowl-look"), {
          flags: { opensHighPressureFuel: true },
          who: "mechanic",
          appliesTo: { features: { injection: ["in-line-pump", "common-rail"] } },
        }),
      node: "check bowl-look",
    },
  ],
  "harm-without-flag": [
    {
      breaks: "suction opened without the flag",
      change: (t) => (the(t.remedies, "change-filter").flags = {}),
      node: "remedy change-filter",
    },
    {
      breaks: "a hose below water without the flag",
      change: (t) => (the(t.remedies, "charge-battery").harm = "opens-hose-below-water"),
      node: "remedy charge-battery",
    },
    {
      breaks: "injection opened without the flag",
      change: (t) => (the(t.remedies, "charge-battery").harm = "opens-injection"),
      node: "remedy charge-battery",
    },
  ],
  "flag-forgotten": [
    {
      breaks: "words that crank without the flag",
      change: (t) => (the(t.checks, "bowl-look").steps = ["Press start and look."]),
      node: "check bowl-look",
      says: /"cranks"/,
    },
  ],
  "safety-said-twice": [
    {
      breaks: "a seacock shut by hand and by flag",
      change: (t) => Object.assign(the(t.checks, "bowl-look"), { flags: { opensRawWater: true }, steps: ["Shut the seacock.", "Look."] }),
      node: "check bowl-look",
    },
  ],
  "stop-rule-without-trigger": [
    {
      breaks: "a rule that nothing brings into force",
      change: (t) => (the(t.stopRules, "overheat").when = { symptoms: [], findings: [] }),
      node: "stop rule overheat",
    },
  ],
  "stop-rule-never-asked": [
    { breaks: "a rule without its question", change: (t) => delete the(t.stopRules, "overheat").ask, node: "stop rule overheat" },
  ],
  "stop-rule-never-cleared": [
    {
      breaks: "a rule that nothing clears",
      change: (t) => delete the(t.stopRules, "hydraulic-lock").clearedWhen,
      node: "stop rule hydraulic-lock",
    },
  ],
  "stop-rule-forbids-too-little": [
    {
      breaks: "a stop that lets the engine idle",
      change: (t) => (the(t.stopRules, "overheat").forbids = ["cranking", "under-load"]),
      node: "stop rule overheat",
      says: /forbid idling/,
    },
  ],
  "stop-rule-runs-on-what-stands": [
    {
      breaks: "running on with an engine that was cranked in vain",
      change: (t) => {
        const rule = the(t.stopRules, "hydraulic-lock");
        rule.when = { symptoms: [], findings: [], crankSeconds: 30 };
        rule.runOnIfStoppingEndangers = true;
      },
      node: "stop rule hydraulic-lock",
    },
    {
      breaks: "running on with an engine that does not turn",
      change: (t) => {
        the(t.symptoms, "no-crank").rulesOut = ["idling", "under-load"];
        the(t.stopRules, "hydraulic-lock").runOnIfStoppingEndangers = true;
      },
      node: "stop rule hydraulic-lock",
    },
  ],
  "stop-rule-without-exception": [
    {
      breaks: "a stop on a lee shore",
      change: (t) => (the(t.stopRules, "overheat").runOnIfStoppingEndangers = false),
      node: "stop rule overheat",
    },
  ],
  "stop-rule-runs-on-in-mortal-danger": [
    {
      breaks: "a fire to run on through",
      change: (t) => (the(t.stopRules, "overheat").key = "engine-fire"),
      node: "stop rule engine-fire",
    },
  ],
  "rival-not-told-apart": [
    {
      breaks: "a rival whose every finding the other shows too",
      change: asRivals((t) => (the(t.causes, "filter-blocked").gives["filter-vacuum"] = { "very-high": 0.5, high: 0.1 })),
      node: "cause tank-dirty",
      says: /after lost-rpm, on the commonest engine, no finding speaks for it against its likely rival filter-blocked/,
    },
    {
      breaks: "a telling finding that is seen too seldom to wait for",
      change: asRivals((t) => {
        the(t.causes, "filter-blocked").gives = { "filter-vacuum": { "near-zero": 0.3 } };
        the(t.causes, "tank-dirty").gives = { "bowl-look": { slime: 0.7 } };
      }),
      node: "cause filter-blocked",
    },
    {
      breaks: "a telling finding that only says the symptom again",
      change: asRivals((t) => (the(t.checks, "filter-vacuum").findings[1]!.restates = "lost-rpm")),
      node: "cause tank-dirty",
    },
  ],
  "inseparable-unlisted": [
    {
      breaks: "two rivals that no check tells apart",
      change: asRivals((t) => delete the(t.causes, "filter-blocked").gives["filter-vacuum"]),
      node: "cause filter-blocked",
      says: /after lost-rpm, on the commonest engine, no check tells it and tank-dirty apart/,
    },
    {
      breaks: "a check that one common kind of engine cannot have",
      change: asRivals((t) => (the(t.checks, "filter-vacuum").appliesTo = { features: { voltage: ["v12"] } })),
      node: "cause filter-blocked",
      says: /on an engine with voltage v24/,
    },
    {
      breaks: "a check in an engine state that the symptom rules out",
      change: asRivals((t) => (the(t.symptoms, "lost-rpm").rulesOut = ["under-load"])),
      node: "cause filter-blocked",
    },
    {
      breaks: "a check that would open a common rail",
      change: asRivals((t) => (the(t.checks, "filter-vacuum").flags = { opensHighPressureFuel: true })),
      node: "cause filter-blocked",
      says: /on an engine with injection common-rail/,
    },
  ],
  "inseparable-in-vain": [
    {
      breaks: "a listed pair that checks tell apart",
      change: asRivals((t) => (t.inseparable = [{ causes: ["tank-dirty", "filter-blocked"], because: "Both are dirt." }])),
      node: "cause tank-dirty",
      says: /checks tell them apart/,
    },
    {
      breaks: "a listed pair that no symptom brings together",
      change: (t) => (t.inseparable = [{ causes: ["tank-dirty", "battery-flat"], because: "Both are old." }]),
      node: "cause tank-dirty",
      says: /no symptom makes both likely/,
    },
    {
      breaks: "a pair listed twice",
      change: asRivals((t) => {
        delete the(t.causes, "filter-blocked").gives["filter-vacuum"];
        t.inseparable = [
          { causes: ["tank-dirty", "filter-blocked"], because: "Both are dirt." },
          { causes: ["filter-blocked", "tank-dirty"], because: "Both are dirt." },
        ];
      }),
      node: "cause filter-blocked",
      says: /lists it and tank-dirty twice/,
    },
  ],
  "known-case-reading": [
    {
      breaks: "a finding with nothing said",
      change: (t) => (the(t.knownCases, "case-1").findings = [{ check: "bowl-look", when: "after" }]),
      node: "known case case-1",
    },
    {
      breaks: "a value of a look",
      change: (t) => (the(t.knownCases, "case-1").findings = [{ check: "bowl-look", value: 3, unit: "kPa", when: "after" }]),
      node: "known case case-1",
    },
    {
      breaks: "a value in a unit of something else",
      change: (t) => (the(t.knownCases, "case-1").findings[0]!.unit = "V"),
      node: "known case case-1",
    },
  ],
};

test("a sound tree has no flaws", () => {
  expect(findFlaws(smallTree())).toEqual([]);
});

test("every rule has a breach that shows it at work", () => {
  expect(Object.keys(breaches).sort()).toEqual(RULES.map(({ name }) => name).sort());
});

describe.each(Object.entries(breaches))("%s", (rule, ways) => {
  test.each(ways)("finds $breaks", ({ change, node, says }) => {
    const tree = smallTree();
    change(tree);
    const found = findFlaws(tree).filter((flaw) => flaw.rule === rule);
    const named = found.find((flaw) => `${flaw.node.kind} ${flaw.node.key}` === node);
    expect(found.map((flaw) => `${flaw.node.kind} ${flaw.node.key}`)).toContain(node);
    expect(named?.mend).toMatch(/^[A-Z].+[.?]$/);
    if (says !== undefined) expect(found.map((flaw) => flaw.says).join("\n")).toMatch(says);
  });
});

test("rivals that checks tell apart both ways are no flaw", () => {
  const tree = smallTree();
  the(tree.causes, "filter-blocked").broughtOnBy = {};
  expect(findFlaws(tree)).toEqual([]);
});

test("a pair that no check tells apart may stand once it is listed with its reason", () => {
  const tree = smallTree();
  the(tree.causes, "filter-blocked").broughtOnBy = {};
  delete the(tree.causes, "filter-blocked").gives["filter-vacuum"];
  tree.inseparable = [{ causes: ["tank-dirty", "filter-blocked"], because: "The same dirt, and the same cure in the end." }];
  const rules = findFlaws(tree).map(({ rule }) => rule);
  expect(rules.filter((rule) => /rival|inseparable/.test(rule))).toEqual([]);
});

test("a pair told apart one way only may be listed too", () => {
  const tree = smallTree();
  the(tree.causes, "filter-blocked").broughtOnBy = {};
  the(tree.causes, "filter-blocked").gives["filter-vacuum"] = { "very-high": 0.5, high: 0.1 };
  tree.inseparable = [{ causes: ["tank-dirty", "filter-blocked"], because: "The same dirt, and the same cure in the end." }];
  expect(findFlaws(tree)).toEqual([]);
});

test("a symptom that few engines show may stand once it says why", () => {
  const tree = smallTree();
  the(tree.causes, "battery-flat").base = 0.01;
  expect(findFlaws(tree).map(({ rule }) => rule)).toContain("strays-heavy");
  the(tree.symptoms, "no-crank").rare = "One cause alone, and that a rare one.";
  expect(findFlaws(tree).map(({ rule }) => rule)).not.toContain("strays-heavy");
});

test("errors come before what is only to be looked at", () => {
  const tree = smallTree();
  the(tree.causes, "battery-flat").curedBy = {};
  const severities = findFlaws(tree).map(({ severity }) => severity);
  expect(severities).toEqual([...severities].sort());
  expect(severities[0]).toBe("error");
});

test("a misspelt key is met with the one that was meant", () => {
  const tree = smallTree();
  the(tree.causes, "tank-dirty").curedBy = { "cleen-tank": "often" };
  expect(findFlaws(tree).find(({ rule }) => rule === "unknown-key")?.mend).toBe('Did you mean "clean-tank"?');
});
