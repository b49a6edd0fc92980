import type { Look } from "./review-look";

export type ReviewItem = { item: number; about: string; must: Readonly<Record<string, (l: Look) => boolean>> };

const CRANK_TESTS = [
  "neutral-wiggle",
  "start-signal-volts",
  "start-circuit-step",
  "start-bridge",
  "crank-volts",
  "volts-at-starter",
  "drop-positive",
  "positive-step",
  "drop-negative",
  "crank-rpm",
  "starter-amps",
  "hot-lug",
  "lift-pump-squirt",
  "compression",
  "wet-compression",
  "raw-pump-outlet",
];
/** Kinds of step that may turn an engine over without a look at what a heavy clunk means. */
const AFTER_BAR_OVER = (l: Look, kind: "check" | "remedy", key: string) =>
  l[kind](key).after.some((before) => "check" in before && before.check === "bar-over" && before.finding === "even");
const NO_RUN_ON = ["fire", "co", "runaway", "fuel-mist"];
/** Rules about an engine that stands already, or that would race: there is nothing to run on with. */
const STANDS_ALREADY = [
  "no-restart-after-runaway",
  "stopped-with-a-bang",
  "runaway-oil-in-intake",
  "hydraulic-lock",
  "crank-floods-exhaust",
  "starter-limit",
  "petrol-in-fuel",
  "salt-in-coolant",
  "timing-jumped",
  "water-on-the-pistons",
  "water-past-separator",
  "turbo-wheel-touches",
];

export const REVIEW_ITEMS: readonly ReviewItem[] = [
  {
    item: 1,
    about: "no question before the first step slackens a pipe",
    must: {
      "no symptom or rule asks for it": (l) =>
        [...l.tree.symptoms.map(({ title, detail }) => `${title} ${detail}`), ...l.tree.stopRules.map(({ key }) => l.ruleWords(key))].every(
          (text) => !/slacken (a|the|each|one) (pipe|union|injector|nut)/i.test(text),
        ),
      "the miss is asked by its beat and its warmth": (l) =>
        l.finding("miss-beat", "regular-cold") !== undefined && l.check("miss-beat").who === "skipper-at-sea",
      "cylinders are cut out by a mechanic on a mechanical pump only": (l) =>
        l.mechanic(l.check("cylinder-cutout")) && l.onlyInjection(l.check("cylinder-cutout"), "in-line-pump", "rotary-pump"),
    },
  },
  {
    item: 2,
    about: "the seven dangerous checks are not a skipper's",
    must: Object.fromEntries(
      ["cylinder-cutout", "can-inject-side", "leakdown", "injector-out-spin", "injector-swap", "exhaust-disconnect", "start-bridge"].map(
        (key) => [key, (l: Look) => l.mechanic(l.check(key))],
      ),
    ),
  },
  {
    item: 3,
    about: "the lever at start: moored, stop held, a few degrees, two seconds",
    must: {
      "stop held": (l) => l.check("neutral-wiggle").flags.fuelOff === true,
      "two seconds at most": (l) => (l.check("neutral-wiggle").flags.cranks ?? 9) <= 2,
      "not under way": (l) => l.check("neutral-wiggle").appliesTo?.situations?.includes("under-way") === false,
      "the words": (l) =>
        ["Moored", "throttle closed", "nobody in the water", "a few degrees"].every((w) => l.words(l.check("neutral-wiggle")).includes(w)),
    },
  },
  {
    item: 4,
    about: "a gland is never touched turning",
    must: {
      "eased and nipped with the engine off, one flat": (l) =>
        ["gland-ease", "gland-nip"].every(
          (k) =>
            l.remedy(k).flags.handsAtShaft === true && /Engine off, key out[^]*one flat at most; spanners away/.test(l.words(l.remedy(k))),
        ),
      "read by infrared, or stopped": (l) =>
        ["gland-ease", "gland-nip"].every((k) => /infrared, or stop and then feel/.test(l.words(l.remedy(k)))) &&
        /without one, stop the engine, key out/.test(l.words(l.check("gland-temperature"))),
      "drops are counted from arm's length": (l) => /arm's length/.test(l.words(l.check("gland-drip"))),
    },
  },
  {
    item: 5,
    about: "water coming in",
    must: {
      "a symptom and a rule on every first screen": (l) =>
        l.asks("flooding", "water-in-engine-space") && l.rule("flooding").when.symptoms === "*",
      "stop, seacock, pumps, trace, MAYDAY": (l) =>
        /Stop the engine, shut its seacock, all pumps on[^]*raw-water hose, exhaust hose, muffler, heat exchanger, stern gland, saildrive boot[^]*gains on the pumps, MAYDAY/.test(
          l.ruleWords("flooding"),
        ),
      "a hose off and an exhaust leak are causes": (l) =>
        l.shows("raw-hose-off", "water-in-engine-space") && l.shows("exhaust-hose-leak", "water-in-engine-space"),
      "salt in the bilge brings it on": (l) => l.broughtBy("flooding", "bilge-look", "salt"),
    },
  },
  {
    item: 6,
    about: "in the water at anchor only",
    must: {
      "every swim": (l) =>
        l
          .steps()
          .filter((s) => s.flags.inWater)
          .every(
            (s) =>
              s.appliesTo?.situations?.join() === "at-anchor" &&
              /engine stopped, gear in neutral, sails down, the engine key on the swimmer, a helper watching, a floating line/.test(
                l.shown(s),
              ) &&
              /Never go into the water in a marina or near shore power/.test(l.shown(s)),
          ),
      cutting: (l) => l.cautions(l.remedy("clear-prop")).includes("knife-and-line") && !/drift/i.test(l.words(l.remedy("clear-prop"))),
      "looks from above": (l) => l.check("hull-look").flags.inWater !== true && l.check("keel-cooler-look").flags.inWater !== true,
    },
  },
  {
    item: 7,
    about: "no burst astern for a rope",
    must: {
      "neutral and stop first, then by hand": (l) =>
        /^Neutral and stop first, key out\. No burst astern/.test(l.check("shaft-by-hand").steps[0] ?? ""),
      "only with a free end and a slack line": (l) =>
        /free end in hand and the line slack, dead slow for 2 to 3 seconds/.test(l.caution("no-astern-burst").says),
      "on check and remedy": (l) =>
        l.cautions(l.check("shaft-by-hand")).includes("no-astern-burst") && l.cautions(l.remedy("clear-prop")).includes("no-astern-burst"),
      "coupling, mounts, gland after it": (l) => /coupling, mounts and gland/.test(l.words(l.check("shaft-by-hand"))),
    },
  },
  {
    item: 8,
    about: "petrol in the tank",
    must: {
      "no spark, people ashore, professionals": (l) =>
        /People ashore[^]*No starter, no switch, no charger, no bilge pump, no cooker[^]*explosion-safe/.test(
          l.ruleWords("petrol-in-fuel"),
        ),
      "brought on by what is in the jar, and nothing is done under it": (l) =>
        l.broughtBy("petrol-in-fuel", "fuel-jar", "petrol-or-solvent") && l.rule("petrol-in-fuel").forbids.includes("stopped"),
      "the remedy is not the owner's": (l) => l.remedy("drain-wrong-fuel").who === "workshop",
      "proved by weight, not by smell alone": (l) => /weighs/.test(l.remedy("drain-wrong-fuel").proof),
      "its effects": (l) =>
        ["starts-then-dies", "misfire-rough", "fades-and-stops", "cranks-no-start-smoke"].every((s) => l.shows("wrong-fuel", s)),
    },
  },
  {
    item: 9,
    about: "nothing is tasted",
    must: {
      "the looks that ask what a fluid is": (l) =>
        [
          "injector-out-spin",
          "coolant-strip",
          "coolant-strength",
          "bilge-look",
          "oil-water-kind",
          "water-trace",
          "charge-cooler-drain",
        ].every((k) => l.cautions(l.check(k)).includes("never-taste")),
      "salt by strip or crystals": (l) => /salt strip, or dry a drop on glass/.test(l.caution("never-taste").says),
      "coolant by an instrument": (l) => /chloride strip/.test(l.words(l.check("coolant-strip"))),
    },
  },
  {
    item: 10,
    about: "the seacock in a cranking series, and one sum of seconds",
    must: {
      "tests that must not fire hold the stop and shut the seacock": (l) =>
        CRANK_TESTS.every((k) => l.check(k).flags.fuelOff === true && /[Ss]hut the raw-water seacock/.test(l.shown(l.check(k)))),
      "opened before any attempt to run": (l) => /Open the seacock/.test(l.shown(l.check("crank-volts"))),
      "every cranking step tells its seconds": (l) =>
        l
          .steps()
          .filter((s) => s.engine === "cranking")
          .every((s) => s.flags.cranks !== undefined),
      "the sum brings the rule": (l) => l.rule("crank-floods-exhaust").when.crankSeconds === 30,
    },
  },
  {
    item: 11,
    about: "10 s bursts, 60 s rest, 30 s in all",
    must: {
      "no step asks for more than ten at a time on a wet exhaust": (l) =>
        l.steps().every((s) => s.flags.cranks === undefined || /Crank \d+ s(,| in all, in bursts of 10 s)/.test(l.shown(s))),
      "shut and drain": (l) =>
        /Shut the sea-water seacock[^]*drain the muffler[^]*10 seconds at most, 60 seconds of rest/.test(
          l.ruleWords("crank-floods-exhaust"),
        ),
      "small starters": (l) =>
        /10 to 15 seconds at a time/.test(l.ruleWords("starter-limit")) && l.rule("starter-limit").when.crankSeconds === 30,
      "no fifth or tenth try": (l) => l.steps().every((s) => !/(ten|five|fifth|tenth) (tries|try)/i.test(l.words(s))),
    },
  },
  {
    item: 12,
    about: "bleeding the pipes",
    must: {
      "a mechanic on a mechanical pump": (l) =>
        l.mechanic(l.remedy("bleed-high")) && l.onlyInjection(l.remedy("bleed-high"), "in-line-pump", "rotary-pump"),
      "neutral, one third, one union, half a turn, before it fires": (l) =>
        /Gearbox in neutral, throttle one third[^]*one union at the injector half a turn with two spanners[^]*before it fires[^]*Throttle back at the first beat/.test(
          l.words(l.remedy("bleed-high")),
        ),
    },
  },
  {
    item: 13,
    about: "people, boat, engine",
    must: {
      "every stop rule knows the exception but four": (l) =>
        l.tree.stopRules.every(({ key, runOnIfStoppingEndangers: runOn }) => runOn === ![...NO_RUN_ON, ...STANDS_ALREADY].includes(key)),
      "people before boat before engine in the first rule": (l) =>
        /^People[^]*Boat/.test(l.rule("sea-room").says.join("\n")) && l.rule("sea-room").when.symptoms === "*",
      "no rule of a standing engine is one that says stop": (l) => STANDS_ALREADY.every((k) => l.rule(k).kind !== "stop"),
      "the keys exist": (l) => [...NO_RUN_ON, ...STANDS_ALREADY].every((k) => l.rule(k) !== undefined),
    },
  },
  {
    item: 14,
    about: "a heavy clunk before more power",
    must: {
      "bridging and tapping wait for two turns by hand": (l) =>
        AFTER_BAR_OVER(l, "check", "start-bridge") && AFTER_BAR_OVER(l, "remedy", "tap-solenoid"),
      "the clunk forbids cranking": (l) =>
        l.broughtBy("hydraulic-lock", "press-start", "clunk") &&
        l.broughtBy("hydraulic-lock", "crank-sound", "clunk-stops") &&
        l.rule("hydraulic-lock").forbids.includes("cranking"),
      "paralleling and jumping crank, so the rule takes them away": (l) =>
        l.check("battery-swap").flags.cranks !== undefined && l.remedy("jump-start").flags.cranks !== undefined,
      "asked before a click is looked at": (l) =>
        l.asks("hydraulic-lock", "no-crank-click") && /nor jump, bridge or tap/.test(l.ruleWords("hydraulic-lock")),
      "a chatter may go straight on": (l) => !l.broughtBy("hydraulic-lock", "press-start", "chatter"),
    },
  },
  {
    item: 15,
    about: "turning it by hand",
    must: {
      "seacock shut": (l) => l.check("bar-over").flags.opensRawWater === true,
      "decompressor closed, wrist, normal way, two turns": (l) =>
        /Stop control pulled, key out, gear lever in neutral, decompression lever closed[^]*only the way the engine runs, by the strength of the wrist[^]*two full turns/.test(
          l.words(l.check("bar-over")),
        ),
      "no reverse anywhere": (l) =>
        l.tree.stopRules.every(({ key }) => !/other way\?|backwards\?/.test(l.ruleWords(key))) &&
        /only the way the engine runs/.test(l.caution("bar-by-wrist").says),
      "a solid stop is a lock": (l) => l.broughtBy("hydraulic-lock", "bar-over", "stops-dead"),
      "valve work with it closed too": (l) => /decompression lever closed/.test(l.words(l.check("valve-clearance"))),
    },
  },
  {
    item: 16,
    about: "the hose off the elbow",
    must: {
      "a mechanic, alongside, overboard, nobody below, ten seconds": (l) =>
        l.mechanic(l.check("exhaust-disconnect")) &&
        l.check("exhaust-disconnect").appliesTo?.situations?.join() === "alongside" &&
        /raw water overboard[^]*nobody below[^]*ten seconds in all, stop/i.test(l.words(l.check("exhaust-disconnect"))),
      "fans and extinguisher": (l) =>
        l.cautions(l.check("exhaust-disconnect")).includes("hose-off-elbow") &&
        /fans on, extinguisher ready/.test(l.caution("hose-off-elbow").says),
      "a skipper looks and measures": (l) =>
        l.check("elbow-inspect").who === "skipper-in-port" && l.check("back-pressure").who === "skipper-in-port",
    },
  },
  {
    item: 17,
    about: "a runaway",
    must: {
      "from outside its line, key, decompressor, a rigid plate, CO2 from outside": (l) =>
        /From outside its line: stop lever, key off, decompressor[^]*rigid flat plate[^]*CO2 into the intake from outside[^]*Never a hand, rag or cushion/.test(
          l.ruleWords("runaway"),
        ),
      "a few seconds, then out": (l) => /Not possible in a few seconds, everyone out, hatch shut/.test(l.ruleWords("runaway")),
      "never loaded": (l) =>
        /Never load it to stop it/.test(l.ruleWords("runaway")) && /Never load it to stop it/.test(l.ruleWords("runaway-oil-in-intake")),
      "nothing is done beside it": (l) => l.rule("runaway").forbids.includes("stopped"),
    },
  },
  {
    item: 18,
    about: "it will not stop",
    must: {
      "the order": (l) =>
        /Throttle to idle[^]*stop lever at the injection pump, by hand[^]*decompressor[^]*fuel cock, which takes minutes[^]*plate over the air intake[^]*Never the battery switch/.test(
          l.ruleWords("wont-stop"),
        ),
      "asked with its symptom, and a racing one is a runaway": (l) => l.asks("wont-stop", "wont-stop") && l.asks("runaway", "wont-stop"),
      "the lever is known beforehand": (l) => /card by the hatch/.test(l.words(l.check("stop-control-run"))),
    },
  },
  {
    item: 19,
    about: "the seacock after a dry run",
    must: {
      "cool first, hoses looked at, water seen, looked for leaks": (l) =>
        /hand rests on head and elbow[^]*exhaust hose and the silencer for scorch[^]*see the water[^]*hoses inside the boat for drips/.test(
          l.words(l.remedy("open-seacock")),
        ) && l.cautions(l.remedy("open-seacock")).includes("dry-run-cool"),
      "not into a hot engine": (l) => /Do not open it into a hot engine/.test(l.finding("seacock-look", "shut").says ?? ""),
      "water in 20 s": (l) => /within 20 seconds/.test(l.remedy("open-seacock").proof),
    },
  },
  {
    item: 20,
    about: "shut first, open last",
    must: {
      "what opens the raw circuit": (l) =>
        [
          l.check("endcap-look"),
          l.check("elbow-inspect"),
          l.check("raw-pump-outlet"),
          l.check("strainer-look"),
          l.check("impeller-look"),
          l.check("oil-cooler-look"),
          l.check("raw-pump-turns"),
          ...["hx-clean", "clear-cooler-debris", "decoke-elbow", "raw-pump", "impeller", "exhaust-hose", "raw-hose", "renew-elbow"].map(
            l.remedy,
          ),
        ].every((s) => s.flags.opensRawWater === true),
      "both steps are written": (l) => {
        const text = l.shown(l.remedy("hx-clean"));
        return /Shut the raw-water seacock, and the exhaust cock[^]*hang the engine key on its handle[^]*Open the seacock[^]*count[^]*within 20 s[^]*again after 10 min/.test(
          text,
        );
      },
      "no inlet is rodded open below the waterline": (l) =>
        /only where the hose end can be held above the waterline/.test(l.words(l.remedy("clear-inlet"))),
    },
  },
  {
    item: 21,
    about: "no oil pressure",
    must: {
      "stopped, not revved": (l) => /Stop it\. Do not rev it to see/.test(l.ruleWords("no-oil-pressure")),
      "one start at idle": (l) =>
        /one start, at idle\. Lamp out within 5 seconds/.test(l.ruleWords("no-oil-pressure")) &&
        /loose or with two gaskets/.test(l.ruleWords("no-oil-pressure")),
      "hot idle by a gauge later": (l) => /only at hot idle is judged later with a mechanical gauge/.test(l.ruleWords("no-oil-pressure")),
    },
  },
  {
    item: 22,
    about: "hot coolant",
    must: {
      "the hand and the soft hose, over every open cap": (l) =>
        l
          .steps()
          .filter((s) => s.flags.opensCoolant)
          .every((s) => /bare hand on the header tank and press the hose/.test(l.shown(s))),
      "no cloth, no half turn, filled stopped": (l) =>
        /No cloth and no half turn[^]*/.test(l.shown(l.remedy("top-coolant"))) &&
        /Fill with the engine stopped/.test(l.shown(l.remedy("top-coolant"))),
      "every one that opens the cap is cold or from cold": (l) =>
        ["combustion-gas-dye", "coolant-bubbles", "coolant-flow"].every((k) => /from cold|stone cold/.test(l.words(l.check(k)))),
      "felt by infrared": (l) =>
        l.check("thermostat-warm").tools.some((tool) => /infrared/i.test(tool)) && /Not by hand/.test(l.words(l.check("thermostat-warm"))),
    },
  },
  {
    item: 23,
    about: "the starter runs on",
    must: {
      "rule, symptom, battery switch off even running": (l) =>
        l.asks("starter-runs-on", "starter-runs-on") && /even while it turns: this is the one time/.test(l.ruleWords("starter-runs-on")),
      "no restart until proved": (l) => /No new try until relay, solenoid and button are proved good/.test(l.ruleWords("starter-runs-on")),
      "relay and solenoid show it": (l) =>
        l.shows("start-relay-failed", "starter-runs-on") && l.shows("starter-solenoid-worn", "starter-runs-on"),
      "everyone is clear before the battery goes on": (l) => /everyone clear/.test(l.words(l.check("runs-on-signal"))),
    },
  },
  {
    item: 24,
    about: "feeding the solenoid direct",
    must: {
      "a mechanic after two turns by hand, stop held": (l) =>
        l.mechanic(l.check("start-bridge")) && AFTER_BAR_OVER(l, "check", "start-bridge") && l.check("start-bridge").flags.fuelOff === true,
      "neutral at the box, aired, a fused lead to the small terminal": (l) =>
        /neutral at the gearbox itself[^]*aired[^]*fused lead from the battery's positive post to the small terminal only[^]*Never across the big studs/.test(
          l.words(l.check("start-bridge")),
        ),
      "the switch is bridged by a mechanic only": (l) => l.mechanic(l.remedy("bridge-neutral-switch")),
    },
  },
  {
    item: 25,
    about: "past the battery switch",
    must: {
      "battery off first, full-size cables on one stud, labelled, parted": (l) =>
        /^Disconnect the battery itself[^]*both full-size cables[^]*NO ISOLATOR[^]*Part the cables again whenever you leave/.test(
          l.remedy("bypass-battery-switch").steps.join("\n"),
        ),
      temporary: (l) => l.remedy("bypass-battery-switch").temporary === true,
    },
  },
  {
    item: 26,
    about: "running from a can",
    must: {
      "no higher than the pump for the air test": (l) => /outlet no higher than the lift pump's inlet/.test(l.words(l.check("can-test"))),
      "return into the can, filter in, watched, extinguisher, never petrol": (l) =>
        [l.check("can-test"), l.remedy("gravity-can")].every(
          (s) =>
            /return[^]*into the can[^]*filter on the engine stays in the line[^]*watch/i.test(l.shown(s)) &&
            /fire extinguisher ready\. Never a petrol can/.test(l.shown(s)),
        ),
      "not where the return is hot": (l) =>
        [l.check("can-test"), l.remedy("gravity-can")].every((s) => /common rail[^]*leave it/.test(s.steps[0] ?? "")),
    },
  },
  {
    item: 27,
    about: "clear hose",
    must: {
      "suction at idle, then in gear, clear of heat, clipped, out the same day": (l) =>
        /clipped at both ends, clear of heat[^]*five minutes at idle[^]*in gear[^]*take the clear hose out again/.test(
          l.words(l.check("clear-hose-suction")),
        ) && l.cautions(l.check("clear-hose-suction")).includes("clear-hose-short"),
      "return on mechanical pumps only": (l) => l.onlyInjection(l.check("clear-hose-return"), "in-line-pump", "rotary-pump"),
      "none is two minus, not three": (l) => l.gives("fuel-line-air-leak", "clear-hose-suction", "no-bubbles") === "x1/10",
      "overnight with somebody by and the tank below": (l) =>
        /tank below the lift pump[^]*a tray under it, somebody aboard/.test(l.words(l.check("overnight-mark"))),
    },
  },
  {
    item: 28,
    about: "no outlet is blanked",
    must: {
      "nowhere as a remedy": (l) =>
        l
          .steps()
          .every(
            (s) =>
              !/\bblank(ed|ing)? (off )?(the |an? )?(outlet|injector pipe|injection pipe|union)/i.test(
                l.words(s).replace(/no outlet is blanked/g, ""),
              ),
          ),
      "said where the pipe is renewed": (l) =>
        /no outlet is blanked/.test(l.words(l.remedy("hp-pipe"))) && /blanked pipe bursts/.test(l.ruleWords("fuel-mist")),
    },
  },
  {
    item: 29,
    about: "common rail, unit injectors, or not known",
    must: {
      "said over every open clean side": (l) =>
        l
          .steps()
          .filter((s) => s.flags.opensFuelClean || s.flags.opensHighPressureFuel)
          .every((s) => /a skipper opens nothing after the last filter/.test(l.shown(s)) || l.cautions(s).includes("common-rail-closed")),
      "skippers' bleeding on mechanical pumps only, and not where it is not known": (l) =>
        [l.check("bleed-observe"), l.remedy("bleed-through"), l.remedy("bleed-washers"), l.remedy("renew-leakoff-pipes")].every(
          (s) =>
            l.onlyInjection(s, "in-line-pump", "rotary-pump") &&
            /^Only on an in-line or rotary pump\. Not known which, leave it shut/.test(s.steps[0] ?? ""),
        ),
      "the rest purge by the pump, two bursts": (l) =>
        /Open nothing[^]*No start then, stop there/.test(l.words(l.remedy("purge-by-pump"))) &&
        /open nothing after the last filter; purge by the pump alone/.test(l.words(l.remedy("bleed-low"))),
      "a filter change bleeds nothing there": (l) =>
        [
          l.remedy("change-secondary"),
          l.remedy("change-third-filter"),
          l.check("secondary-inspect"),
          l.check("third-filter-inspect"),
        ].every((s) => /where you do not know which/.test(l.words(s))),
    },
  },
  {
    item: 30,
    about: "water past the separator",
    must: {
      "a no-crank rule, found or asked": (l) =>
        l.broughtBy("water-past-separator", "secondary-inspect", "water") &&
        l.asks("water-at-the-pump", "water-in-separator") &&
        l.rule("water-past-separator").kind === "no-crank",
      "drain, flush by priming, new elements, only then start": (l) =>
        /Drain both filters[^]*New elements; flush by priming into a jar[^]*Only then start/.test(l.ruleWords("water-past-separator")),
    },
  },
  {
    item: 31,
    about: "water out of the cylinders",
    must: {
      "stop, leads off, jar, rags, faces, by hand": (l) =>
        /Stop pulled, pre-heat leads off, pipe ends into a jar, rags over the holes, faces clear[^]*Never with the starter/.test(
          l.words(l.check("injector-out-spin")),
        ),
      "dry by hand, oil, oil change, the way shut, then start, then shut for two days": (l) =>
        /by hand[^]*teaspoon of oil[^]*Oil and filter changed\. The way of the water found and shut before it runs[^]*started[^]*shut at every stop until muffler and dipstick stay steady for two days/.test(
          l.words(l.remedy("clear-hydrolock")),
        ),
      "seacock opened before the start": (l) => /Open the seacock/.test(l.shown(l.remedy("clear-hydrolock"))),
    },
  },
  {
    item: 32,
    about: "after draining the muffler",
    must: {
      "dip, bar two turns, open, start, dip again": (l) =>
        /Dip the oil[^]*do not start[^]*two full turns[^]*dip again after five minutes[^]*Open the seacock[^]*within 20 s/.test(
          l.shown(l.remedy("drain-muffler")),
        ),
    },
  },
  {
    item: 33,
    about: "a shaft or a boot that opens the boat",
    must: {
      "asked without drive, with water and with shaking": (l) =>
        ["no-drive", "water-in-engine-space", "shaft-gland-leak", "vibration"].every((s) => l.asks("shaft-or-boot", s)),
      found: (l) => l.broughtBy("shaft-or-boot", "coupling-look", "crept") && l.broughtBy("shaft-or-boot", "boot-look", "alarm"),
      "water first, lashed, no power, lift": (l) =>
        /Look for water before anything else[^]*clamp or lash it forward[^]*nearest lift[^]*No power ahead or astern/.test(
          l.ruleWords("shaft-or-boot"),
        ),
    },
  },
  {
    item: 34,
    about: "stuck in gear",
    must: {
      "symptom, rule and causes": (l) =>
        l.asks("stuck-in-gear", "stuck-in-gear") &&
        l.shows("shift-cable-misadjusted", "stuck-in-gear") &&
        l.shows("control-head-worn", "stuck-in-gear"),
      "idle, stop, anchor, shift at the box, pin and clip": (l) =>
        /Throttle to idle, and stop the engine[^]*Anchor, fenders[^]*lever on the gearbox[^]*pin or clip/.test(
          l.ruleWords("stuck-in-gear"),
        ),
    },
  },
  {
    item: 35,
    about: "a battery about to burst",
    must: {
      "stop the charge at its source, air, only then isolate": (l) =>
        /at its source, not at the battery[^]*air and cool[^]*Only then isolate/.test(l.ruleWords("battery-swelling")),
      "no lithium with lead, no frozen, swollen or leaking one": (l) =>
        [l.check("battery-swap"), l.remedy("jump-start"), l.remedy("charge-battery"), l.remedy("parallel-charge")].every((s) =>
          l.cautions(s).includes("no-lithium-parallel"),
        ) && /never jump a frozen, swollen or leaking battery/.test(l.caution("no-lithium-parallel").says),
      "the gas poisons": (l) => /poison/.test(l.ruleWords("battery-swelling")),
      "asked before a jump": (l) => l.asks("battery-swelling", "no-crank-click") && l.asks("battery-swelling", "cranks-slow"),
    },
  },
  {
    item: 36,
    about: "listening, covers and belts",
    must: {
      "a dowel, at idle, a hand at the stop": (l) =>
        /idle or fast idle, second hand at the stop[^]*dowel/i.test(l.words(l.check("sound-rod"))) &&
        l.cautions(l.check("sound-rod")).includes("open-engine-hole"),
      "no belt or wire pulled running": (l) =>
        /Never pull a wire or a belt with the engine running/.test(l.words(l.check("accessory-off"))),
      "belt off stopped, then 30 seconds": (l) =>
        /Engine stopped, key out; belt off[^]*30 seconds at most/.test(l.words(l.check("belt-off-noise"))),
      "crankcase by a tube at idle": (l) =>
        /at idle[^]*hose on the dipstick tube[^]*never the open filler/.test(l.words(l.check("crank-pressure"))),
    },
  },
  {
    item: 37,
    about: "diesel in the bilge",
    must: {
      "tag, every 15 minutes, rising water first, tested": (l) =>
        ["fuel-in-bilge", "fuel-mist"].every((k) =>
          /tag at the helm; look every 15 minutes[^]*ising water goes before pollution[^]*back on automatic, and tested/.test(
            l.ruleWords(k),
          ),
        ),
      "open until it is back on": (l) => /back on automatic/.test(l.rule("fuel-in-bilge").clearedWhen ?? ""),
    },
  },
  {
    item: 38,
    about: "in a tank",
    must: {
      "never head or body, no drill, air, helper": (l) =>
        l.cautions(l.remedy("clean-tank")).includes("tank-entry") &&
        /Never put head or body into a tank\. No drill[^]*Forced air, mask, gloves[^]*extinguisher and a helper outside[^]*Jetting[^]*professionals/.test(
          l.caution("tank-entry").says,
        ),
      "not a skipper's": (l) => l.mechanic(l.remedy("clean-tank")),
    },
  },
  {
    item: 39,
    about: "air at top dead centre, hot lugs, a meter in series",
    must: {
      "leak-down in a workshop, 5 bar, spanner off": (l) =>
        l.check("leakdown").who === "workshop" && /Spanner off or held by a bar, 5 bar at most/.test(l.shown(l.check("leakdown"))),
      "a lug by infrared, rings off": (l) =>
        /infrared thermometer, or a touch with the back of a finger, rings and watch off/.test(l.shown(l.check("hot-lug"))),
      "drain by clamp, or key out and glow fuse pulled": (l) =>
        /Key out[^]*Nobody turns the key[^]*Clamp[^]*series instead, pull the glow fuse first/.test(l.words(l.check("off-drain"))),
    },
  },
  {
    item: 40,
    about: "port temperature",
    must: {
      "on dry manifolds only": (l) => l.check("exhaust-port-temp").appliesTo?.features?.exhaust?.join() === "dry",
      "pulses by a mechanic": (l) =>
        l.mechanic(l.check("pipe-pulse")) && l.onlyInjection(l.check("pipe-pulse"), "in-line-pump", "rotary-pump"),
    },
  },
  {
    item: 41,
    about: "gas in the return is not the injector's seat",
    must: {
      "no link": (l) => l.gives("injector-seat-leak", "clear-hose-return", "bubbles") === undefined,
      "a nozzle that does not close": (l) => l.gives("injector-dribble", "clear-hose-return", "bubbles") === "x5",
      "the cup on unit injectors only": (l) => l.cause("injector-cup-leak").appliesTo?.features?.injection?.join() === "unit-injectors",
    },
  },
  {
    item: 42,
    about: "lift pump pressure",
    must: {
      "0.1 bar is good enough": (l) => l.upTo("lift-pump-pressure", "low") === 10,
      "maker first, with the delivery": (l) => /maker's figure[^]*delivery/.test(l.words(l.check("lift-pump-pressure"))),
      "where the gauge sat": (l) => /write down that it sat there/.test(l.words(l.check("lift-pump-pressure"))),
    },
  },
  {
    item: 43,
    about: "lift pump delivery",
    must: {
      "ten seconds of cranking, squirts only": (l) =>
        l.check("lift-pump-squirt").flags.cranks === 10 && /firm full squirt/.test(l.words(l.check("lift-pump-squirt"))),
      "three times at idle, never cranking": (l) =>
        l.check("lift-pump-volume").engine === "idling" &&
        l.check("lift-pump-volume").flags.cranks === undefined &&
        /never for cranking speed/.test(l.check("lift-pump-volume").note ?? ""),
    },
  },
  {
    item: 44,
    about: "no vacuum and starving",
    must: {
      "++ for both pumps and air, + for the filter after it": (l) =>
        ["lift-pump-failed", "electric-lift-pump-failed", "fuel-line-air-leak"].every(
          (c) => l.gives(c, "filter-vacuum", "near-nothing") === "x20",
        ) && l.gives("secondary-filter-blocked", "filter-vacuum", "near-nothing") === "x5",
    },
  },
  {
    item: 45,
    about: "this engine's own vacuum",
    must: {
      "bands hang on its own figure": (l) =>
        ["filter-vacuum", "filter-vacuum-teed"].every(
          (k) =>
            l.check(k).reading?.bands.some((b) => typeof b.to === "object" && "healthy" in b.to && b.to.healthy === "filterVacuumKpa") ===
            true,
        ),
      "a drag needle is named": (l) => /drag needle/.test(l.words(l.check("filter-vacuum"))),
    },
  },
  {
    item: 46,
    about: "the lid before the cock",
    must: {
      "filled, lid on, only then the cock": (l) =>
        /Shut the tank cock\. Drain[^]*Fill to the brim[^]*Fit the lid[^]*only then open the cock[^]*below the filter, prime/.test(
          l.words(l.remedy("change-primary")),
        ),
    },
  },
  {
    item: 47,
    about: "draining a bowl under suction",
    must: {
      "stopped, both tanks, no weep": (l) =>
        l.remedy("drain-separator").engine === "stopped" &&
        /Tank above[^]*Tank below: cock shut, slacken the vent[^]*does not weep or draw air/.test(l.words(l.remedy("drain-separator"))),
    },
  },
  {
    item: 48,
    about: "temperatures of small engines",
    must: {
      "fresh water: own normal + 8, alarm 95": (l) =>
        l.upTo("full-load-temperature", "high", { cooling: "heat-exchanger" }) === 95 &&
        l.upTo("full-load-temperature", "normal", { cooling: "heat-exchanger" }) === 90,
      "raw water to 65": (l) => l.upTo("full-load-temperature", "normal", { cooling: "raw-water" }) === 65,
      "own figure first": (l) =>
        l.check("full-load-temperature").reading?.bands.some((b) => typeof b.to === "object" && "healthy" in b.to && b.to.plus === 8) ===
        true,
      "thermostat stamp to ten above": (l) => /stamped figure or up to 10 °C above/.test(l.remedy("thermostat").proof),
    },
  },
  {
    item: 49,
    about: "no water at 20 s",
    must: {
      "20, or 30 after draining": (l) =>
        /None 20 seconds after the start \(30 if the muffler was just drained\)/.test(l.words(l.check("exhaust-water"))),
      "++ strainer, + hose and inlet": (l) =>
        l.gives("strainer-blocked", "exhaust-water", "none") === "x20" &&
        l.gives("raw-hose-collapsed", "exhaust-water", "none") === "x5" &&
        l.gives("inlet-air-draw", "exhaust-water", "none") === "x5",
      "nobody waits longer": (l) => [l.remedy("impeller"), l.remedy("open-seacock")].every((r) => /20 seconds/.test(r.proof)),
    },
  },
  {
    item: 50,
    about: "hot with good water",
    must: {
      "the three branches": (l) =>
        ["overheat", "too-hot-now"].every((k) =>
          /Neutral[^]*No water, stop at once\. Good water and the needle falling, 2 to 3 minutes of idle, then stop\. Rising, steam or a smell of burning, stop at once[^]*Half an hour/.test(
            l.ruleWords(k),
          ),
        ),
    },
  },
  {
    item: 51,
    about: "drain with all off",
    must: {
      "5 and 20 mA": (l) => l.upTo("off-drain", "quiet") === 5 && l.upTo("off-drain", "small") === 20,
      "bilge pump apart": (l) => /bilge pump's own wire is measured apart/.test(l.words(l.check("off-drain"))),
    },
  },
  {
    item: 52,
    about: "the lamp in five seconds",
    must: {
      "5 s, 10 after a filter change": (l) =>
        l.upTo("lamp-seconds", "quick") === 5 &&
        l.upTo("lamp-seconds", "slow") === 10 &&
        l.broughtBy("no-oil-pressure", "lamp-seconds", "stays-on"),
      "maker's bar at stated revs, no psi rule": (l) =>
        /maker's figure at stated revs goes first/.test(l.words(l.check("oil-pressure-cruise"))) &&
        l.steps().every((s) => !/psi (per|for each) 1,?000/.test(l.words(s))),
    },
  },
  {
    item: 53,
    about: "load on lines",
    must: {
      "no stall test": (l) => l.steps().every((s) => !/stall test/i.test(l.words(s))),
      "two thirds, 10 s, doubled lines": (l) =>
        [l.remedy("gear-shop"), l.remedy("shift-cable-set")].every((r) =>
          /two thirds throttle for 10 seconds on doubled lines/.test(r.proof),
        ) && /doubled lines, two thirds throttle, 10 s at most/.test(l.shown(l.check("smoke-run"))),
      "full throttle revs under way": (l) =>
        l.check("rpm-loaded").appliesTo?.situations?.join() === "under-way" && /bottom was cleaned/.test(l.words(l.check("rpm-loaded"))),
    },
  },
  {
    item: 54,
    about: "a third of a tank",
    must: {
      "33 and 10": (l) => l.upTo("tank-level", "under-third") === 33 && l.upTo("tank-level", "under-tenth") === 10,
      links: (l) =>
        l.gives("tank-pickup-uncovered", "tank-level", "under-third") === "x20" &&
        l.gives("tank-empty", "tank-level", "under-tenth") !== undefined,
      "gauge and stick": (l) => /clean stick/.test(l.words(l.check("tank-level"))),
    },
  },
  {
    item: 55,
    about: "what an engine runs away on",
    must: {
      "oil and fuel in the sump, breather, turbo, rack": (l) =>
        ["oil-overfilled", "oil-fuel-diluted", "pump-seal-to-sump", "lift-pump-diaphragm-to-sump", "injection-rack-stuck"].every((c) =>
          l.shows(c, "runaway"),
        ),
      "diluted weighs as much as any, over-full no less than the rack": (l) =>
        Number(l.cause("oil-fuel-diluted").shows.runaway) >= 0.8 &&
        Number(l.cause("oil-overfilled").shows.runaway) > Number(l.cause("injection-rack-stuck").shows.runaway),
      "over the mark and smelling: not started": (l) =>
        l.broughtBy("sump-over-full", "oil-level", "high-fuel") && /Do not start it/.test(l.finding("oil-level", "high-fuel").says ?? ""),
    },
  },
  {
    item: 56,
    about: "two lift pumps",
    must: {
      "two features": (l) => ["mechanical-lift-pump", "electric-lift-pump"].every((k) => l.tree.features.some((f) => f.key === k)),
      "valve and strainer of the electric one": (l) =>
        l.cause("electric-pump-check-valve-leak") !== undefined &&
        l.cause("electric-pump-strainer-blocked") !== undefined &&
        l.check("electric-pump-valve") !== undefined,
    },
  },
  {
    item: 57,
    about: "self-bleeding",
    must: {
      "three to five minutes without cranking, one burst, again": (l) =>
        /key at run, not at pre-heat, three to five minutes without cranking[^]*running back into the tank[^]*One burst of 10 seconds/i.test(
          l.words(l.remedy("bleed-low")),
        ) && /timer stops the pump/.test(l.words(l.remedy("purge-by-pump"))),
      "it turns nothing off: the pump is offered to every engine, and so are the bleed screws": (l) =>
        l.remedy("purge-by-pump").appliesTo === undefined &&
        l.remedy("bleed-low").appliesTo?.features === undefined &&
        l.tree.features.every(({ key }) => key !== "self-bleeding"),
    },
  },
  {
    item: 58,
    about: "a silent pump",
    must: {
      "first seconds, timer, oil pressure": (l) =>
        /first seconds after key-on[^]*timer[^]*oil pressure feeds it[^]*measure at its plug in those first seconds/.test(
          l.words(l.check("electric-pump")),
        ),
    },
  },
  {
    item: 59,
    about: "holding the stop",
    must: {
      "by the lever or the fuse, not the button": (l) =>
        /at the lever on the pump, or pull the lead or fuse of a solenoid that needs current to run[^]*Do not hold a stop button down/.test(
          l.shown(l.check("crank-volts")),
        ),
      "a stop solenoid is tried for 3 seconds": (l) => /3 seconds at most/.test(l.words(l.check("stop-solenoid-volts"))),
    },
  },
  {
    item: 60,
    about: "biocide",
    must: {
      "water first, by the label, once": (l) =>
        /^Drain the water first[^]*label for the litres really in the tank, once a lay-up or when slime is found, not at each fill[^]*Log product/.test(
          l.remedy("biocide-maintain").steps.join("\n"),
        ),
      "gloves, no mixing": (l) => /Gloves and glasses[^]*do not mix makes/.test(l.shown(l.remedy("biocide-maintain"))),
    },
  },
  {
    item: 61,
    about: "back pressure converted once",
    must: {
      "9.7 and 4.9 kPa": (l) =>
        l.upTo("back-pressure", "near", { turbo: "none" }) === 9.7 && l.upTo("back-pressure", "near", { turbo: "turbo" }) === 4.9,
      "the source's disagreement is told": (l) => /do not agree/.test(l.check("back-pressure").note ?? ""),
    },
  },
  {
    item: 62,
    about: "volts while cranking",
    must: {
      "9.6 and 10.5, no 8": (l) =>
        l.upTo("crank-volts", "low", { voltage: "v12" }) === 9.6 &&
        l.upTo("crank-volts", "marginal", { voltage: "v12" }) === 10.5 &&
        l.check("crank-volts").reading?.bands.every(({ from, to }) => from !== 8 && to !== 8) === true,
    },
  },
  {
    item: 63,
    about: "flat banks and smart regulators",
    must: {
      "bank noted, fifteen minutes, 15 V": (l) =>
        /how full the bank was[^]*fifteen minutes/.test(l.words(l.check("alternator-volts"))) &&
        l.upTo("alternator-volts", "high", { voltage: "v12" }) === 15 &&
        /equalising/.test(l.finding("alternator-volts", "over").says ?? ""),
      "both banks read first": (l) =>
        /read both banks first/.test(l.words(l.check("battery-swap"))) && /of both banks/.test(l.words(l.check("restart-soon"))),
    },
  },
  {
    item: 64,
    about: "glow plugs",
    must: {
      "warm, an hour of oil, back and forth": (l) =>
        /penetrating oil an hour before\. Engine warm, not hot[^]*back and forth/.test(l.words(l.remedy("glow-plugs"))) &&
        /stop if it binds/.test(l.caution("seized-plug").says) &&
        l.cautions(l.remedy("glow-plugs")).includes("seized-plug"),
      "no long pre-heat": (l) => l.cautions(l.check("preheat-drill")).includes("preheat-too-long"),
    },
  },
  {
    item: 65,
    about: "belts",
    must: {
      "10 to 13 mm on 300, 10 kg, ribbed by maker": (l) =>
        /ten kilograms[^]*300 mm[^]*ribbed belt goes by its maker/.test(l.words(l.check("belt-tension"))) &&
        /10 to 13 mm on 300 mm/.test(l.words(l.remedy("belt"))),
      "again at ten hours, the pump's first": (l) =>
        /after ten hours/.test(l.words(l.remedy("belt"))) && /water pump comes first/.test(l.words(l.check("belt-look"))),
    },
  },
  {
    item: 66,
    about: "the vented loop",
    must: {
      "two nights, shut meanwhile, 300 mm heeled and loaded": (l) =>
        /Two nights/.test(l.remedy("vented-loop").proof) &&
        /300 mm above the waterline, heeled and loaded/.test(l.words(l.remedy("vented-loop"))) &&
        /shut at every stop/.test(l.remedy("vented-loop").note ?? ""),
      "a take-off is a cause": (l) => l.shows("raw-take-off-bypasses-loop", "crank-stops-hard"),
      "the rest test cannot fill the engine": (l) =>
        /leave its drain open over the bucket[^]*stay by it/.test(l.words(l.check("muffler-after-rest"))),
    },
  },
  {
    item: 67,
    about: "a shaft under sail or tow",
    must: {
      "maker or lock; cock shut, key tagged, muffler": (l) =>
        /gearbox maker's word goes; without it, lock the shaft\. In tow shut the exhaust cock[^]*tag the key[^]*look at the muffler/i.test(
          l.caution("towed-shaft").says,
        ),
      "on the gearbox's remedies": (l) =>
        ["gear-oil-fill", "gear-oil-change", "gear-shop"].every((k) => l.cautions(l.remedy(k)).includes("towed-shaft")),
    },
  },
  {
    item: 68,
    about: "carbon monoxide",
    must: {
      "out first, then stop from the cockpit, half an hour, heater and generator": (l) =>
        /^Everybody out, to windward[^]*from the cockpit; do not go back below[^]*half an hour of air; heater and generator/.test(
          l.rule("co").says.join("\n"),
        ),
      "alarm, canopy and a second person over a run with the space open": (l) =>
        /alarm on, hatches and canopy open, a second person/.test(l.shown(l.check("thermostat-warm"))) &&
        /Carbon monoxide alarm on, canopy open, a second person/.test(l.caution("co-test").says),
      "asked with water from an exhaust, too": (l) => l.asks("co", "water-in-engine-space"),
    },
  },
  {
    item: 69,
    about: "a third filter and hidden screens",
    must: {
      causes: (l) =>
        [
          "final-filter-blocked",
          "inlet-screen-blocked",
          "lift-pump-strainer-blocked",
          "electric-pump-strainer-blocked",
          "pickup-blocked",
        ].every((c) => l.cause(c) !== undefined),
      "every filter by number": (l) =>
        /every filter in order[^]*None is cleared until its number was seen/.test(l.words(l.check("third-filter-inspect"))),
      duplex: (l) => /duplex/i.test(l.remedy("change-primary").note ?? ""),
    },
  },
  {
    item: 70,
    about: "the second filter is looked at",
    must: {
      "a jar, water, then a new element": (l) =>
        /clear jar[^]*water at the bottom[^]*new element/.test(l.words(l.check("secondary-inspect"))),
      "water and slime there are past the separator": (l) =>
        l.broughtBy("water-past-separator", "secondary-inspect", "water") &&
        l.broughtBy("water-past-separator", "secondary-inspect", "slime"),
      "choked points to it": (l) => l.gives("secondary-filter-blocked", "secondary-inspect", "choked") !== undefined,
    },
  },
  {
    item: 71,
    about: "seals counted",
    must: {
      "off and on, the old ring, dry paper, element kept": (l) =>
        /count the seals off, the old ring on the seat too[^]*count them on[^]*hand-tight plus[^]*dry paper[^]*Keep the old element aboard/.test(
          l.words(l.remedy("change-primary")),
        ) && /old ring came off the seat\. Count seals off and on/.test(l.words(l.remedy("change-secondary"))),
    },
  },
  {
    item: 72,
    about: "the clean side",
    must: {
      "over every open clean side": (l) =>
        l
          .steps()
          .filter((s) => s.flags.opensFuelClean)
          .every(
            (s) =>
              /plug each open port, lint-free cloth only, the new element in its bag[^]*flush the line into a jar/.test(l.inLine(s)) &&
              /no tape or paste/.test(l.inLine(s)),
          ),
      "never filled on common rail": (l) => /on common rail do not fill it at all/.test(l.words(l.remedy("change-secondary"))),
    },
  },
  {
    item: 73,
    about: "blowing back to the tank",
    must: {
      "by hand pump, filler open, both answers": (l) =>
        /filler open[^]*hand pump, never by mouth/.test(l.words(l.check("pickup-blow"))) &&
        l.gives("pickup-blocked", "pickup-blow", "hard-then-gives") !== undefined &&
        l.finding("pickup-blow", "free-bubbling").usual === true,
    },
  },
  {
    item: 74,
    about: "a seized gearbox",
    must: {
      "three symptoms": (l) => ["stops-suddenly", "crank-stops-hard", "no-drive"].every((s) => l.shows("gearbox-seized", s)),
      "neutral at the box, by hand, oil": (l) =>
        l.gives("gearbox-seized", "gear-or-engine", "neither") !== undefined &&
        l.gives("gearbox-seized", "gear-oil", "burnt") !== undefined,
    },
  },
  {
    item: 75,
    about: "a leak-off pipe",
    must: {
      "four symptoms": (l) =>
        ["oil-level-rising", "hard-start-cold", "fuel-leak", "hunting-surging"].every((s) => l.shows("leakoff-pipe-leak", s)),
      "paper and cover off": (l) => /dry paper[^]*rocker cover, take it off/.test(l.words(l.check("leakoff-pipes"))),
    },
  },
  {
    item: 76,
    about: "remote valve, tanks, air after launching, back-flooding, spares",
    must: {
      "cocks and tanks": (l) =>
        /remote shut-off[^]*feed and return go to the same one/.test(l.words(l.check("fuel-cocks"))) &&
        l.gives("wrong-tank-selected", "fuel-cocks", "wrong-tank") !== undefined,
      "what was touched": (l) =>
        ["hauled-out", "engine-work", "fuel-work", "control-work"].every((f) => l.finding("last-change", f) !== undefined) &&
        l.gives("raw-pump-airlocked", "last-change", "hauled-out") === "x60",
      "back-flooding has signed evidence": (l) => l.gives("exhaust-backflood", "muffler-after-sea", "fuller") === "x60",
      "the seal is vented": (l) => l.gives("face-seal-dry", "burp-seal", "air-out") === "x60" && l.remedy("face-seal-burp") !== undefined,
      "spares by number, two of each": (l) =>
        [l.remedy("change-primary"), l.remedy("change-secondary")].every((r) => /part number[^]*two of each/.test(r.note ?? "")),
    },
  },
];

/** Items that no predicate can hold, with where they are met. */
export const IN_WORDS: readonly { item: number; met: string }[] = [];
