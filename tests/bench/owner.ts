import { excessOverLevel, falseAlarms, HEALTHY_FLEETS, power, powerOftener, WORSENING } from "@/tests/support/repeat-alarms";

/**
 * Repeat faults in simulation: how often healthy fleets hear a false alarm over their lives, and how often worsening engines are found.
 *
 *   npm run bench -- owner [--json] [--seed=N]
 */
type Figure = { figure: string; value: number; bar: number | null; holds: boolean | null };

const FLEETS = 400;
const ENGINES = 1000;
const seed = Number(process.argv.find((word) => word.startsWith("--seed="))?.slice(7) ?? 1);

const figures: Figure[] = [];
const add = (figure: string, value: number, bar: number | null, holds: boolean | null) => figures.push({ figure, value, bar, holds });

let excess = -Infinity;
let worst = 0;
for (const [i, fleet] of HEALTHY_FLEETS.entries()) {
  const { worse, oftener } = falseAlarms(fleet, FLEETS, seed + i);
  add(`falseAlarm.gettingWorse.${fleet.key}`, worse, null, null);
  add(`falseAlarm.oftener.${fleet.key}`, oftener, null, null);
  worst = Math.max(worst, worse, oftener);
  excess = Math.max(excess, excessOverLevel(worse, FLEETS), excessOverLevel(oftener, FLEETS));
}
add("falseAlarm.worst", worst, null, null);
// What lies over the level beyond the luck of the draw.
add("falseAlarm.excessOverLevel", excess, 0, excess <= 0);
for (const [i, engine] of WORSENING.entries())
  add(`detect.power.beta${engine.beta}.faults${engine.expected}`, power(engine, ENGINES, seed + i), null, null);
for (const [times, expected] of [
  [4, 4],
  [8, 2],
  [8, 4],
] as const)
  add(`detect.power.oftener.times${times}.expected${expected}`, powerOftener(times, expected, ENGINES / 4, seed), null, null);

if (process.argv.includes("--json")) console.log(JSON.stringify(figures, null, 2));
else
  for (const { figure, value, bar, holds } of figures)
    console.log(`${figure.padEnd(56)} ${value.toFixed(3)}${bar === null ? "" : `  (bar ${bar}: ${holds ? "holds" : "fails"})`}`);
if (figures.some(({ holds }) => holds === false)) process.exitCode = 1;
