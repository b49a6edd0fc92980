import type { Check } from "../tree/schema";

/** An unusual finding whose share the tree leaves open is seen on 1 sound engine in 20. */
const UNUSUAL = 0.05;

/**
 * How often a sound engine shows each finding of a check, in the order of its
 * findings; sums to 1. Rule [L1]. A tree whose figures do not add up is refused
 * by its soundness rules; here it is scaled, so that a draft can be tried.
 */
export function soundRow(check: Pick<Check, "findings">): Float64Array {
  const usual = check.findings.findIndex((finding) => finding.usual === true);
  const row = Float64Array.from(check.findings, (finding, index) => finding.sound ?? (index === usual ? 0 : UNUSUAL));
  const total = row.reduce((sum, share) => sum + share, 0);
  if (usual >= 0 && check.findings[usual]?.sound === undefined && total <= 0.5) {
    row[usual] = 1 - total;
    return row;
  }
  if (usual >= 0 && row[usual] === 0) row[usual] = Math.max(UNUSUAL, 1 - total);
  return scaledToOne(row);
}

/** The same proportions with a sum of 1, in place. */
export function scaledToOne(row: Float64Array): Float64Array {
  let total = 0;
  for (const share of row) total += share;
  for (let index = 0; index < row.length; index++) row[index] = (row[index] ?? 0) / total;
  return row;
}
