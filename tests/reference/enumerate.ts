import type { Evidence } from "../../lib/core/diagnosis/evidence";
import type { FindingLink } from "../../lib/core/tree/finding-link";
import type { FaultTree } from "../../lib/core/tree/schema";

type Cause = FaultTree["causes"][number];
type Check = FaultTree["checks"][number];

/** By cause, "?" for something not in the tree. */
export type Enumerated = { shares: Map<string, number>; marginals: Map<string, number>; two: number };

/**
 * Belief worked out a second time, straight from the words of SPEC.md: plain
 * products over every cause and every pair of causes, no logarithms, no tables, nothing shared with
 * the code under test. Slow, and only for trees without readings or sights.
 */
export function enumerate(tree: FaultTree, evidence: Evidence): Enumerated {
  const words: Record<string, number> = {
    always: 0.98,
    "nearly always": 0.93,
    usually: 0.8,
    often: 0.66,
    sometimes: 0.33,
    seldom: 0.12,
    "hardly ever": 0.05,
    never: 0.01,
  };
  const rates: Record<string, number> = { common: 10, occasional: 3, rare: 1 };
  const p = (strength: string | number) => (typeof strength === "number" ? strength : words[strength]!);
  const base = (cause: Cause) => (typeof cause.base === "number" ? cause.base : rates[cause.base]!);
  const total = tree.causes.reduce((sum, cause) => sum + base(cause), 0);

  const sound = (check: Check) => {
    const unusual = check.findings.filter((finding) => !finding.usual).map((finding) => finding.sound ?? 0.05);
    const taken = unusual.reduce((sum, one) => sum + one, 0);
    return check.findings.map((finding) => (finding.usual ? 1 - taken : (finding.sound ?? 0.05)));
  };
  const isFactor = (link: FindingLink) => typeof link === "string" && /^x/.test(link);
  const factor = (link: string) => (link.startsWith("x1/") ? 1 / Number(link.slice(3)) : Number(link.slice(1)));
  const row = (check: Check, links: Record<string, FindingLink> | undefined) => {
    if (!links) return sound(check);
    const named = check.findings.map((finding) => links[finding.key]);
    const fixed = named.map((link) => (link !== undefined && !isFactor(link) ? p(link) : 0));
    const rest = 1 - fixed.reduce((sum, one) => sum + one, 0);
    const free = sound(check).map((share, index) =>
      fixed[index] ? 0 : share * (named[index] !== undefined ? factor(String(named[index])) : 1),
    );
    const freeTotal = free.reduce((sum, one) => sum + one, 0);
    const shared = fixed.map((one, index) => one + (rest * free[index]!) / freeTotal);
    const least = shared.map((one) => Math.max(one, 0.001));
    const leastTotal = shared.some((one) => one < 0.001) ? least.reduce((sum, one) => sum + one, 0) : 1;
    return (shared.some((one) => one < 0.001) ? least : shared).map((one) => one / leastTotal);
  };
  const unknownRow = (check: Check) => {
    const s = sound(check);
    const usual = check.findings.findIndex((finding) => finding.usual);
    const mean = s.map((_, index) =>
      tree.causes.reduce((sum, cause) => sum + (base(cause) * row(check, cause.gives[check.key])[index]!) / total, 0),
    );
    return s.map((_, index) =>
      index === usual ? s[usual]! : (1 - s[usual]!) * ((0.8 * mean[index]!) / (1 - mean[usual]!) + 0.2 / (s.length - 1)),
    );
  };
  // A root's cases that run through a nearer, curable cause with the same symptom are counted there.
  const acting = (root: Cause, symptom: string) =>
    tree.causes.reduce((left, nearer) => {
      const strength = nearer.broughtOnBy[root.key];
      const runsThrough = strength !== undefined && nearer.shows[symptom] !== undefined && Object.keys(nearer.curedBy).length > 0;
      return runsThrough ? left - (p(strength) * base(nearer)) / base(root) : left;
    }, 1);
  const linkedShows = (cause: Cause, symptom: string) => Math.max(0.001, p(cause.shows[symptom]!) * Math.max(0, acting(cause, symptom)));
  const shows = (cause: Cause, symptom: string) => {
    const unlinked = tree.causes.filter((one) => one.shows[symptom] === undefined).reduce((sum, one) => sum + base(one) * 0.001, 0);
    const linked = tree.causes
      .filter((one) => one.shows[symptom] !== undefined)
      .reduce((sum, one) => sum + base(one) * linkedShows(one, symptom), 0);
    const scale = linked > 0 && unlinked / (unlinked + linked) > 0.05 ? (0.05 * linked) / 0.95 / unlinked : 1;
    return cause.shows[symptom] === undefined ? 0.001 * scale : linkedShows(cause, symptom);
  };
  const cures = (cause: Cause, remedy: string) => (cause.curedBy[remedy] === undefined ? 0.01 : p(cause.curedBy[remedy]));
  const is = (present: boolean, share: number) => (present ? share : 1 - share);
  const product = <T>(items: readonly T[], of: (item: T) => number) => items.reduce((all, item) => all * of(item), 1);

  // What was told before one of two was put right, and what was told of what is left.
  const first = <T extends { left?: unknown }>(items: readonly T[]) => items.filter((one) => !evidence.curedOne || one.left === undefined);
  const later = <T extends { left?: unknown }>(items: readonly T[]) => items.filter((one) => evidence.curedOne && one.left !== undefined);
  const remedies = evidence.remedies.filter(({ remedy }) => remedy !== evidence.curedOne);
  const seen = (findings: Evidence["findings"], rowOf: (check: Check) => number[]) =>
    product(findings, ({ check: key, finding }) => {
      const check = tree.checks.find((one) => one.key === key)!;
      return finding === null ? 1 : rowOf(check)[check.findings.findIndex((one) => one.key === finding)]!;
    });
  const tried = (of: Evidence["remedies"], cure: (remedy: string) => number, betterLeast = 0.002) =>
    product(of, ({ remedy, result }) => {
      if (result === "could-not") return 1;
      const q = cure(remedy);
      return result === "cured" ? q : result === "better" ? Math.max(betterLeast, 0.2 * q) : 1 - q;
    });
  const better = evidence.curedOne ? [{ remedy: evidence.curedOne, result: "better" as const }] : [];

  const symptomsAlone = (cause: Cause) =>
    product(evidence.symptoms, ({ symptom, present, left }) => {
      const share = shows(cause, symptom);
      if (!evidence.curedOne || !left) return is(present, share);
      if (left.before === null || left.before === present) return is(present, share);
      return is(present, share) * is(left.before, share);
    });
  const alone = (cause: Cause) =>
    symptomsAlone(cause) *
    seen(evidence.findings, (check) => row(check, cause.gives[check.key])) *
    tried([...remedies, ...better], (remedy) => cures(cause, remedy));

  const pairRow = (check: Check, a: Cause, b: Cause) => {
    const [ofA, ofB, s] = [row(check, a.gives[check.key]), row(check, b.gives[check.key]), sound(check)];
    const usual = check.findings.findIndex((finding) => finding.usual);
    const stays = Math.min((ofA[usual]! * ofB[usual]!) / s[usual]!, 1 - 0.001 * (s.length - 1));
    const rest = ofA.reduce((sum, one, index) => (index === usual ? sum : sum + one + ofB[index]!), 0);
    return ofA.map((one, index) => (index === usual ? stays : ((1 - stays) * (one + ofB[index]!)) / rest));
  };
  const pairSymptoms = (a: Cause, b: Cause) =>
    product(first(evidence.symptoms), ({ symptom, present }) => is(present, 1 - (1 - shows(a, symptom)) * (1 - shows(b, symptom))));
  const both = (a: Cause, b: Cause) =>
    pairSymptoms(a, b) *
    seen(first(evidence.findings), (check) => pairRow(check, a, b)) *
    product(first(remedies), ({ remedy, result }) => {
      const [ofA, ofB] = [cures(a, remedy), cures(b, remedy)];
      if (result === "could-not") return 1;
      return result === "cured" ? ofA * ofB : result === "better" ? ofA * (1 - ofB) + ofB * (1 - ofA) : (1 - ofA) * (1 - ofB);
    });
  const putRight = (cause: Cause) =>
    cures(cause, evidence.curedOne!) *
    product(later(evidence.symptoms), ({ symptom, present, left }) => (left?.before === true && !present ? shows(cause, symptom) : 1));
  const leftShows = (cause: Cause) => product(later(evidence.symptoms), ({ symptom, present }) => is(present, shows(cause, symptom)));
  const isLeft = (cause: Cause) =>
    (1 - cures(cause, evidence.curedOne!)) *
    leftShows(cause) *
    seen(later(evidence.findings), (check) => row(check, cause.gives[check.key])) *
    tried(later(remedies), (remedy) => cures(cause, remedy));

  const pairs = tree.causes.flatMap((a, index) => tree.causes.slice(index + 1).map((b) => ({ a, b })));
  const chance = ({ a, b }: { a: Cause; b: Cause }) => base(a) * base(b) * ((a.broughtOnBy[b.key] ?? b.broughtOnBy[a.key]) ? 5 : 1);
  const pairsTotal = pairs.reduce((sum, pair) => sum + chance(pair), 0);
  const twos = pairs.length > 0 ? 0.1 : 0;
  const singlePrior = (cause: Cause) => ((0.95 - twos) * base(cause)) / total;
  const pairPrior = (pair: { a: Cause; b: Cause }) => (twos * chance(pair)) / pairsTotal;

  const marginals = new Map(tree.causes.map((cause) => [cause.key, singlePrior(cause) * alone(cause)]));
  const shares = new Map(marginals);
  const more = (map: Map<string, number>, key: string, weight: number) => map.set(key, map.get(key)! + weight);
  let told = tree.causes.reduce((sum, cause) => sum + singlePrior(cause) * symptomsAlone(cause), 0);
  if (!evidence.curedOne) told += pairs.reduce((sum, pair) => sum + pairPrior(pair) * pairSymptoms(pair.a, pair.b), 0);
  const meanTold = told / (evidence.curedOne ? 0.95 - twos : 0.95);
  let unknown = 0.05 * meanTold * seen(evidence.findings, unknownRow) * tried([...remedies, ...better], () => 0);
  let two = 0;
  for (const pair of pairs) {
    const weight = pairPrior(pair) * both(pair.a, pair.b);
    if (!evidence.curedOne) {
      two += weight;
      for (const { key } of [pair.a, pair.b]) {
        more(marginals, key, weight);
        more(shares, key, weight / 2);
      }
      continue;
    }
    for (const [gone, left] of [
      [pair.a, pair.b],
      [pair.b, pair.a],
    ] as const) {
      const stays = weight * putRight(gone) * isLeft(left);
      const other =
        (0.05 / 0.95) *
        weight *
        putRight(gone) *
        leftShows(left) *
        seen(later(evidence.findings), unknownRow) *
        tried(later(remedies), () => 0);
      two += stays + other;
      unknown += other;
      for (const map of [marginals, shares]) more(map, left.key, stays);
    }
  }
  for (const map of [marginals, shares]) map.set("?", unknown);
  const sum = [...shares.values()].reduce((all, one) => all + one, 0);
  const scaled = (map: Map<string, number>) => new Map([...map].map(([key, weight]) => [key, weight / sum]));
  return { shares: scaled(shares), marginals: scaled(marginals), two: two / sum };
}
