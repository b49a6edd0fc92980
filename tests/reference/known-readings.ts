/**
 * Every look of the trade that ends in a figure, in our own words, system by
 * system, and the readings of the tree that take it; or why none does.
 */
export type KnownReading = { look: string; readings?: readonly string[]; leftOut?: string };

const read = (look: string, ...readings: string[]): KnownReading => ({ look, readings });
const leftOut = (look: string, why: string): KnownReading => ({ look, leftOut: why });

export const KNOWN_READINGS: readonly KnownReading[] = [
  // Look, listen, feel
  read("seconds of cranking to the first firing", "start-time"),
  read("fuel in the tank by the stick", "tank-level"),
  read("give of a belt under the thumb", "belt-tension"),
  read("revs gained with the hatch open", "hatch-open"),
  leftOut("water at the outlet within 20 s", "the figure is the limit at which to stop; what is told is how much water comes"),
  leftOut(
    "white smoke gone within 3 to 5 min",
    "what tells causes apart is when it shows and how it smells; the minutes are the step's, to wait",
  ),
  leftOut("bottom paint older than 12 months", "a date from the log, not a reading; the season's growth differs by water"),

  // Battery, starting, charging
  read("rested volts", "battery-rest-volts", "disconnect-overnight"),
  read("specific gravity, mean and spread", "hydrometer-mean", "hydrometer-spread"),
  read("volts at the posts while cranking", "crank-volts"),
  read("volts at the starter while cranking", "volts-at-starter"),
  read("drop along the positive leg", "drop-positive"),
  read("drop along the negative leg", "drop-negative"),
  read("volts at the solenoid's small terminal", "start-signal-volts"),
  read("cranking speed", "crank-rpm"),
  read("starter current", "starter-amps"),
  read("alternator volts, and those that reach the battery", "alternator-volts", "alternator-to-battery"),
  read("volts at the exciter", "excitation"),
  read("ripple", "alternator-ripple"),
  read("charging current", "alternator-amps"),
  read("drain with all off", "off-drain"),
  read("drop from block to panel", "panel-ground"),
  read("volts at a solenoid that runs or stops the engine", "run-solenoid-volts", "stop-solenoid-volts"),
  read("volts between the banks", "banks-apart"),

  // Pre-heat
  read("volts at the plugs' bus bar", "glow-volts"),
  read("current of the plugs", "glow-amps"),
  read("resistance of each plug", "glow-resistance"),
  read("current of an intake heater", "intake-heater"),
  leftOut("seconds of pre-heat by the book", "the figure is how long to hold the key; whether it starts then is the finding"),

  // Fuel
  read("lift pump's delivery", "lift-pump-volume"),
  read("lift pump's pressure, before and after the filter", "lift-pump-pressure", "filter-pressure-drop"),
  read("feed pressure of unit injectors", "feed-pressure"),
  read("vacuum at the filter", "filter-vacuum", "filter-vacuum-teed", "vacuum-before-filter"),
  read("vacuum that the suction line holds", "suction-hold"),
  read("water in the fuel by laboratory", "water-ppm"),
  read("density of the fuel", "fuel-density"),
  read("temperature of the fuel against its cold limit", "fuel-temperature"),
  read("life of an element", "element-life"),
  leftOut(
    "contamination and cleanliness code",
    "a laboratory's second figure, noted beside the water; the target 18/16/13 is for fuel as delivered, not for a tank",
  ),
  leftOut("water drawn off, in ml", "that there is any is the finding; how much is noted in words"),

  // Injection
  read("heat of each exhaust port", "exhaust-port-temp"),
  read("opening pressure and back-leak of an injector", "injector-opening", "injector-back-leak"),
  leftOut("drip of an injector's seat within 5 s", "it drips or it does not; the seconds are how long to watch"),
  read("leak-off of each injector", "leakoff-compare"),
  read("rail pressure while cranking and under load", "rail-pressure", "rail-pressure-load"),
  leftOut(
    "injection timing, in degrees or mm",
    "mark and figure are each pump's own; on the mark or off it is the finding, for a mechanic",
  ),

  // Air and exhaust
  read("vacuum after the air filter", "intake-vacuum"),
  read("back pressure", "back-pressure"),
  read("heat of elbow and hose", "elbow-temp"),
  read("carbon monoxide below", "co-meter"),
  read("pressure in the crankcase", "crank-pressure"),
  read("boost, and heat of the charge air", "boost", "charge-air-temperature"),
  read("height of the elbow over the water", "elbow-height"),
  leftOut("bore of the elbow lost to soot, a quarter", "judged by torch and finger with the hose off; nobody measures soot"),

  // Raw water and coolant
  read("flow of raw water", "raw-flow"),
  read("temperature under load", "full-load-temperature"),
  read("gauge against infrared", "ir-vs-gauge"),
  read("rise of the raw water and drop of the coolant", "hx-rise", "hx-drop", "hx-inlet"),
  read("thermostat in a pan", "thermostat-pot"),
  read("pressure that a cap holds", "cap-test"),
  read("strength of the antifreeze", "coolant-strength"),
  leftOut("acidity of the coolant, pH 7.5", "a strip is read in colours against its own card; the card's colour is the finding"),
  leftOut(
    "fall of a pumped-up cooling system in 10 min",
    "the pressure pumped up differs by the cap; whether it holds, and where it goes, is the finding",
  ),
  leftOut("half of an anode gone", "judged by eye"),

  // Oil and mechanical
  read("oil pressure at hot idle and at cruise", "oil-pressure-gauge", "oil-pressure-cruise"),
  read("seconds until the oil lamp is out", "lamp-seconds"),
  read("fuel in the oil by laboratory", "oil-lab-fuel"),
  read("oil used", "oil-use-rate"),
  read("compression, and with oil", "compression", "wet-compression"),
  read("valve clearance", "valve-clearance"),
  read("top revs without load and in gear", "rpm-noload", "rpm-loaded"),
  read("idle", "idle-rpm"),
  read("rev counter against another", "tacho-true"),
  read("litres an hour", "fuel-burn"),
  leftOut(
    "spread of compression between cylinders",
    "compares the readings just taken, cylinder against cylinder; the limits that were read differ twofold by maker",
  ),
  leftOut("air lost in a leak-down", "where it hisses is the finding; the per cent differs by the tester"),
  leftOut("metals in the oil by laboratory", "a trend of each engine's own; a single figure says nothing"),

  // Drive line
  read("drips of the gland, and its heat", "gland-drip", "gland-temperature"),
  read("play in the shaft bearing, and run-out", "cutless-play", "shaft-runout"),
  read("alignment at the coupling", "alignment"),
  read("pressure in a hydraulic gearbox", "gear-pressure"),
  leftOut("age of a saildrive's rubber, often 7 years", "the maker's own interval against a date; past it or not is told in words"),
];
