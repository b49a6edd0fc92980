/**
 * Lists of causes as training courses and manuals print them, item by item in
 * our own words, and the causes of the shipped tree that stand for each.
 * One list stands once for every symptom that it is about.
 */
export type PublishedItem = {
  /** In our own words. */
  item: string;
  /** Causes that say it and show the list's symptom; or why there is none. */
  causes?: readonly string[];
  leftOut?: string;
};

export type PublishedList = {
  key: string;
  source: string;
  /** The symptom of the tree that the list is about. */
  symptom:
    | "hard-start-cold"
    | "hard-start-hot"
    | "lost-top-end-rpm"
    | "no-crank-silent"
    | "no-crank-click"
    | "not-charging"
    | "smoke-black"
    | "smoke-white"
    | "smoke-blue"
    | "runs-cold"
    | "low-oil-pressure"
    | "oil-level-rising"
    | "oil-milky"
    | "crankcase-fumes"
    | "runaway"
    | "misfire-rough"
    | "knock-combustion"
    | "hunting-surging"
    | "wont-stop"
    | "cranks-no-start-no-smoke";
  about: string;
  items: readonly PublishedItem[];
};

export const PUBLISHED_LISTS: readonly PublishedList[] = [
  {
    key: "ring wear, hard start",
    source: "en1c p. 3-28, fig. 3-18",
    symptom: "hard-start-cold",
    about: "low compression shows as a hard start",
    items: [
      { item: "worn rings", causes: ["rings-worn"] },
      { item: "rings stuck in their grooves", causes: ["rings-stuck"] },
      { item: "valves that leak", causes: ["valves-leaking", "valve-sticking"] },
      { item: "an injector's gasket that leaks gas", causes: ["injector-seat-leak"] },
      { item: "a head gasket that leaks", causes: ["head-gasket-blown"] },
      { item: "a choked air filter", causes: ["air-filter-blocked"] },
    ],
  },
  {
    key: "ring wear, lost power",
    source: "en1c p. 3-28, fig. 3-18",
    symptom: "lost-top-end-rpm",
    about: "low compression shows as lost power",
    items: [
      { item: "worn rings", causes: ["rings-worn"] },
      { item: "rings stuck in their grooves", causes: ["rings-stuck"] },
      { item: "valves that leak", causes: ["valves-leaking"] },
      { item: "an injector's gasket that leaks gas", leftOut: "heard and seen long before it costs revs; it shows as a hard start" },
      { item: "a head gasket that leaks", causes: ["head-gasket-blown"] },
      { item: "a choked air filter", causes: ["air-filter-blocked"] },
    ],
  },
  {
    key: "black smoke, Navy",
    source: "en3 p. en32-106",
    symptom: "lost-top-end-rpm",
    about: "black smoke under load is fuel without air, or too much load: it goes with lost revs",
    items: [
      {
        item: "back pressure in the exhaust",
        causes: ["exhaust-elbow-coked", "exhaust-manifold-coked", "exhaust-outlet-blocked", "exhaust-hose-delaminated"],
      },
      { item: "air held back on its way in", causes: ["air-filter-blocked", "intake-obstructed", "engine-space-airless"] },
      { item: "a turbo at fault", causes: ["turbo-fouled", "turbo-bearing-failed", "wastegate-stuck-open", "charge-air-leak"] },
      { item: "injection at the wrong moment", causes: ["injection-timing-late"] },
      { item: "an injector at fault", causes: ["injector-nozzle-blocked"] },
      {
        item: "fuel left unburnt by an injector that drips",
        leftOut: "a dribble smokes and knocks at part load and starts badly; it feeds too much, and costs no revs",
      },
      { item: "too much load", causes: ["hull-fouled", "prop-fouled-growth", "prop-oversized", "prop-rope"] },
      { item: "low compression from burnt valves", causes: ["valves-leaking"] },
      { item: "low compression from stuck rings", causes: ["rings-stuck"] },
    ],
  },
  {
    key: "black smoke, construction mechanic",
    source: "cmb p. 209",
    symptom: "lost-top-end-rpm",
    about: "black smoke under load",
    items: [
      { item: "the wrong grade of fuel", causes: ["wrong-fuel"] },
      { item: "too little air", causes: ["air-filter-blocked", "intake-obstructed", "engine-space-airless"] },
      { item: "back pressure", causes: ["exhaust-elbow-coked", "exhaust-outlet-blocked"] },
      { item: "timing of the injection", causes: ["injection-timing-late"] },
      { item: "the injection pump", causes: ["injection-pump-worn"] },
      { item: "valve clearances", causes: ["valve-clearance-wide"] },
      { item: "nozzles", causes: ["injector-nozzle-blocked"] },
      {
        item: "the advance unit",
        leftOut: "a cold-start device stuck on shows as a bad start; stuck late it reads as injection-timing-late",
      },
    ],
  },
  {
    key: "white smoke, construction mechanic",
    source: "cmb p. 209",
    symptom: "hard-start-cold",
    about: "white smoke is fuel that does not catch: it goes with a hard cold start",
    items: [
      { item: "low compression from rings", causes: ["rings-worn", "rings-stuck", "bores-glazed"] },
      {
        item: "a scored piston",
        leftOut:
          "the tree holds it as worn rings and bores: the same readings and the same work; the piston that picks up when hot is piston-seized",
      },
      {
        item: "valves that do not seat",
        causes: ["valves-leaking", "valve-clearance-tight", "valve-sticking", "decompressor-misadjusted"],
      },
      { item: "water in the combustion chamber", causes: ["head-gasket-blown", "waterlock-flooded"] },
      { item: "injectors", causes: ["injector-dribble", "injector-low-pressure"] },
      { item: "fuel of low cetane", causes: ["low-cetane-stale-fuel"] },
    ],
  },
  {
    key: "smoke, education body",
    source: "ens, December 2011",
    symptom: "lost-top-end-rpm",
    about: "black smoke, and black smoke at high revs only",
    items: [
      { item: "the air inlet", causes: ["air-filter-blocked", "intake-obstructed"] },
      { item: "carbon in the exhaust elbow or its hose", causes: ["exhaust-elbow-coked", "exhaust-hose-delaminated"] },
      { item: "a line round the propeller", causes: ["prop-rope"] },
      { item: "a fouled hull", causes: ["hull-fouled", "prop-fouled-growth"] },
      { item: "equipment driven by the engine", causes: ["accessory-load"] },
      { item: "a propeller too large", causes: ["prop-oversized"] },
    ],
  },
  {
    key: "misfire, Navy",
    source: "en2 p. 3-31",
    symptom: "lost-top-end-rpm",
    about: "a misfire costs power",
    items: [
      { item: "the fuel", causes: ["water-in-fuel", "wrong-fuel", "microbial-growth"] },
      { item: "an injector that does not deliver", causes: ["injector-nozzle-blocked"] },
      { item: "worn parts of the injection", causes: ["injection-pump-worn"] },
      { item: "the air cleaner", causes: ["air-filter-blocked"] },
      { item: "compression lost by valves", causes: ["valves-leaking"] },
      { item: "compression lost by pistons, liners and rings", causes: ["rings-worn"] },
      { item: "compression lost by the gasket", causes: ["head-gasket-blown"] },
      {
        item: "a cracked head or block",
        leftOut: "leaks coolant or gas and overheats; it belongs to those symptoms, and is found behind a head gasket here",
      },
      { item: "a cut-out left engaged", leftOut: "a device of engines larger than these" },
    ],
  },
  {
    key: "misfire, education body",
    source: "ens, December 2011",
    symptom: "lost-top-end-rpm",
    about: "an irregular miss that gets worse with speed",
    items: [
      { item: "a plugged filter", causes: ["primary-filter-blocked", "secondary-filter-blocked", "final-filter-blocked"] },
      { item: "water in the fuel", causes: ["water-in-fuel"] },
      { item: "dirt in the fuel", causes: ["microbial-growth", "pickup-blocked", "inlet-screen-blocked", "lift-pump-strainer-blocked"] },
    ],
  },
  {
    key: "misfire worse when cold, education body",
    source: "ens, December 2011",
    symptom: "hard-start-cold",
    about: "a regular miss of one cylinder or more, worse when cold, is compression",
    items: [{ item: "compression", causes: ["valves-leaking", "rings-worn", "rings-stuck", "valve-clearance-tight"] }],
  },
  {
    key: "air in the fuel",
    source: "ase p. 207",
    symptom: "hard-start-cold",
    about: "air in the system: bleed until no bubbles come",
    items: [
      { item: "loose joints", causes: ["fuel-line-air-leak", "primary-filter-seal-leak", "bleed-point-leak", "primer-leak"] },
      { item: "a nozzle that does not close", causes: ["injector-dribble"] },
      { item: "the tank run out", leftOut: "an engine that has run out stops or does not start; the level is asked first all the same" },
      { item: "a dirty nozzle", leftOut: "black smoke, a miss and lost revs (injector-nozzle-blocked), not a bad start" },
    ],
  },
  {
    key: "will not crank as it should",
    source: "tm383 problem 29",
    symptom: "hard-start-cold",
    about: "the starting system weak: on the way to silence it cranks slowly and starts badly",
    items: [
      { item: "a battery that is low", causes: ["battery-discharged", "battery-worn"] },
      {
        item: "a cable or its connection",
        causes: ["positive-connection-bad", "engine-ground-bad", "battery-switch-fault", "start-cable-undersized"],
      },
      { item: "the starter", causes: ["starter-motor-worn"] },
      { item: "the solenoid", leftOut: "it clicks or does not, and then cranks as it should: a symptom of its own, not in this tree" },
      { item: "the start switch's circuit", leftOut: "no crank at all, or a full one: a symptom of its own, not in this tree" },
      { item: "an engine seized inside", leftOut: "does not turn; the stop rule for one that stops dead comes before any step" },
    ],
  },
  {
    key: "will not crank as it should, hot",
    source: "tm383 problem 29",
    symptom: "hard-start-hot",
    about: "the same parts, worse by heat",
    items: [
      { item: "a battery that is low", causes: ["battery-worn"] },
      { item: "a cable or its connection", causes: ["positive-connection-bad", "engine-ground-bad", "battery-switch-fault"] },
      { item: "the starter", causes: ["starter-motor-worn"] },
      { item: "an engine that binds inside", causes: ["piston-seized"] },
    ],
  },
  {
    key: "no smoke while cranking",
    source: "m-crank, a maker's operating text",
    symptom: "hard-start-cold",
    about: "no blue or white smoke while it cranks: no fuel is delivered",
    items: [
      {
        item: "no fuel delivered",
        causes: ["fuel-drains-back", "fuel-line-air-leak", "electric-pump-check-valve-leak", "injector-leakoff-high"],
      },
    ],
  },
  {
    key: "engine does not crank, silent",
    source: "tm383 prob. 29",
    symptom: "no-crank-silent",
    about: "an engine that will not crank, where nothing is heard",
    items: [
      { item: "low battery", causes: ["battery-discharged"] },
      { item: "cables and connections", causes: ["positive-connection-bad", "engine-ground-bad", "battery-switch-fault"] },
      { item: "solenoid", causes: ["starter-solenoid-worn"] },
      { item: "starter", causes: ["starter-motor-worn", "starter-seized"] },
      { item: "seized inside", leftOut: "the solenoid clunks against it: it is heard, and stands under the click" },
      {
        item: "switch and its circuit",
        causes: ["key-switch-faulty", "start-circuit-volt-drop", "neutral-switch-open", "start-fuse-open"],
      },
    ],
  },
  {
    key: "engine does not crank, with a click",
    source: "tm383 prob. 29",
    symptom: "no-crank-click",
    about: "an engine that will not crank, where something clicks",
    items: [
      { item: "low battery", causes: ["battery-discharged", "battery-dead-cell"] },
      { item: "cables and connections", causes: ["positive-connection-bad", "engine-ground-bad"] },
      { item: "solenoid", causes: ["starter-solenoid-worn"] },
      { item: "starter", causes: ["starter-motor-worn", "starter-seized"] },
      { item: "seized inside", causes: ["piston-seized"] },
      { item: "switch and its circuit", causes: ["start-circuit-volt-drop", "harness-plug-corroded", "start-relay-failed"] },
    ],
  },
  {
    key: "no charge, workboat",
    source: "tm209-21 table 4-1, item 12",
    symptom: "not-charging",
    about: "the ammeter shows no charge",
    items: [
      { item: "loose connection", causes: ["alternator-output-open", "excitation-missing"] },
      { item: "belt slack or broken", causes: ["alternator-belt-slack", "alternator-belt-broken"] },
      { item: "the ammeter itself", causes: ["panel-ground-bad"] },
    ],
  },
  {
    key: "black smoke as the complaint, Navy",
    source: "en3 p. en32-106",
    symptom: "smoke-black",
    about: "fuel that is not burnt",
    items: [
      { item: "back pressure in the exhaust", causes: ["exhaust-elbow-coked", "exhaust-manifold-coked", "exhaust-outlet-blocked"] },
      { item: "air held back on its way in", causes: ["air-filter-blocked", "intake-obstructed", "engine-space-airless"] },
      { item: "a turbo at fault", causes: ["turbo-fouled", "charge-air-leak"] },
      { item: "injection at the wrong moment", causes: ["injection-timing-late"] },
      { item: "an injector at fault", causes: ["injector-dribble", "injector-low-pressure"] },
      { item: "too much load", causes: ["hull-fouled", "prop-oversized", "accessory-load"] },
      { item: "low compression by valves or rings", causes: ["valves-leaking", "rings-stuck"] },
    ],
  },
  {
    key: "black smoke as the complaint, construction mechanic",
    source: "cmb p. 209",
    symptom: "smoke-black",
    about: "fuel that is not burnt",
    items: [
      { item: "the wrong grade of fuel", causes: ["low-cetane-stale-fuel"] },
      { item: "too little air", causes: ["air-filter-blocked"] },
      { item: "back pressure", causes: ["exhaust-elbow-coked"] },
      { item: "pump timing", causes: ["injection-timing-late"] },
      { item: "the pump itself", causes: ["injection-pump-worn"] },
      { item: "valve clearances", causes: ["valve-clearance-tight"] },
      { item: "nozzles", causes: ["injector-dribble"] },
      { item: "the advance unit", causes: ["cold-advance-or-excess-fuel-fault"] },
    ],
  },
  {
    key: "white smoke as the complaint, construction mechanic",
    source: "cmb p. 209",
    symptom: "smoke-white",
    about: "fuel that is not hot enough to burn, or water in the cylinder",
    items: [
      { item: "rings that let compression by", causes: ["rings-worn"] },
      { item: "a scored piston", causes: ["piston-or-rod-damaged"] },
      { item: "valves that do not seat", causes: ["valves-leaking"] },
      { item: "water in the chamber", causes: ["head-gasket-blown", "head-or-block-cracked"] },
      { item: "injectors", causes: ["injector-dribble"] },
      { item: "fuel that ignites badly", causes: ["low-cetane-stale-fuel"] },
    ],
  },
  {
    key: "blue smoke, construction mechanic",
    source: "cmb p. 209",
    symptom: "smoke-blue",
    about: "oil that is burnt",
    items: [
      { item: "too much oil", causes: ["oil-overfilled"] },
      { item: "the breather", causes: ["breather-blocked", "breather-oil-carryover"] },
      { item: "valve guides", causes: ["valve-guides-worn"] },
      { item: "rings and bores", causes: ["rings-worn"] },
      { item: "scored pistons", causes: ["piston-or-rod-damaged"] },
      { item: "the turbo's oil seal", causes: ["turbo-oil-seal-leak"] },
      { item: "glazed liners", causes: ["bores-glazed"] },
    ],
  },
  {
    key: "blue smoke, Navy",
    source: "en3 p. en32-106",
    symptom: "smoke-blue",
    about: "oil that is burnt; the course calls it bluish white",
    items: [
      { item: "worn or stuck rings", causes: ["rings-worn", "rings-stuck"] },
      { item: "worn liners", causes: ["rings-worn", "bores-glazed"] },
      { item: "valve guides", causes: ["valve-guides-worn"] },
      { item: "a cracked piston", causes: ["piston-or-rod-damaged"] },
      { item: "an injector that leaks", causes: ["injector-dribble"] },
    ],
  },
  {
    key: "black smoke, education body",
    source: "ens, December 2011",
    symptom: "smoke-black",
    about: "black smoke, and black smoke at high revs",
    items: [
      { item: "the air inlet", causes: ["air-filter-blocked"] },
      { item: "carbon in the exhaust elbow's hose", causes: ["exhaust-elbow-coked"] },
      { item: "a line round the propeller", causes: ["prop-rope"] },
      { item: "a fouled hull", causes: ["hull-fouled"] },
      { item: "equipment the engine drives", causes: ["accessory-load"] },
      { item: "a propeller that is too large", causes: ["prop-oversized"] },
    ],
  },
  {
    key: "runs cold, roller",
    source: "tm383 problem 27",
    symptom: "runs-cold",
    about: "the coolant does not reach its temperature",
    items: [
      { item: "long idling or light load", causes: ["light-load-idling"] },
      { item: "the regulator stuck open", causes: ["thermostat-stuck-open"] },
    ],
  },
  {
    key: "oil pressure, Navy",
    source: "en1c ch. 9",
    symptom: "low-oil-pressure",
    about: "what is looked at once the engine is stopped for lost pressure",
    items: [
      { item: "the level in the sump", causes: ["oil-level-low"] },
      { item: "the piping", causes: ["oil-leak-external"] },
      { item: "the filters", causes: ["oil-filter-blocked", "oil-filter-misfitted"] },
      { item: "the strainers", causes: ["oil-pickup-blocked"] },
      { item: "the pump", causes: ["oil-pump-worn"] },
    ],
  },
  {
    key: "oil pressure, truck",
    source: "tm272 table 4-1, item 7",
    symptom: "low-oil-pressure",
    about: "with a good pump the pressure is lost in the bearings",
    items: [
      { item: "the pump", causes: ["oil-pump-worn"] },
      { item: "worn bearings of the crank", causes: ["bearings-worn"] },
      {
        item: "worn bearings of the cam",
        leftOut: "opened by the same workshop in the same job; no check aboard tells them from the crank's",
      },
    ],
  },
  {
    key: "fuel in the oil, truck",
    source: "tm272 table 4-1, item 8",
    symptom: "oil-level-rising",
    about: "fuel thins the oil and raises its level",
    items: [{ item: "the injectors", causes: ["injector-dribble"] }],
  },
  {
    key: "coolant in the oil, truck",
    source: "tm272 table 4-1, item 8",
    symptom: "oil-milky",
    about: "coolant makes the oil milky",
    items: [
      { item: "the head gasket", causes: ["head-gasket-blown"] },
      { item: "head, liner or block", causes: ["head-or-block-cracked"] },
      { item: "the oil cooler", causes: ["oil-cooler-internal-leak"] },
      {
        item: "core plugs of the head",
        leftOut: "found by the pressure test with the head's cover off, and mended as a cracked casting is",
      },
    ],
  },
  {
    key: "coolant in the oil, by the level",
    source: "tm272 table 4-1, item 8",
    symptom: "oil-level-rising",
    about: "coolant that gets into the oil raises its level too",
    items: [
      { item: "the head gasket", causes: ["head-gasket-blown"] },
      { item: "head, liner or block", causes: ["head-or-block-cracked"] },
      { item: "the oil cooler", causes: ["oil-cooler-internal-leak"] },
    ],
  },
  {
    key: "ring wear, blow-by",
    source: "en1c p. 3-28, fig. 3-18",
    symptom: "crankcase-fumes",
    about: "worn rings let gas into the crankcase",
    items: [
      { item: "rings worn or stuck", causes: ["rings-worn", "rings-stuck"] },
      { item: "a head gasket that leaks", causes: ["head-gasket-blown"] },
      { item: "an injector's gasket that leaks gas", causes: ["injector-seat-leak"] },
      {
        item: "valves that leak",
        leftOut: "they leak into ports and manifolds, not into the crankcase; listed there as a cause of low compression",
      },
      {
        item: "a choked air filter",
        leftOut: "costs compression and draws oil from the breather, but makes no gas below; listed as low compression",
      },
    ],
  },
  {
    key: "runaway, Navy",
    source: "en2 p. 3-37",
    symptom: "runaway",
    about: "an engine that overspeeds and does not obey",
    items: [
      { item: "the governor or its linkage", causes: ["governor-worn", "governor-linkage-sticking"] },
      { item: "a control rack that jams", causes: ["injection-rack-stuck"] },
      { item: "oil in the air passages", causes: ["breather-oil-carryover", "oil-overfilled", "turbo-oil-seal-leak"] },
      { item: "an injector that leaks", leftOut: "on these engines it thins the oil first; the runaway is then that of oil-fuel-diluted" },
    ],
  },
  {
    key: "misfire as the complaint, Navy",
    source: "en2 p. 3-31",
    symptom: "misfire-rough",
    about: "cylinders that do not fire evenly",
    items: [
      { item: "the fuel", causes: ["water-in-fuel", "wrong-fuel", "dirt-sediment", "fuel-line-air-leak"] },
      { item: "an injector that does not deliver", causes: ["injector-nozzle-blocked", "injector-dribble"] },
      { item: "worn parts of the injection", causes: ["injection-pump-worn", "delivery-valve-leak"] },
      { item: "the air cleaner", causes: ["air-filter-blocked"] },
      { item: "compression lost by valves", causes: ["valves-leaking", "valve-sticking"] },
      { item: "compression lost by pistons, liners and rings", causes: ["rings-worn", "rings-stuck", "piston-or-rod-damaged"] },
      { item: "compression lost by the gasket", causes: ["head-gasket-blown"] },
      { item: "a cracked head or block", causes: ["head-or-block-cracked"] },
      { item: "a cut-out left engaged", causes: ["decompressor-misadjusted"] },
    ],
  },
  {
    key: "misfire as the complaint, education body",
    source: "ens, December 2011",
    symptom: "misfire-rough",
    about: "a regular miss is a cylinder, worse cold it is compression; an irregular one is fuel, worse with speed",
    items: [
      { item: "compression", causes: ["valves-leaking", "rings-worn", "rings-stuck", "valve-clearance-tight"] },
      { item: "dirt", causes: ["dirt-sediment"] },
      { item: "water", causes: ["water-in-fuel"] },
      { item: "a plugged filter", causes: ["primary-filter-blocked"] },
    ],
  },
  {
    key: "air in the fuel, misfire",
    source: "ase p. 207",
    symptom: "misfire-rough",
    about: "air in the system, and nozzles, make it miss",
    items: [
      { item: "loose joints", causes: ["fuel-line-air-leak"] },
      { item: "air left by the last opening", causes: ["air-after-service", "hp-line-air"] },
      { item: "a nozzle that does not close", causes: ["injector-dribble"] },
      { item: "a dirty nozzle", causes: ["injector-nozzle-blocked"] },
      { item: "the tank run out", leftOut: "these small engines falter and stop within a minute: fades-and-stops, and no start after it" },
    ],
  },
  {
    key: "air in the fuel, no start",
    source: "ase p. 207",
    symptom: "cranks-no-start-no-smoke",
    about: "air in the system: no fuel is injected until no bubbles come",
    items: [
      { item: "loose joints", causes: ["fuel-line-air-leak", "primary-filter-seal-leak"] },
      { item: "air left by the last opening", causes: ["air-after-service", "hp-line-air"] },
      { item: "the tank run out", causes: ["tank-empty", "wrong-tank-selected"] },
      { item: "a nozzle that does not close", leftOut: "it lets air back into one pipe; the others inject, and there is smoke" },
      { item: "a dirty nozzle", leftOut: "one cylinder of several; it starts, with a miss and black smoke" },
    ],
  },
  {
    key: "knock, Army course",
    source: "tr0656 p. 93, item g",
    symptom: "knock-combustion",
    about: "a detonation that is heard",
    items: [
      { item: "injectors that leak", causes: ["injector-dribble", "injector-low-pressure"] },
      { item: "fuel connections in the head", causes: ["hp-pipe-leak"] },
      { item: "the control rack", causes: ["injection-rack-stuck"] },
      { item: "lash adjusters", causes: ["valve-clearance-wide"] },
      { item: "air seals of a two-stroke", leftOut: "these engines are four-strokes; there are none" },
    ],
  },
  {
    key: "control racks, Navy: hunting",
    source: "en2 p. 3-36",
    symptom: "hunting-surging",
    about: "a rack that sticks makes the engine hunt",
    items: [
      { item: "a sticking or jammed rack", causes: ["injection-rack-stuck"] },
      { item: "the governor's linkage", causes: ["governor-linkage-sticking"] },
      { item: "the governor itself", causes: ["governor-worn"] },
    ],
  },
  {
    key: "control racks, Navy: will not stop",
    source: "en2 p. 3-36",
    symptom: "wont-stop",
    about: "a rack that jams open keeps the engine running",
    items: [
      { item: "a jammed rack", causes: ["injection-rack-stuck"] },
      {
        item: "governor and linkage",
        leftOut:
          "on these pumps the stop lever moves the rack past the governor; what keeps it from stopping is the rack itself, or the stop",
      },
    ],
  },
];
