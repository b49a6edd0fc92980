/**
 * Where each edge of a reading's bands comes from. `published`: the text was
 * seen, source, table and page stand beside the figure; `from-memory`: a
 * published figure recalled and not looked up again; `common-practice`: what
 * mechanics go by, without a text. `within`: how far the tree's round number
 * may lie from the figure, in the reading's unit.
 */
export type BandFigure = {
  edge: string;
  /** The source's own number and unit, or the two ends of its range. */
  figure: number | readonly [number, number];
  unit: string;
  within?: number;
  standing: "published" | "from-memory" | "common-practice";
  /** Source's key, then table and page. */
  source: string;
  note?: string;
};

const practice = (edge: string, figure: number | readonly [number, number], unit: string, more: Partial<BandFigure> = {}): BandFigure => ({
  edge,
  figure,
  unit,
  standing: "common-practice",
  source: "common-practice",
  ...more,
});

/** A figure for 12 V doubled (volts), halved (amps) or times four (ohms) for the same watts on 24 V. */
const scaled = (edge: string, figure: number, unit: string, by: 2 | 0.5 | 4): BandFigure =>
  practice(edge, figure * by, unit, { note: `${figure} ${unit} on 12 V, for the same watts on 24 V` });

export const BAND_FIGURES: readonly BandFigure[] = [
  // Air
  practice("intake-vacuum: low | middling", 10, "inH2O", { within: 0.05, note: "clean small engines show 5 to 10" }),
  practice("intake-vacuum: middling | high", 20, "inH2O", { within: 0.05, note: "5 short of the published limit of 25" }),
  practice("hatch-open: slight | clear-gain", 50, "rpm"),

  // Charging
  practice("belt-tension: over-tight | right", 5, "mm", { note: "on a span of 300 mm; under 5 wears bearings out" }),
  practice("belt-tension: right | slack", 15, "mm", { note: "10 to 13 mm is the aim" }),
  { edge: "alternator-volts: low | right [v12]", figure: 13.5, unit: "V", standing: "published", source: "m-alt, 13.5 to 14.5 V" },
  practice("alternator-volts: right | high [v12]", 14.8, "V", { note: "smart regulators go to 14.8" }),
  practice("alternator-volts: high | over [v12]", 15, "V", { note: "15.0 and more, unless equalising is meant" }),
  scaled("alternator-volts: low | right [v24]", 13.5, "V", 2),
  scaled("alternator-volts: right | high [v24]", 14.8, "V", 2),
  scaled("alternator-volts: high | over [v24]", 15, "V", 2),
  practice("alternator-to-battery: small | large [v12]", 0.5, "V"),
  scaled("alternator-to-battery: small | large [v24]", 0.5, "V", 2),
  practice("banks-apart: small | large [v12]", 0.2, "V"),
  scaled("banks-apart: small | large [v24]", 0.2, "V", 2),
  practice("alternator-ripple: small | some", 0.1, "V"),
  practice("alternator-ripple: some | large", 0.5, "V"),
  practice("alternator-amps: none | flowing", 3, "A", { note: "0 to 3 A into a battery that is not full is no charge" }),
  practice("off-drain: quiet | small", 5, "mA", { note: "start bank switched off" }),
  practice("off-drain: small | over", 20, "mA", { note: "memories and alarms, each named" }),
  practice("off-drain: over | far-over", 50, "mA", { note: "1.2 Ah a day: a start bank in two months" }),

  // Cold start
  practice("glow-volts: small | some [v12]", 1, "V"),
  practice("glow-volts: some | large [v12]", 2, "V"),
  scaled("glow-volts: small | some [v24]", 1, "V", 2),
  scaled("glow-volts: some | large [v24]", 2, "V", 2),
  practice("glow-resistance: alike | open [v12]", 5, "ohm", { note: "0.5 to 2 ohm, some plugs up to 5" }),
  scaled("glow-resistance: alike | open [v24]", 5, "ohm", 4),
  practice("intake-heater: weak | full [v12]", 40, "A", { note: "40 to 100 A is typical" }),
  scaled("intake-heater: weak | full [v24]", 40, "A", 0.5),

  // Cooling
  practice("full-load-temperature: cool | normal [heat-exchanger or keel]", 65, "°C"),
  practice("full-load-temperature: normal | high [heat-exchanger or keel] plus", [8, 10], "°C", {
    note: "act 8 to 10 above its own normal",
  }),
  practice("full-load-temperature: normal | high [heat-exchanger or keel] otherwise", 90, "°C", { note: "often 75 to 90" }),
  practice("full-load-temperature: high | alarm [heat-exchanger or keel]", 95, "°C", { note: "alarms are commonly set at about 95" }),
  practice("full-load-temperature: cool | normal [raw-water]", 42, "°C", {
    note: "the coldest thermostat stamped for a raw-water engine, 42 to 60",
  }),
  practice("full-load-temperature: normal | high [raw-water] plus", [8, 10], "°C"),
  practice("full-load-temperature: normal | high [raw-water] otherwise", 65, "°C", { note: "50 to 65 is normal" }),

  practice("thermostat-pot: open-or-early | right times", [0.94, 0.97], "times", { note: "2 to 3 °C under a stamp of 50 to 82 °C" }),
  practice("thermostat-pot: right | late-or-never times", [1.03, 1.06], "times", { note: "2 to 3 °C over a stamp of 50 to 82 °C" }),
  practice("coolant-strength: weak | right", 30, "%"),

  practice("hx-drop: little | normal", 4, "C-diff", { note: "4 to 8 across the exchanger at cruise" }),
  practice("hx-drop: normal | large", 8, "C-diff"),
  practice("hx-rise: small | normal", 4, "C-diff", { note: "under 4 with the coolant hot speaks for a fouled exchanger" }),
  practice("hx-rise: normal | raised", 15, "C-diff", { note: "5 to 15 is normal" }),
  practice("hx-rise: raised | large", 20, "C-diff", { note: "over 20 speaks for too little water" }),

  // Cranking
  practice("battery-rest-volts: low | part [v12]", 12.2, "V", { note: "under 12.2 V speaks for a flat battery" }),
  practice("battery-rest-volts: part | full [v12]", 12.5, "V", { note: "over 12.5 V speaks against it" }),
  scaled("battery-rest-volts: low | part [v24]", 12.2, "V", 2),
  scaled("battery-rest-volts: part | full [v24]", 12.5, "V", 2),
  {
    edge: "crank-volts: low | marginal [v12]",
    figure: 9.6,
    unit: "V",
    standing: "from-memory",
    source: "bci battery test practice with SAE J537",
  },
  {
    edge: "crank-volts: low | marginal [v24]",
    figure: 19.2,
    unit: "V",
    standing: "from-memory",
    source: "bci battery test practice with SAE J537",
  },
  practice("crank-volts: marginal | good [v12]", 10.5, "V"),
  practice("crank-volts: good | high [v12]", 11.5, "V", { note: "over 11.5 V with a slow crank: the volts do not reach the starter" }),
  scaled("crank-volts: marginal | good [v24]", 10.5, "V", 2),
  scaled("crank-volts: good | high [v24]", 11.5, "V", 2),
  practice("volts-at-starter: small | middling [v12]", 0.5, "V"),
  practice("volts-at-starter: middling | large [v12]", 1, "V"),
  scaled("volts-at-starter: small | middling [v24]", 0.5, "V", 2),
  scaled("volts-at-starter: middling | large [v24]", 1, "V", 2),
  {
    edge: "drop-positive: small | over [v12]",
    figure: 0.5,
    unit: "V",
    standing: "published",
    source: "tm256-4 p. CGES-230-8, the worked example's total",
  },
  scaled("drop-positive: small | over [v24]", 0.5, "V", 2),
  { edge: "drop-negative: small | over [v12]", figure: 0.2, unit: "V", standing: "published", source: "tm256-4 p. CGES-230-8" },
  scaled("drop-negative: small | over [v24]", 0.2, "V", 2),
  { edge: "crank-rpm: very-slow | slow", figure: 100, unit: "rpm", standing: "published", source: "crk1, cold, for a light-truck diesel" },
  practice("crank-rpm: slow | fair", 150, "rpm"),
  practice("crank-rpm: fair | healthy", 200, "rpm", { note: "200 to 300 is healthy warm" }),
  practice("start-signal-volts: low | good [v12]", [8, 9], "V", { note: "below about 8 to 9 V a solenoid may not pull in" }),
  practice("start-signal-volts: low | good [v24]", [16, 18], "V", { note: "8 to 9 V on 12 V" }),
  practice("hydrometer-spread: even | one-apart", 0.05, "SG"),
  practice("hydrometer-mean: very-low | low", 1.155, "SG", { note: "a quarter, at 27 degC" }),
  practice("hydrometer-mean: low | part", 1.19, "SG", { note: "half" }),
  practice("hydrometer-mean: part | full", 1.225, "SG", { note: "three quarters" }),
  practice("starter-amps: low | middling [v12]", 100, "A"),
  practice("starter-amps: middling | high [v12]", 300, "A"),
  scaled("starter-amps: low | middling [v24]", 100, "A", 0.5),
  scaled("starter-amps: middling | high [v24]", 300, "A", 0.5),

  // Drive line
  practice("gland-temperature: warm | hot", 60, "°C", { note: "too hot to hold" }),

  // Exhaust
  practice("elbow-temp: usual | warm", 60, "°C", { note: "40 to 60 is usual" }),
  practice("elbow-temp: warm | hot", 75, "°C", { note: "beside the published alarm point of 165 degF" }),
  {
    edge: "back-pressure: near | over [none]",
    figure: 39,
    unit: "inH2O",
    within: 0.05,
    standing: "published",
    source: "m-bp technical data pp. 11-12, without a turbo",
    note: "the same page's 1.5 psi is 41.5 inH2O: the source contradicts itself, the lower stands",
  },
  {
    edge: "back-pressure: near | over [turbo or turbo-charge-cooled]",
    figure: 19.5,
    unit: "inH2O",
    within: 0.05,
    standing: "published",
    source: "m-bp technical data pp. 11-12, with a turbo",
    note: "the same page's 0.75 psi is 20.8 inH2O",
  },

  practice("elbow-height: low | doubtful", 200, "mm", { note: "without a vented loop, 200 to 300 mm above the waterline at least" }),
  practice("elbow-height: doubtful | high", 300, "mm"),

  // First looks
  practice("start-time: normal | slower otherwise", 3, "s"),
  practice("start-time: slower | slow otherwise", 5, "s"),
  practice("start-time: slow | long otherwise", 10, "s"),
  practice("rpm-noload: short | reaches times", 1, "times", { note: "under rated speed without load is a fault of the engine's side" }),
  practice("rpm-loaded: short | a-little-short times", 0.95, "times"),
  practice("rpm-loaded: a-little-short | reaches times", 0.97, "times", {
    note: "3 to 5 % short is watched; a rev counter is good to 3 %",
  }),
  practice("rpm-loaded: reaches | over times", 1.05, "times"),
  practice("tacho-true: reads-low | agrees", 100 - 3, "%"),
  practice("tacho-true: agrees | reads-high", 100 + 3, "%"),
  practice("fuel-burn: usual | high", 120, "%", { note: "20 % over what it burnt before" }),

  // Fuel supply
  practice("tank-level: under-tenth | under-third", 10, "%"),
  practice("tank-level: under-third | ample", 100 / 3, "%", { within: 0.5, note: "public accounts agree: two engines stopped at a third" }),
  ...["filter-vacuum", "filter-vacuum-teed"].flatMap((check): BandFigure[] => [
    practice(`${check}: in-order | raised plus`, 2, "inHg", { within: 0.5, note: "2 over its own clean reading: plan a change" }),
    {
      edge: `${check}: raised | high plus`,
      figure: [3, 4],
      unit: "inHg",
      standing: "published",
      source: "vac1, 3 to 4 over the clean reading: change",
    },
    {
      edge: `${check}: in-order | raised otherwise`,
      figure: 3.75,
      unit: "inHg",
      within: 0.5,
      standing: "published",
      source: "lift1, most at the pump's inlet at 1 500 rpm, for a 5.9 L engine",
      note: "without the engine's own clean reading the figure is weak",
    },
    practice(`${check}: raised | high otherwise`, [7, 8], "inHg", { note: "suits large flows; a small engine starves before" }),
  ]),
  {
    edge: "feed-pressure: low | in-order",
    figure: 200,
    unit: "kPa",
    standing: "published",
    source: "tm383 prob. 5, the least for unit injectors",
  },
  practice("lift-pump-pressure: low | in-order", 0.1, "bar", { note: "small diaphragm and pulse pumps, 0.1 to 0.35 bar" }),
  {
    edge: "lift-pump-pressure: in-order | high",
    figure: 6.5,
    unit: "psi",
    within: 0.5,
    standing: "published",
    source: "lift3, top of 5.5 to 6.5 psi, for a 6.2 L engine",
    note: "a small pump has no business above it",
  },

  // Fuel quality
  {
    edge: "water-ppm: within | over",
    figure: 200 / 10_000,
    unit: "%",
    standing: "published",
    source: "nzf, EN 590 as tabled: water 200 mg/kg at most",
  },
  {
    edge: "fuel-density: thin | in-order",
    figure: 0.82,
    unit: "g/ml",
    standing: "from-memory",
    source: "en590, temperate grades: 0.820 to 0.845 at 15 °C",
  },
  {
    edge: "fuel-temperature: cold | mild",
    figure: 5,
    unit: "°C",
    standing: "from-memory",
    source: "en590, mildest temperate class: filters at +5 °C",
  },

  // Injection
  practice("injector-opening: low | in-order", 90, "%", { note: "10 % under the book is rejected" }),
  {
    edge: "injector-back-leak: in-order | high",
    figure: 11,
    unit: "count",
    standing: "published",
    source: "tm397, 3 to 10 drops in 30 s at 1 500 psi",
    note: "11 is the first number over 10",
  },
  practice("leakoff-compare: one-raised | one-double", 200, "%", { note: "more than double the rest" }),
  practice("rail-pressure: low | in-order", 200, "bar", { note: "200 to 300 bar permits injection" }),

  practice("exhaust-port-temp: one-colder | even", -50, "C-diff", { note: "50 °C colder at 1 200 rpm, on a dry manifold" }),

  // Instruments
  practice("ir-vs-gauge: reads-low | agrees", [-10, -8], "C-diff", { note: "8 to 10 apart" }),
  practice("ir-vs-gauge: agrees | reads-high", [8, 10], "C-diff", { note: "8 to 10 apart" }),
  practice("panel-ground: small | over", 0.2, "V"),

  // Mechanical
  {
    edge: "compression: low | good",
    figure: 2.6,
    unit: "MPa",
    standing: "published",
    source: "m-cp1 manual p. 43, the limit at 290 rpm",
  },
  practice("wet-compression: little | rises", 15, "%"),
  practice("valve-clearance: right | wide", 0.1, "mm"),
  practice("crank-pressure: light | raised", 3, "inH2O", { within: 0.01 }),
  practice("crank-pressure: raised | high", 5, "inH2O", { within: 0.01 }),
  practice("oil-use-rate: usual | raised", 0.5, "%"),
  practice("oil-use-rate: raised | high", 1, "%"),

  // Raw water
  practice("raw-flow: under-half | short", 50, "%", { note: "under half of its usual flow" }),

  // Turbo
  practice("boost: low | right", 80, "%", { note: "of the maker's figure" }),
  practice("charge-air-temperature: cool | hot", 50, "°C"),
  // Lubrication
  practice("lamp-seconds: quick | slow", 5, "s", { note: "a small engine has pressure in 1 to 5 s; the published 15 s is of large ones" }),
  practice("lamp-seconds: slow | stays-on", 10, "s", { note: "allowed just after an oil and filter change" }),
  { edge: "oil-pressure-gauge: lost | low", figure: 0.5, unit: "bar", standing: "from-memory", source: "from-memory, never under it" },
  { edge: "oil-pressure-gauge: low | good", figure: 0.7, unit: "bar", standing: "from-memory", source: "from-memory, hot idle" },
  {
    edge: "oil-pressure-cruise: low | good otherwise",
    figure: 2.5,
    unit: "bar",
    standing: "from-memory",
    source: "from-memory, 2.5 to 5 bar at cruise",
  },
  practice("oil-lab-fuel: within | raised", 3, "%"),
  practice("oil-lab-fuel: raised | high", 5, "%"),

  // Controls
  practice("run-solenoid-volts: low | full [v12]", 10, "V"),
  scaled("run-solenoid-volts: low | full [v24]", 10, "V", 2),
  practice("stop-solenoid-volts: low | full [v12]", 10, "V"),
  scaled("stop-solenoid-volts: low | full [v24]", 10, "V", 2),

  // Shaft
  practice("gland-drip: too-dry | in-order [packed]", 1, "count", { note: "1 to 3 drops a minute" }),
  practice("gland-drip: in-order | drips [packed]", 4, "count", { note: "4 is the first number over 3" }),
  practice("gland-drip: in-order | drips [face]", 1, "count", { note: "a face seal is dry" }),
  practice("cutless-play: tight | worn", 1.5, "mm", { note: "on a shaft of 25 to 35 mm" }),
  {
    edge: "shaft-runout: in-line | some",
    figure: 0.002,
    unit: "in",
    within: 0.002,
    standing: "published",
    source: "m-align p. 39, run-out of the flange",
  },
  {
    edge: "alignment: in-line | doubtful",
    figure: 0.003,
    unit: "in",
    within: 0.005,
    standing: "published",
    source: "m-align p. 39, faces overall",
  },
  {
    edge: "alignment: doubtful | out",
    figure: 0.002 * 4,
    unit: "in",
    within: 0.005,
    standing: "published",
    source: "align2, 0.002 in for each inch of flange, for one of 4 in",
  },
];

/** Edges that rest on no figure: judgement, said so, to be put right by the log of proved cures. */
export const WITHOUT_FIGURE: Readonly<Record<string, string>> = {
  "hx-inlet: follows | inlet-cool":
    "a gauge's error of 8 to 10 °C, and a few degrees lost on the way; that it is told there is common practice",
  "exhaust-port-temp: even | one-hotter": "as far over the others as the trade calls dead under them",
  "raw-flow: short | good": "a bucket and a watch err by a tenth, a pump's wear takes the other tenth",
  "cap-test: weak | holds": "a tester's gauge errs by a tenth; the stamped figure is what it should hold",
  "coolant-strength: right | strong": "beyond it antifreeze carries heat worse and protects no better; no figure was looked up",
  "hatch-open: none | slight": "20 rpm is what a steady hand can tell on a rev counter",
  "glow-volts: large | nothing [v12]": "nothing arrives when the loss is all the battery has; 9 V allows for one that sags",
  "glow-volts: large | nothing [v24]": "twice the 12 V judgement",
  "glow-amps: none | little": "nothing, but for the meter's zero",
  "glow-amps: little | short": "under 30 %: not a plug's share, but the supply",
  "glow-amps: short | full": "between five of six plugs, 83 %, and all six; the meter's error on either side",
  "glow-resistance: shorted | alike [v12]": "below half of the lowest sound plug, 0.5 ohm",
  "glow-resistance: shorted | alike [v24]": "well below the lowest sound plug, reckoned at 2 ohm",
  "intake-heater: none | weak [v12]": "nothing, but for the meter's zero",
  "intake-heater: none | weak [v24]": "nothing, but for the meter's zero",
  "full-load-temperature: high | alarm [raw-water]": "15 over the top of normal; no figure for an alarm on a raw-water engine was found",
  "battery-rest-volts: very-low | low [v12]": "between flat, 11.9 V, and a dead cell, about 10.5 V",
  "battery-rest-volts: very-low | low [v24]": "twice the 12 V judgement",
  "alternator-volts: none | low [v12]": "what a full battery shows by itself, and a little",
  "alternator-volts: none | low [v24]": "twice the 12 V judgement",
  "excitation: none | small [v12]": "half of the least that is good, 1 V",
  "excitation: none | small [v24]": "twice the 12 V judgement",
  "excitation: small | full [v12]": "between the 1 to 2 V of a good field and what the battery has",
  "excitation: small | full [v24]": "twice the 12 V judgement",
  "start-signal-volts: none | low [v12]": "nothing, but for a leak through a wet plug",
  "start-signal-volts: none | low [v24]": "twice the 12 V judgement",
  "disconnect-overnight: holds | falls [v12]": "a good battery settles by less in a night, once it has rested four hours",
  "disconnect-overnight: holds | falls [v24]": "twice the 12 V judgement",
  "drop-positive: over | far-over [v12]": "twice the allowance",
  "drop-positive: over | far-over [v24]": "twice the allowance",
  "drop-negative: over | far-over [v12]": "two and a half times the allowance",
  "drop-negative: over | far-over [v24]": "two and a half times the allowance",
  "back-pressure: under | near [none]": "two thirds of the limit",
  "back-pressure: under | near [turbo or turbo-charge-cooled]": "two thirds of the limit",
  "start-time: normal | slower plus": "1 s over its own time is more than a stop watch errs",
  "start-time: slower | slow plus": "keeps the distances of the bands without its own time",
  "start-time: slow | long plus": "keeps the distances of the bands without its own time",
  "rpm-noload: reaches | over times": "a droop of 12 % and the 3 % of a rev counter",
  "fuel-burn: low | usual": "a sixth less than before is more than a sounding of the tank errs",
  "element-life: short | long": "half of the interval",
  "element-life: very-short | short": "a tenth of the interval, as in a filter every 20 hours",
  "fuel-temperature: freezing | cold": "ten degrees under the mildest class; what winter fuel stands differs by land",
  "filter-vacuum: near-nothing | in-order": "what a small gauge can show at all",
  "filter-vacuum-teed: near-nothing | in-order": "what a small gauge can show at all",
  "vacuum-before-filter: low | high": "a tank level with the engine and a clean line; the check's note says so",
  "suction-hold: holds | falls-slowly": "a tight line holds; 3 kPa is the pump's own leak",
  "suction-hold: falls-slowly | falls": "a fifth of what was pumped",
  "lift-pump-volume: far-short | short": "half of the need",
  "lift-pump-volume: short | enough": "the need is a rule of three, its measurement good to a tenth",
  "filter-pressure-drop: small | large": "about 1 psi; the maker's figure goes first",
  "injector-opening: in-order | high": "as far over as the trade rejects under",
  "leakoff-compare: alike | one-raised": "half way to the double that is a finding",
  "pump-element-pressure: low | in-order": "recalled by the tree's authors, and the step says so; the maker's figure goes first",
  "delivery-valve-hold: falls | holds": "recalled by the tree's authors, and the step says so; the maker's figure goes first",
  "rail-pressure-load: low | in-order": "recalled by the tree's authors; the maker's limit goes first",
  "compression: very-low | low": "a figure that no cold start survives; the manuals give the limit only",
  "valve-clearance: tight | right": "a feeler's step under the book; the trade only names none at all",
  "boost: right | high": "a gauge's error over the maker's figure",
  "oil-pressure-cruise: lost | low": "no bearing of these engines lives on less than 1 bar at speed",
  "oil-pressure-cruise: low | good plus": "a gauge's error and a warmer day, under its own reading when well",
  "oil-pressure-cruise: good | high": "1 bar over the top of what is common",
  "run-solenoid-volts: none | low [v12]": "nothing, but for leakage and the meter",
  "run-solenoid-volts: none | low [v24]": "twice the 12 V judgement",
  "stop-solenoid-volts: none | low [v12]": "nothing, but for leakage and the meter",
  "stop-solenoid-volts: none | low [v24]": "twice the 12 V judgement",
  "idle-rpm: low | right times": "the 3 % of a rev counter and a steady hand",
  "idle-rpm: right | high times": "a high idle is no fault before it is plainly one",
  "gland-drip: drips | streams [packed]": "a drop a second",
  "gland-drip: drips | streams [face]": "a drop a second",
  "gear-pressure: low | in-order": "no figure was found; the maker's limit goes first",
  "shaft-runout: some | bent": "five times what the maker allows on the flange",
};

/** Published, recalled or usual values, and the finding that each has to fall in. */
export type LiesIn = { check: string; value: number; unit: string; finding: string; kind?: string; source: string };

export const LIES_IN: readonly LiesIn[] = [
  {
    check: "hx-rise",
    value: 16 / (4 * (20 / 60)),
    unit: "K",
    finding: "normal",
    source: "arithmetic: 16 kW into 20 L of sea water a minute, 4.0 kJ to a litre and degree",
  },
  { check: "hx-rise", value: 16 / (4 * (10 / 60)), unit: "K", finding: "large", source: "the same heat into half the water" },
  {
    check: "hx-rise",
    value: 27,
    unit: "F-diff",
    finding: "raised",
    source: "common practice, 15 °C in the other unit: the lower edge is in",
  },
  { check: "hx-drop", value: 10.8, unit: "F-diff", finding: "normal", source: "common practice, 6 °C, the middle of 4 to 8" },
  { check: "ir-vs-gauge", value: 5, unit: "C-diff", finding: "agrees", source: "common practice, inside 8 to 10" },
  { check: "exhaust-port-temp", value: -108, unit: "F-diff", finding: "one-colder", source: "common practice, 60 °C colder" },
  { check: "intake-vacuum", value: 25, unit: "inH2O", finding: "high", source: "tm260 p. 135, the limit" },
  { check: "back-pressure", value: 1.5, unit: "psi", kind: "none", finding: "over", source: "m-bp pp. 11-12, as the page has it in psi" },
  {
    check: "back-pressure",
    value: 0.75,
    unit: "psi",
    kind: "turbo or turbo-charge-cooled",
    finding: "over",
    source: "m-bp pp. 11-12, as the page has it in psi",
  },
  { check: "back-pressure", value: 2.5, unit: "inHg", kind: "none", finding: "near", source: "h-bp ch. 7, without a turbo" },
  {
    check: "back-pressure",
    value: 2,
    unit: "inHg",
    kind: "turbo or turbo-charge-cooled",
    finding: "over",
    source: "h-bp ch. 7, with a turbo",
  },
  { check: "back-pressure", value: 34, unit: "inH2O", kind: "none", finding: "near", source: "tm260 p. 135" },
  { check: "elbow-temp", value: 217, unit: "F", finding: "hot", source: "exht, cause for concern" },
  { check: "battery-rest-volts", value: 12.66, unit: "V", kind: "v12", finding: "full", source: "rvqa, full" },
  { check: "battery-rest-volts", value: 12.45, unit: "V", kind: "v12", finding: "part", source: "rvqa, 75 %" },
  { check: "battery-rest-volts", value: 12.3, unit: "V", kind: "v12", finding: "part", source: "rvqa, 50 %" },
  { check: "battery-rest-volts", value: 12.15, unit: "V", kind: "v12", finding: "low", source: "rvqa, 25 %" },
  { check: "battery-rest-volts", value: 12.24, unit: "V", kind: "v12", finding: "part", source: "bci, 50 %, from memory" },
  { check: "battery-rest-volts", value: 12.06, unit: "V", kind: "v12", finding: "low", source: "bci, 25 %, from memory" },
  { check: "battery-rest-volts", value: 11.89, unit: "V", kind: "v12", finding: "low", source: "bci, flat, from memory" },
  { check: "battery-rest-volts", value: 10.5, unit: "V", kind: "v12", finding: "very-low", source: "common practice, a dead cell" },
  { check: "battery-rest-volts", value: 25.32, unit: "V", kind: "v24", finding: "full", source: "rvqa, full, doubled" },
  { check: "alternator-volts", value: 14.5, unit: "V", kind: "v12", finding: "right", source: "m-alt, top" },
  { check: "alternator-volts", value: 27, unit: "V", kind: "v24", finding: "right", source: "m-alt, low end, doubled" },
  { check: "alternator-volts", value: 29, unit: "V", kind: "v24", finding: "right", source: "m-alt, top, doubled" },
  { check: "belt-tension", value: 12.7, unit: "mm", finding: "right", source: "common practice, half an inch" },
  { check: "belt-tension", value: 10, unit: "mm", finding: "right", source: "common practice, low end" },
  { check: "excitation", value: 1, unit: "V", kind: "v12", finding: "small", source: "common practice, low end of good" },
  { check: "excitation", value: 2, unit: "V", kind: "v12", finding: "small", source: "common practice, top of good" },
  { check: "excitation", value: 12, unit: "V", kind: "v12", finding: "full", source: "m-alt, what the exciter is fed with" },
  { check: "hydrometer-mean", value: 1.26, unit: "SG", finding: "full", source: "rvqa, low end of full" },
  { check: "hydrometer-mean", value: 1.2, unit: "SG", finding: "part", source: "rvqa, low end of half" },
  { check: "hydrometer-mean", value: 1.12, unit: "SG", finding: "very-low", source: "common practice, flat" },
  { check: "crank-rpm", value: 100, unit: "rpm", finding: "slow", source: "crk1, least for a cold start: slow, not hopeless" },
  { check: "crank-rpm", value: 180, unit: "rpm", finding: "fair", source: "crk1, least for a hot start" },
  { check: "crank-rpm", value: 240, unit: "rpm", finding: "healthy", source: "crk2, a car diesel with pre-chambers" },
  { check: "crank-rpm", value: 290, unit: "rpm", finding: "healthy", source: "m-cp1 p. 43, the speed at which compression is read" },
  { check: "filter-vacuum", value: 5, unit: "inHg", finding: "raised", source: "common practice, investigate" },
  { check: "lift-pump-pressure", value: 0.35, unit: "bar", finding: "in-order", source: "common practice, top for a small pump" },
  { check: "lift-pump-pressure", value: 5.5, unit: "psi", finding: "in-order", source: "lift3, 6.2 L engine" },
  { check: "injector-back-leak", value: 3, unit: "count", finding: "in-order", source: "tm397, low end" },
  { check: "injector-back-leak", value: 10, unit: "count", finding: "in-order", source: "tm397, high end" },
  { check: "compression", value: 2.9, unit: "MPa", finding: "good", source: "m-cp1 p. 43, standard" },
  { check: "compression", value: 30, unit: "bar", finding: "good", source: "m-cp3 p. 230, low end" },
  { check: "compression", value: 2.6 - 0.1, unit: "MPa", finding: "low", source: "m-cp1 p. 43, under the limit" },
  { check: "crank-pressure", value: 1, unit: "inH2O", finding: "light", source: "from memory, a new engine" },
  { check: "glow-amps", value: 100, unit: "%", finding: "full", source: "arithmetic: every plug draws its share" },
  { check: "glow-amps", value: (100 * 5) / 6, unit: "%", finding: "short", source: "arithmetic: one plug of six is dead" },
  { check: "glow-amps", value: (100 * 2) / 3, unit: "%", finding: "short", source: "arithmetic: one plug of three is dead" },
  { check: "glow-resistance", value: 12 ** 2 / 150, unit: "ohm", kind: "v12", finding: "alike", source: "glow1, 150 W at 12 V" },
  { check: "glow-resistance", value: 24 ** 2 / 150, unit: "ohm", kind: "v24", finding: "alike", source: "glow1, the same watts at 24 V" },
  { check: "rpm-noload", value: 1.05, unit: "times", finding: "reaches", source: "common practice, least droop" },
  { check: "rpm-noload", value: 1.12, unit: "times", finding: "reaches", source: "common practice, most droop" },
  {
    check: "lift-pump-volume",
    value: (100 * 300) / (15 * 20),
    unit: "%",
    finding: "enough",
    source: "common practice: a 20 kW engine, 300 ml a minute",
  },
  { check: "thermostat-pot", value: 79 / 77, unit: "times", finding: "right", source: "common practice, 2 degrees over a stamp of 77 °C" },
  { check: "thermostat-pot", value: 48 / 50, unit: "times", finding: "right", source: "common practice, 2 degrees under a stamp of 50 °C" },
  { check: "coolant-strength", value: 50, unit: "%", finding: "right", source: "common practice, mixed half and half" },
  {
    check: "raw-flow",
    value: (100 * 102) / 2 / (0.4 * 85),
    unit: "%",
    finding: "good",
    source: "tm277, 102 L/min at full speed, half of it at half the revs, for an engine of some 85 kW",
  },
  { check: "oil-use-rate", value: 0.3, unit: "%", finding: "usual", source: "common practice" },
  {
    check: "full-load-temperature",
    value: 165,
    unit: "F",
    kind: "heat-exchanger or keel",
    finding: "normal",
    source: "tm209-17, workboat, low end",
  },
  { check: "lamp-seconds", value: 15, unit: "s", finding: "stays-on", source: "m-crank, the limit for large engines" },
  { check: "oil-pressure-gauge", value: 10, unit: "psi", finding: "low", source: "from memory, 0.69 bar: the round figure in psi" },
  { check: "oil-pressure-cruise", value: 5, unit: "bar", finding: "good", source: "from memory, top of the common range" },
  { check: "gland-drip", value: 3, unit: "count", kind: "packed", finding: "in-order", source: "common practice, turning" },
];
