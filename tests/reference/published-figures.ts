/**
 * Figures that were read in a source, or are recalled from one, and where the
 * tree uses each: an edge of a reading (checked with its number in
 * band-figures.ts), a value that has to fall in a band (LIES_IN there), or
 * words of a node. What it does not use says why.
 */
export type PublishedFigure = {
  figure: string;
  source: string;
  standing: "read" | "from-memory";
  edges?: readonly string[];
  liesIn?: readonly string[];
  words?: readonly { node: string; say: RegExp }[];
  leftOut?: string;
};

type Use = Pick<PublishedFigure, "edges" | "liesIn" | "words" | "leftOut">;
const seen = (figure: string, source: string, use: Use): PublishedFigure => ({ figure, source, standing: "read", ...use });
const recalled = (figure: string, source: string, use: Use): PublishedFigure => ({ figure, source, standing: "from-memory", ...use });

export const PUBLISHED_FIGURES: readonly PublishedFigure[] = [
  // Starting and charging
  seen("drops of cable, switch and solenoid, 0.5 V in all on the positive side", "tm256-4 p. CGES-230-8", {
    edges: ["drop-positive: small | over [v12]"],
  }),
  seen("0.2 V from starter to the negative post", "tm256-4 p. CGES-230-8", { edges: ["drop-negative: small | over [v12]"] }),
  seen("charge a 12 V battery under 8 V, a 24 V one under 16", "tm383 problem 29", {
    leftOut: "a roller's figure, 1.5 V under what passes and under what an electronic engine needs; it would let bad batteries by",
  }),
  recalled("9.6 V while cranking passes, 19.2 on 24 V", "bci with SAE J537", {
    edges: ["crank-volts: low | marginal [v12]", "crank-volts: low | marginal [v24]"],
  }),
  seen("rested 12.66, 12.45, 12.30, 12.15 V", "rvqa", { liesIn: ["battery-rest-volts"] }),
  recalled("rested 12.65, 12.45, 12.24, 12.06, 11.89 V", "bci", { liesIn: ["battery-rest-volts"] }),
  seen("specific gravity 1.280 to 1.260 full, 1.220 to 1.200 half", "rvqa", { liesIn: ["hydrometer-mean"] }),
  seen("13.5 to 14.5 V while charging", "m-alt", { edges: ["alternator-volts: low | right [v12]"], liesIn: ["alternator-volts"] }),
  seen("starter on for 30 s at most, then 2 min of rest", "m-crank", {
    words: [{ node: "stop rule starter-limit", say: /cool 2 minutes at least/ }],
  }),
  seen("no smoke while cranking: no fuel is delivered", "m-crank", {
    words: [{ node: "check smoke-crank", say: /No smoke while cranking means no fuel/ }],
  }),
  seen("a car's diesel starts cold at 100 rpm, hot at 180", "crk1", { edges: ["crank-rpm: very-slow | slow"], liesIn: ["crank-rpm"] }),
  seen("a car's pre-chamber diesel wants 240 rpm", "crk2", { liesIn: ["crank-rpm"] }),
  seen("a plug of 150 W at 12 V draws 12.5 A, four of them 50 A", "glow1", {
    words: [{ node: "check glow-amps", say: /150 W plug at 12 V draws 12\.5 A, four 50 A/ }],
    liesIn: ["glow-resistance"],
  }),
  seen("hydrogen burns from 4.1 to 72 % in air", "ccohs", { words: [{ node: "source ccohs", say: /4\.1 to 72 %/ }] }),

  // Oil
  seen("oil pressure must show 15 s after the start", "m-crank", { liesIn: ["lamp-seconds"] }),
  seen("oil at 115 °C at most, 10W-30", "tm383 p. 331", {
    leftOut: "few small auxiliaries have an oil thermometer, and no check asks for one",
  }),

  // Air and exhaust
  seen("25 inH2O of air restriction", "tm260 p. 135", { liesIn: ["intake-vacuum"] }),
  seen("34 inH2O of back pressure", "tm260 p. 135", { liesIn: ["back-pressure"] }),
  seen("39 inH2O of back pressure without a turbo", "m-bp pp. 11-12", { edges: ["back-pressure: near | over [none]"] }),
  seen("19.5 inH2O of back pressure with a turbo", "m-bp pp. 11-12", {
    edges: ["back-pressure: near | over [turbo or turbo-charge-cooled]"],
  }),
  seen("2.5 and 2.0 inHg of back pressure", "h-bp ch. 7", { liesIn: ["back-pressure"] }),
  seen("a wet exhaust's bore is 1.4 times the dry one's", "h-bp ch. 7", {
    leftOut: "for who builds an exhaust; no check measures the bore",
  }),
  seen("1 m3 of air a minute for each 10 hp", "air", {
    words: [
      { node: "check hatch-open", say: /1 m3 of air a minute for each 10 hp/ },
      { node: "remedy air-engine-space", say: /1 m3 a minute for each 10 hp/ },
    ],
  }),
  seen("exhaust alarm at 165 °F, 217 °F a cause for concern", "exht", { liesIn: ["elbow-temp"] }),
  seen("white smoke gone in 3 to 5 min", "cmb p. 209", { words: [{ node: "check smoke-run", say: /does not clear in 5 minutes/ }] }),

  // Fuel
  seen("lift pump: a third of a pint in 10 s at 6 to 8 psi", "lift2", {
    leftOut: "a 7.3 L engine's pump; a good pump of a small one would be condemned",
  }),
  seen("lift pump: a pint in 30 to 45 s", "lift3", { leftOut: "a 6.2 L engine's pump; the small one is judged by its need" }),
  seen("lift pump: 5.5 to 6.5 psi", "lift3", { edges: ["lift-pump-pressure: in-order | high"], liesIn: ["lift-pump-pressure"] }),
  seen("3.75 inHg at the pump's inlet at most", "lift1", {
    edges: ["filter-vacuum: in-order | raised otherwise", "filter-vacuum-teed: in-order | raised otherwise"],
  }),
  seen("0.75 L in 30 s", "lift1", { leftOut: "a 5.9 L engine's pump; the small one is judged by its need" }),
  seen("change a filter at 3 to 4 inHg over its clean reading", "vac1", {
    edges: ["filter-vacuum: raised | high plus", "filter-vacuum-teed: raised | high plus"],
  }),
  seen("200 kPa to unit injectors at full load", "tm383 problem 5", { edges: ["feed-pressure: low | in-order"] }),
  seen("EN 590 as tabled: water 200 mg/kg", "nzf", { edges: ["water-ppm: within | over"] }),
  seen("EN 590 as tabled: contamination 24 mg/kg", "nzf", { words: [{ node: "check water-ppm", say: /24 mg\/kg/ }] }),
  seen("EN 590 as tabled: cetane 51, flash point 61 °C", "nzf", { leftOut: "no one aboard measures either" }),
  recalled("EN 590: flash point over 55 °C", "en590", { leftOut: "no one aboard measures it" }),
  recalled("D975 No. 2: water and sediment 0.05 % of the volume", "d975", {
    leftOut: "the tighter European limit stands; the other is cited beside it",
  }),
  recalled("ISO 8217, DMA and DMB", "iso8217", { leftOut: "ships' fuel, not sold to these boats" }),
  seen("cleanliness 18/16/13, under 200 ppm of water", "wwfc", {
    leftOut: "a target for fuel as delivered; the water is the same 200 as in EN 590",
  }),
  seen("what the numbers of ISO 4406 count", "iso4406", { leftOut: "a laboratory's code; no check reads it" }),
  seen("fuel lift of 6 ft at most", "m-bp next page", { leftOut: "for who fits an engine; a small pump's own height is the maker's" }),

  // Compression and injectors
  seen("2.9 MPa, limit 2.6 MPa, 290 rpm", "m-cp1 p. 43", { edges: ["compression: low | good"], liesIn: ["compression", "crank-rpm"] }),
  seen("within 10 % of each other", "m-cp2", { words: [{ node: "check compression-pattern", say: /10 % apart/ }] }),
  seen("30 to 32 bar, 5 bar apart at most", "m-cp3 p. 230", { liesIn: ["compression"] }),
  seen("25 psi apart at 600 rpm", "tm303", {
    leftOut: "a large two-stroke's; the spread in the tree, 3 bar or 10 %, lies between those of the small engines",
  }),
  seen("a nozzle's seat holds 5 s at 400 to 500 psi below opening", "tm397", {
    words: [{ node: "check injector-spray", say: /28 to 35 bar|5 s|five seconds/ }],
  }),
  seen("back-leak of 3 to 10 drops in 30 s at 1 500 psi", "tm397", {
    edges: ["injector-back-leak: in-order | high"],
    liesIn: ["injector-back-leak"],
  }),
  seen("a jet goes through skin from 100 psi, up to 100 mm away", "inj2", {
    words: [{ node: "source inj2", say: /700 kPa, up to 100 mm/ }],
  }),
  recalled("common rail holds 1,000 to 2,000 bar", "common-practice", {
    words: [{ node: "stop rule common-rail", say: /1,000 to 2,000 bar/ }],
  }),

  // Cooling
  seen("165 to 195 °F, a workboat", "tm209-17", { liesIn: ["full-load-temperature"] }),
  seen("act above 185 °F, a landing craft with keel coolers", "tm217 2-12c", {
    leftOut: "contradicts the workboat's; small engines go by their thermostat's stamp and their own normal",
  }),
  seen("never above 194 °F, a bridge boat", "tm277", { leftOut: "as the landing craft's; the alarm is commonly at about 95 °C" }),
  seen("27 US gallons of raw water a minute, a six-cylinder at full speed", "tm277", { liesIn: ["raw-flow"] }),
  seen("a raw-water pump may run dry for 20 s", "m-rwp", {
    words: [
      { node: "stop rule running-dry", say: /more than 20 seconds/ },
      { node: "check exhaust-water", say: /None after 20 seconds/ },
    ],
  }),
  seen("drain a tank at 500 h, clean the cooling at 1,000 h or a year", "tm359", { leftOut: "upkeep, not fault finding" }),

  // Drive line
  seen("faces 0.003 in, run-out 0.002 in", "m-align p. 39", { edges: ["alignment: in-line | doubtful", "shaft-runout: in-line | some"] }),
  seen("0.002 in for each inch of flange", "align2", { edges: ["alignment: doubtful | out"] }),
  seen("a towed hydraulic gear: 5 min of neutral running every 8 h", "tm221 2-11.1", {
    leftOut: "no default holds for small boxes: obey the maker, else lock the shaft",
  }),
  seen("cruise 200 rpm under the most it reaches", "tm209-17", { leftOut: "advice for wear, not a sign of a fault" }),

  // Standards
  seen("engine-mounted parts stand -10 to +80 °C, leak-free", "iso16147 4.1, 5.1", {
    leftOut: "a builder's range; the rule against fuel mist cites it for leak-free joints",
  }),
  seen("a lifeboat's engine starts within 2 min at -15 °C", "lsa", { leftOut: "another class of engine, and no sign of a fault" }),
];
