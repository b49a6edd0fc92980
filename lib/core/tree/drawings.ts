/** A drawing of our own: what it is called, and what it shows, for those who cannot see it or have not got it. */
export type DrawingWords = { title: string; describes: string };

/** Every drawing that a check, a remedy or a stop rule may name. Its picture is components/drawing/<key>.tsx. */
export const DRAWINGS = {
  "battery-scale": {
    title: "What a rested battery's volts mean",
    describes:
      "A scale for a rested 12 V lead battery, with the 24 V figures beside it. From 12.5 V up it is full or nearly (24 V: from 25.0). 12.2 to 12.5 V is half to three quarters (24.4 to 25.0). 11.0 to 12.2 V is under half (22.0 to 24.4). Under 11.0 V it is flat or a cell is dead (under 22.0).",
  },
  "belt-deflection": {
    title: "How far a belt may give",
    describes:
      "Two pulleys with a belt, seen from the front. A straight edge lies over both on the longest free span. The thumb presses the middle of the span, and the belt gives 10 to 13 mm where the span is 300 mm.",
  },
  "bleeding-order": {
    title: "Bleeding order, from tank to injector",
    describes:
      "Six stations in order. The tank cock is open. One: the top of the primary filter. Two: the lift pump, worked by its lever. Three: the bleed screw of the engine's filter. Four: the bleed screw of the injection pump. Five: the injector unions, which are for a mechanic. On common rail or unit injectors nothing is opened after three.",
  },
  "clear-hose": {
    title: "Clear hose on the suction side",
    describes:
      "A length of clear hose stands between the primary filter and the lift pump, clipped at both ends. Bubbles that pass through it mean that air gets in before this point, on the way from the tank.",
  },
  "coolant-levels": {
    title: "Coolant levels on a cold engine",
    describes:
      "The header tank with its cap off, full to the neck, and beside it the overflow bottle, its level between the low and the high mark. The cap is opened on a cold engine only.",
  },
  decompressor: {
    title: "What the decompression lever does",
    describes:
      "Two views of a valve with its rocker. In run, the lever's cam stands clear of the rocker with a little play, and the valve shuts. Lifted, the cam presses the rocker and holds the valve off its seat, so that there is no compression.",
  },
  dipstick: {
    title: "Oil on the dipstick",
    describes:
      "Three dipsticks with a low and a high mark. Too low: the oil ends under the low mark. Right: it ends between the marks. Over full: it stands above the high mark, which may be fuel or water in the oil.",
  },
  "drop-negative": {
    title: "Meter for the volts lost in the negative leg",
    describes:
      "The start circuit: battery, switch, starter, and the engine as the way back. One probe of the voltmeter is on bare metal of the starter's body, the other on the battery's negative post. It is read while the starter is held on.",
  },
  "drop-positive": {
    title: "Meter for the volts lost in the positive leg",
    describes:
      "The start circuit: battery, switch, starter, and the engine as the way back. One probe of the voltmeter is on the battery's positive post, the other on the big stud of the starter. It is read while the starter is held on.",
  },
  "elbow-section": {
    title: "Exhaust elbow, clean and choked",
    describes:
      "Two elbows cut open. Gas comes from the engine, raw water joins it, and both leave downwards. In the clean one the whole bore is open. In the choked one carbon and scale have grown on the wall where the water joins and leave a narrow way.",
  },
  "exhaust-outlet": {
    title: "Exhaust outlet with its flap",
    describes:
      "The outlet in the stern, just above the water, cut open. Free: the flap swings out and gas and water leave. Blocked: growth in the pipe and a flap that does not swing hold the gas back.",
  },
  "fuel-path": {
    title: "The fuel's way from tank to injector",
    describes:
      "From the top down: tank with pick-up tube, cock, first the separator or primary filter, then a tee where a vacuum gauge sits, then the lift pump, second the filter on the engine, third the last filter or screen at the pump's inlet, injection pump, injector. Above the lift pump fuel is sucked, and a leak lets air in. Below it fuel is pushed, and a leak lets fuel out. A return leads back to the tank.",
  },
  "glow-bus-bar": {
    title: "Glow plugs on their bus bar, and where to measure",
    describes:
      "Four glow plugs in a row, joined at the top by a bus bar, fed by one wire from the relay. A clamp meter goes round that one wire and reads the current of all plugs together. A voltmeter between the battery's positive post and the bus bar reads what is lost on the way.",
  },
  impeller: {
    title: "Impeller, and where its pieces go",
    describes:
      "The raw-water pump with its cover off. The cam on one side bends the vanes, and the vanes trail behind the way of turning. One vane is torn off. Its pieces go out with the water and stop at the face of the first cooler.",
  },
  "lid-seal": {
    title: "Filter lid's ring, seated and pinched",
    describes:
      "Two filter heads cut open at the rim. Seated: the ring lies whole in its groove and the lid is flat on it. Pinched: the ring is out of its groove, the lid stands up on one side, and air gets in under it.",
  },
  "primer-lever": {
    title: "Priming lever and cam",
    describes:
      "Two views of a lift pump on the engine's cam. With the low side of the cam at the pump's arm the priming lever has its full stroke. With the high side there the arm is pushed in already and the lever moves without a stroke: turn the engine half to one turn.",
  },
  "propeller-growth": {
    title: "Propeller, clean and grown over",
    describes:
      "Two propellers seen from behind. The clean one has smooth blades with clean edges. The other has barnacles and weed on blades and hub; a thin layer is enough to hold the revs down.",
  },
  "raw-water-path": {
    title: "The raw water's way from seacock to outlet",
    describes:
      "In order: seacock in the hull, strainer, raw-water pump, heat exchanger on the engine, vented loop above the waterline, elbow where the water meets the exhaust gas, silencer, and up and out through the outlet in the stern.",
  },
  "runaway-air": {
    title: "Shutting off the air of an engine that runs away",
    describes:
      "The air intake with its filter off. A flat rigid plate, larger than the opening, is pushed over it from the side and the suction holds it there. Never a hand and never cloth, which is sucked in.",
  },
  "separator-bowl": {
    title: "What stands in the separator bowl",
    describes:
      "Three bowls. Water: a clear layer at the bottom with a line where fuel floats on it. Dirt: dark specks or slime at the bottom. Air: bubbles rising through the fuel while the engine runs.",
  },
  "start-circuit": {
    title: "The current's way from battery to starter",
    describes:
      "The heavy way: battery positive, battery switch, solenoid on the starter, starter, and back through the engine to battery negative. The thin way that commands it: fuse, key, neutral switch, relay, and the small terminal of the solenoid.",
  },
  "stop-by-hand": {
    title: "Stopping it by the lever at the pump",
    describes:
      "The injection pump on the engine with its stop lever, to which the stop cable leads. The lever is pushed by hand from run to stop and held there until the engine stands.",
  },
  "strainer-seal": {
    title: "Strainer: basket, water and lid seal",
    describes:
      "The raw-water strainer cut open. Water comes in at one side, passes the basket and leaves to the pump. The seal lies clean and wet under the lid, and the strainer is full to the top. A bad seal lets air in, and the pump sucks air in place of water.",
  },
  "tank-pick-up": {
    title: "Pick-up tube in the tank",
    describes:
      "The fuel tank cut open. The pick-up tube comes in from the top and ends a little above the bottom. Dirt has closed its end. Water and dirt lie below it. The vent lets air in as fuel goes out.",
  },
  "thermostat-pan": {
    title: "Testing a thermostat in a pan",
    describes:
      "A thermostat hangs on a string in a pan of water over heat, and a thermometer beside it, neither touching the pan. It begins to open at the figure stamped on it and is wide open 10 to 12 °C above.",
  },
  "throttle-stops": {
    title: "Throttle lever at the pump and its stops",
    describes:
      "The throttle lever on the injection pump turns between the idle stop screw and the full-throttle stop screw. At full throttle it must touch its stop. Daylight between lever and stop means that the cable brings it short. The screws themselves are only looked at.",
  },
  "vented-loop": {
    title: "Vented loop above the waterline",
    describes:
      "The raw-water hose rises from the cooler in a loop well above the waterline and falls to the elbow. A valve at its top lets air in when the engine stops. If the valve is stuck, the sea siphons through the loop into the exhaust and the engine.",
  },
  "wet-exhaust": {
    title: "Why cranking floods a wet exhaust",
    describes:
      "The same exhaust twice. Running: water joins the gas at the elbow, and the gas blows it out of the silencer over the stern. Cranking without firing: the pump goes on giving water and there is no gas to lift it, so the silencer fills, the water rises up the hose to the elbow and runs back into the engine.",
  },
} as const satisfies Record<string, DrawingWords>;

export type DrawingKey = keyof typeof DRAWINGS;

/** A tree may be newer than the program that reads it, so a key is a plain string until it has been looked up. */
export const isDrawing = (key: string): key is DrawingKey => Object.hasOwn(DRAWINGS, key);
