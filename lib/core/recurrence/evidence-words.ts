import type { Assessment } from "./assess";
import { gapsOf } from "./fault-times";

/** "1 in 300": a chance as a count, to two figures. */
export function oneIn(chance: number): string {
  if (chance > 0.4) return "more often than 2 in 5";
  if (chance < 1e-6) return "less than 1 in a million";
  const times = 1 / chance;
  const size = 10 ** Math.max(0, Math.floor(Math.log10(times)) - 1);
  return `1 in ${figures(Math.round(times / size) * size)}`;
}

/** The evidence of one record, in plain sentences; the same numbers stand beside them in the assessment. */
export function evidenceInWords(found: Assessment): string[] {
  return [comeBack(found), trendWords(found), fleetWords(found), growthWords(found), doubts(found)].filter((words) => words !== "");
}

function comeBack({ times, unit, beginsWithFault }: Assessment): string {
  const returns = times.length - (beginsWithFault ? 0 : 1);
  if (returns < 1) return "Seen once.";
  const gaps = gapsOf(times).slice(beginsWithFault ? 0 : 1);
  const [first, last] = [gaps[0] ?? 0, gaps.at(-1) ?? 0];
  const times1 = returns === 1 ? "once" : returns === 2 ? "twice" : `${returns} times`;
  if (returns === 1) return `Came back once, after ${amount(first, unit)}.`;
  const shape = first === last ? `gaps of ${amount(first, unit)}` : `first gap ${amount(first, unit)}, last gap ${amount(last, unit)}`;
  return `Came back ${times1}; ${shape}.`;
}

function trendWords({ trend }: Assessment): string {
  const { verdict, laplace, chiSquare, saidAt } = trend;
  if (verdict === "too-few") return "Too few to tell whether it is getting worse: that takes four.";
  const tests =
    laplace && chiSquare
      ? ` (Laplace ${laplace.u.toFixed(2)}, ${oneIn(laplace.exact)} at a constant rate; chi-square ${chiSquare.x.toFixed(1)} on ${chiSquare.degrees}, ${oneIn(chiSquare.worsening)})`
      : "";
  if (verdict === "not-shown") return `Not shown to be getting worse${tests}.`;
  if (verdict === "getting-worse") return `Getting worse: the gaps grow shorter${tests}; first said at the ${ordinal(saidAt ?? 0)}.`;
  return `It was getting worse up to the ${ordinal(saidAt ?? 0)}, and has been quiet since for longer than that would allow${tests}.`;
}

function fleetWords({ frequency, unit }: Assessment): string {
  const { verdict, count, time, expected, byChance } = frequency;
  if (expected === null || byChance === null) return "No other engine of this fleet to compare with.";
  const words = `${count} in ${amount(time, unit)}, where this fleet's own rate would make ${expected < 0.1 ? "under 0.1" : figures(expected)}: ${oneIn(byChance)} by chance`;
  return verdict === "oftener" ? `Oftener here than on the fleet's other engines: ${words}.` : `${words}.`;
}

function growthWords({ trend: { growth, verdict }, unit }: Assessment): string {
  if (!growth || verdict === "too-few") return "";
  const [low, high] = growth.mtbfNowLimits;
  const limits = high === null ? `at least ${amount(low, unit)}` : `${amount(low, unit)} to ${amount(high, unit)}`;
  const misfit = growth.fits === false ? " It does not follow a steady curve: something changed all at once." : "";
  const [from, to] = growth.betaLimits;
  return `About ${amount(growth.mtbfNow, unit)} between faults now (9 in 10: ${limits}); growth ${growth.beta.toFixed(2)} (${from.toFixed(2)} to ${to.toFixed(2)}; 1 is steady).${misfit}`;
}

function doubts({ unproved, estimated, unit }: Assessment): string {
  const words: string[] = [];
  if (unproved > 0)
    words.push(
      `${unproved === 1 ? "One cure" : `${unproved} cures`} before a return ${unproved === 1 ? "was" : "were"} never proved: it may be one fault that never went.`,
    );
  if (estimated) words.push("Some hours are estimated.");
  if (unit === "days") words.push("Hours are not known: counted in days.");
  return words.join(" ");
}

const amount = (value: number, unit: "hours" | "days") =>
  unit === "hours" ? `${figures(value)} h` : `${figures(value)} ${Math.abs(value - 1) < 0.05 ? "day" : "days"}`;

/** Two or three figures: nothing here is known better. */
function figures(value: number): string {
  if (value >= 10) return String(Math.round(value));
  return String(Math.round(value * 10) / 10);
}

function ordinal(n: number): string {
  const tail = n % 100 >= 11 && n % 100 <= 13 ? "th" : (["th", "st", "nd", "rd"][n % 10] ?? "th");
  return `${n}${tail} fault`;
}
