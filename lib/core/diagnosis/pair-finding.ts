import { LEAST } from "./cause-row";
import type { CheckModel } from "./model";
import { pairTable, type PairTable } from "./pair-table";

/**
 * How often an engine with both causes shows a finding. Rule [L7]: each cause
 * leaves the usual finding what it leaves of a sound engine's; the rest goes to
 * the unusual findings in proportion to what both give them.
 *
 * @param a,b two causes by index.
 */
export function pairShare(check: CheckModel, finding: number, a: number, b: number): number {
  const row = check.rows[finding]!;
  const both = row[a]! + row[b]!;
  const usual = check.check.findings.findIndex((one) => one.usual === true);
  if (usual < 0) return both / 2;
  const usualRow = check.rows[usual]!;
  const stays = Math.min((usualRow[a]! * usualRow[b]!) / check.sound[usual]!, 1 - LEAST * (check.rows.length - 1));
  if (finding === usual) return stays;
  return ((1 - stays) * both) / (2 - usualRow[a]! - usualRow[b]!);
}

/** Kept a check, as long as the check is: made when a finding is first told, since few of them ever are. */
const kept = new WeakMap<CheckModel, Map<string, PairTable>>();

/**
 * ln of what a finding weighs for every pair. Rules [L7], [E4].
 *
 * @param again the findings that say again what has been reported, where this is one of several; else empty.
 */
export function findingTable(check: CheckModel, finding: number, again: readonly number[] = []): PairTable {
  const tables = kept.get(check) ?? new Map<string, PairTable>();
  kept.set(check, tables);
  const key = [finding, ...again].join();
  const ready = tables.get(key);
  if (ready) return ready;
  const weight = (a: number, b: number): number => {
    const share = pairShare(check, finding, a, b);
    return Math.log(again.length === 0 ? share : share / again.reduce((sum, one) => sum + pairShare(check, one, a, b), 0));
  };
  const table = pairTable(soundAt(check), weight);
  tables.set(key, table);
  return table;
}

/** The causes that show at this check what a sound engine shows. The unknown stands last in each row and is none. */
function soundAt(check: CheckModel): Uint8Array {
  const plain = new Uint8Array((check.rows[0]?.length ?? 1) - 1).fill(1);
  check.rows.forEach((row, finding) => plain.forEach((_, a) => row[a] !== check.sound[finding] && (plain[a] = 0)));
  return plain;
}
