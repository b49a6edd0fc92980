import { causeRow, probabilityOf } from "@/lib/core/diagnosis/cause-row";
import { soundRow } from "@/lib/core/diagnosis/sound-row";
import { BASE_RATES } from "@/lib/core/tree/strength";
import type { Cause, Check, FaultTree } from "@/lib/core/tree/schema";

/** A finding as a column of the table. */
export type Column = {
  check: Check;
  finding: string;
  title: string;
  /** Share of sound engines that show it. */
  sound: number;
  /** P(finding given cause), by cause in the rows' order. */
  shares: readonly number[];
  /** All causes give it about as often: it tells nothing apart. */
  separatesNothing: boolean;
};

/** Shares closer than this factor count as alike. */
const ALIKE = 1.25;

/** The causes of a symptom, likeliest first. */
export function rowsOf(tree: FaultTree, symptom: string): Cause[] {
  const weight = (cause: Cause) =>
    (typeof cause.base === "number" ? cause.base : BASE_RATES[cause.base]) * probabilityOf(cause.shows[symptom] ?? 0.01);
  return tree.causes.filter(({ shows }) => shows[symptom] !== undefined).sort((a, b) => weight(b) - weight(a));
}

/** Checks that any of these causes has a link to, those with most links first. */
export function checksFor(tree: FaultTree, causes: readonly Cause[]): Check[] {
  const links = new Map<string, number>();
  for (const cause of causes) for (const key of Object.keys(cause.gives)) links.set(key, (links.get(key) ?? 0) + 1);
  return tree.checks.filter(({ key }) => links.has(key)).sort((a, b) => (links.get(b.key) ?? 0) - (links.get(a.key) ?? 0));
}

/** The findings of a check as columns over these causes. */
export function columnsOf(check: Check, causes: readonly Cause[]): Column[] {
  const sound = soundRow(check);
  const rows = causes.map((cause) => {
    const links = cause.gives[check.key];
    return links ? causeRow(check, links, sound) : sound;
  });
  return check.findings.map(({ key, title }, index) => {
    const shares = rows.map((row) => row[index] ?? 0);
    return {
      check,
      finding: key,
      title,
      sound: sound[index] ?? 0,
      shares,
      separatesNothing: Math.max(...shares) < ALIKE * Math.min(...shares),
    };
  });
}

/** Do these columns say anything of the cause in this row, beside the others? */
export function rowSaysNothing(columns: readonly Column[], row: number): boolean {
  return columns.every(({ shares }) => shares.every((share) => share < ALIKE * (shares[row] ?? 0) && (shares[row] ?? 0) < ALIKE * share));
}
