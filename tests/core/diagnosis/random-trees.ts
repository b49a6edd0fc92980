import fc from "fast-check";
import type { Evidence } from "../../../lib/core/diagnosis/evidence";
import type { FaultTree } from "../../../lib/core/tree/schema";
import type { FindingLink } from "../../../lib/core/tree/finding-link";
import { cause, check, remedy, symptom, tree } from "./small-trees";

const LINKS: readonly FindingLink[] = ["x60", "x20", "x5", "x1/3", "x1/10", "usually", "often", "sometimes", 0.4, "seldom"];
const STRENGTHS = ["always", "nearly always", "usually", "often", "sometimes", "seldom", 0.5] as const;
const BASES = ["common", "occasional", "rare", 5] as const;

/** A small sound tree: every check has a usual finding, every row stays under 1. */
export const anyTree: fc.Arbitrary<FaultTree> = fc
  .record({
    causes: fc.integer({ min: 2, max: 9 }),
    checks: fc.array(fc.integer({ min: 2, max: 4 }), { minLength: 1, maxLength: 6 }),
    remedies: fc.integer({ min: 1, max: 6 }),
    symptoms: fc.integer({ min: 1, max: 3 }),
    dice: fc.infiniteStream(fc.nat({ max: 9_999 })),
  })
  .map(({ causes, checks, remedies, symptoms, dice }) => {
    const roll = (sides: number): number => dice.next().value % sides;
    const pick = <T>(from: readonly T[]): T => from[roll(from.length)]!;
    const indices = (count: number) => Array.from({ length: count }, (_, index) => index);
    return tree({
      symptoms: indices(symptoms).map((index) => symptom(`symptom-${index}`)),
      checks: checks.map((findings, index) =>
        check(
          `check-${index}`,
          indices(findings).map((finding) => `finding-${finding}`),
          { minutes: 1 + roll(20) },
        ),
      ),
      remedies: indices(remedies).map((index) => remedy(`remedy-${index}`, { minutes: 5 + roll(90) })),
      causes: indices(causes).map((index) =>
        cause(`cause-${index}`, {
          base: pick(BASES),
          shows: Object.fromEntries(indices(symptoms).flatMap((one) => (roll(3) > 0 ? [[`symptom-${one}`, pick(STRENGTHS)]] : []))),
          gives: Object.fromEntries(
            checks.flatMap((findings, one) => (roll(2) > 0 ? [[`check-${one}`, { [`finding-${roll(findings)}`]: pick(LINKS) }]] : [])),
          ),
          curedBy: { [`remedy-${roll(remedies)}`]: pick(STRENGTHS) },
          broughtOnBy: roll(4) === 0 && index > 0 ? { [`cause-${roll(index)}`]: pick(STRENGTHS) } : {},
        }),
      ),
    });
  });

/** A tree and some things told of it, each step once. */
export const anyCase: fc.Arbitrary<{ tree: FaultTree; evidence: Evidence }> = anyTree.chain((tree) =>
  fc
    .record({
      symptoms: fc
        .subarray(tree.symptoms)
        .chain((some) => fc.tuple(...some.map((one) => fc.record({ symptom: fc.constant(one.key), present: fc.boolean() })))),
      findings: fc
        .subarray(tree.checks)
        .chain((some) =>
          fc.tuple(
            ...some.map((one) =>
              fc.record({ check: fc.constant(one.key), finding: fc.constantFrom(null, ...one.findings.map((finding) => finding.key)) }),
            ),
          ),
        ),
      remedies: fc.subarray(tree.remedies).chain((some) =>
        fc.tuple(
          ...some.map((one) =>
            fc.record({
              remedy: fc.constant(one.key),
              result: fc.constantFrom("better" as const, "no-change" as const, "could-not" as const),
            }),
          ),
        ),
      ),
    })
    .map((evidence) => ({ tree, evidence })),
);

export const setting = { profile: { features: {}, figures: {}, healthy: {} }, situation: "alongside", person: "mechanic" } as const;

/** As anyCase, where a remedy has put right one of two: some of what was told was told before, some since. */
export const anyPartCure: fc.Arbitrary<{ tree: FaultTree; evidence: Evidence }> = anyCase
  .filter(({ tree }) => tree.remedies.length > 1)
  .chain(({ tree, evidence }) => {
    const [first] = tree.remedies;
    const since = fc.constantFrom(undefined, true as const);
    const before = fc.constantFrom(undefined, null, true, false);
    const remedies = evidence.remedies.filter(({ remedy }) => remedy !== first!.key);
    return fc
      .record({
        symptoms: fc.tuple(...evidence.symptoms.map((one) => before.map((b) => (b === undefined ? one : { ...one, left: { before: b } })))),
        findings: fc.tuple(...evidence.findings.map((one) => since.map((left) => (left ? { ...one, left } : one)))),
        remedies: fc.tuple(...remedies.map((one) => since.map((left) => (left ? { ...one, left } : one)))),
      })
      .map((marked) => ({
        tree,
        evidence: { ...marked, remedies: [...marked.remedies, { remedy: first!.key, result: "better" as const }], curedOne: first!.key },
      }));
  });
