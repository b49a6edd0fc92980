import type { Cause, Check } from "../tree/schema";
import { causeRow } from "./cause-row";
import type { CheckModel, StepModel } from "./model";
import { soundRow } from "./sound-row";
import { unknownRow } from "./unknown-row";

/** A check as tables over hypotheses: the causes in order, then the unknown. */
export function compileCheck(check: Check, step: StepModel, causes: readonly Cause[], prior: Float64Array): CheckModel {
  const sound = soundRow(check);
  const size = causes.length + 1;
  const rows = check.findings.map((_, finding) => new Float64Array(size).fill(sound[finding] ?? 0));
  let linked = false;
  causes.forEach((cause, index) => {
    const links = cause.gives[check.key];
    if (!links) return;
    linked = true;
    causeRow(check, links, sound).forEach((share, finding) => rows[finding] && (rows[finding][index] = share));
  });
  const mean = Float64Array.from(rows, (row) => weightedMean(row, prior, causes.length));
  const usual = check.findings.findIndex((finding) => finding.usual === true);
  unknownRow(sound, mean, usual).forEach((share, finding) => rows[finding] && (rows[finding][causes.length] = share));
  return {
    ...step,
    check,
    findingAt: new Map(check.findings.map((finding, index) => [finding.key, index])),
    sound,
    rows,
    logRows: rows.map((row) => row.map(Math.log)),
    negEntropy: negEntropyOf(rows),
    loudness: Float64Array.from(rows, (row, finding) => loudest(row, sound[finding] ?? 0, causes.length)),
    linked,
  };
}

/** Sum over the findings of P ln P, for each hypothesis. */
export function negEntropyOf(rows: readonly Float64Array[]): Float64Array {
  const sum = new Float64Array(rows[0]?.length ?? 0);
  for (const row of rows) row.forEach((share, index) => share > 0 && (sum[index] = (sum[index] ?? 0) + share * Math.log(share)));
  return sum;
}

function weightedMean(row: Float64Array, prior: Float64Array, count: number): number {
  let sum = 0;
  let total = 0;
  for (let index = 0; index < count; index++) {
    sum += (row[index] ?? 0) * (prior[index] ?? 0);
    total += prior[index] ?? 0;
  }
  return sum / total;
}

const logOdds = (share: number): number => Math.log(share / (1 - share));

function loudest(row: Float64Array, sound: number, count: number): number {
  let most = 0;
  for (let index = 0; index < count; index++) most = Math.max(most, Math.abs(logOdds(row[index] ?? 0) - logOdds(sound)));
  return most;
}
