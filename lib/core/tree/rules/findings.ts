import type { Check, FaultTree } from "../schema";
import { checkNode, type Found, type Rule } from "./rule";

/** Sums of shares written with two digits are off by this much at most. */
const ROUNDING = 0.011;
const UNUSUAL = 0.05;

const usualOnce = (tree: FaultTree): Found[] =>
  tree.checks.flatMap((check) => {
    const usual = check.findings.filter((finding) => finding.usual);
    if (usual.length === 1) return [];
    const says =
      usual.length === 0
        ? "no finding is marked as the usual one."
        : `${usual.map(({ key }) => key).join(" and ")} are both marked as usual.`;
    return [{ node: checkNode(check), says, mend: 'Mark the one finding that a sound engine shows most with "usual: true".' }];
  });

/** Shares that are written or follow from the default; `usual` is null where the usual finding takes the rest. */
function shares(check: Check): { unusual: number; usual: number | null; allNamed: boolean } {
  const usual = check.findings.find((finding) => finding.usual);
  const unusual = check.findings.filter((finding) => !finding.usual).reduce((sum, finding) => sum + (finding.sound ?? UNUSUAL), 0);
  return {
    unusual,
    usual: usual?.sound ?? null,
    allNamed: check.findings.every(({ sound, usual: isUsual }) => isUsual || sound !== undefined),
  };
}

const soundAddsUp = (tree: FaultTree): Found[] =>
  tree.checks.flatMap((check) => {
    const { unusual, usual } = shares(check);
    const sum = unusual + (usual ?? 0);
    const mend = 'Correct the "sound" figures; unusual findings without one count as 0.05 each, the usual one takes the rest.';
    if (sum > 1 + ROUNDING || (usual === null && unusual >= 1))
      return [{ node: checkNode(check), says: `what a sound engine shows adds up to ${sum.toFixed(2)}, more than 1.`, mend }];
    if (usual !== null && sum < 1 - ROUNDING)
      return [{ node: checkNode(check), says: `what a sound engine shows adds up to ${sum.toFixed(2)}, less than 1.`, mend }];
    return [];
  });

const usualAtLeastHalf = (tree: FaultTree): Found[] =>
  tree.checks.flatMap((check) => {
    const { unusual, usual, allNamed } = shares(check);
    const share = usual ?? 1 - unusual;
    if (share >= 0.5 - 1e-9 || allNamed) return [];
    return [
      {
        node: checkNode(check),
        says: `the usual finding is left with ${share.toFixed(2)}, under one half.`,
        mend: 'Write "sound" for every other finding, or make them rarer.',
      },
    ];
  });

export const findingRules: readonly Rule[] = [
  { name: "usual-finding", severity: "error", find: usualOnce },
  { name: "sound-adds-up", severity: "error", find: soundAddsUp },
  { name: "usual-under-half", severity: "error", find: usualAtLeastHalf },
];
