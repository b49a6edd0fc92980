import type { Line } from "./prove-view";

/** What came out of the replay, in a sentence or two. */
export function inSum(lines: readonly Line[], cases: number, done: boolean): string {
  if (cases === 0) return "";
  const count = (verdict: Line["verdict"]): number => lines.filter((line) => line.verdict === verdict).length;
  const inThree = (which: "before" | "after"): number => lines.filter((line) => (line[which].butConfirming ?? Infinity) <= 3).length;
  const minutes = (which: "before" | "after"): number => lines.reduce((sum, line) => sum + (line[which].minutes ?? 0), 0);
  const counts = `${count("better")} better, ${count("worse")} worse, ${count("broke")} broke, ${count("same")} as before`;
  const places = `right cause among the first three before the look that settled it: ${inThree("after")} of ${lines.length} (was ${inThree("before")})`;
  const [was, is] = [minutes("before"), minutes("after")];
  const quicker = was === 0 ? "" : ` Minutes to the end in all: ${Math.round(is)} (was ${Math.round(was)}), ${speed(was, is)}.`;
  return `${done ? "" : `Replaying, ${lines.length} of ${cases}. `}${counts}; ${places}.${quicker}`;
}

function speed(was: number, is: number): string {
  const share = Math.round((100 * Math.abs(was - is)) / was);
  if (share === 0) return "as quick as before";
  return is < was ? `${share} in 100 quicker` : `${share} in 100 slower`;
}
