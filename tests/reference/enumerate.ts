import type { Evidence } from "../../lib/core/diagnosis/evidence";
import type { FindingLink } from "../../lib/core/tree/finding-link";
import type { FaultTree } from "../../lib/core/tree/schema";

/**
 * Belief worked out a second time, straight from the words of SPEC.md: plain
 * products over every hypothesis, no logarithms, no tables, nothing shared with
 * the code under test. Slow, and only for trees without readings or sights.
 */
export function enumerate(tree: FaultTree, evidence: Evidence): Map<string, number> {
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
  const base = (cause: FaultTree["causes"][number]) => (typeof cause.base === "number" ? cause.base : rates[cause.base]!);
  const total = tree.causes.reduce((sum, cause) => sum + base(cause), 0);

  const sound = (check: FaultTree["checks"][number]) => {
    const unusual = check.findings.filter((finding) => !finding.usual).map((finding) => finding.sound ?? 0.05);
    const taken = unusual.reduce((sum, one) => sum + one, 0);
    return check.findings.map((finding) => (finding.usual ? 1 - taken : (finding.sound ?? 0.05)));
  };
  const isFactor = (link: FindingLink) => typeof link === "string" && /^x/.test(link);
  const factor = (link: string) => (link.startsWith("x1/") ? 1 / Number(link.slice(3)) : Number(link.slice(1)));
  const row = (check: FaultTree["checks"][number], links: Record<string, FindingLink> | undefined) => {
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
  const unknownRow = (check: FaultTree["checks"][number]) => {
    const s = sound(check);
    const usual = check.findings.findIndex((finding) => finding.usual);
    const mean = s.map((_, index) =>
      tree.causes.reduce((sum, cause) => sum + (base(cause) * row(check, cause.gives[check.key])[index]!) / total, 0),
    );
    return s.map((_, index) =>
      index === usual ? s[usual]! : (1 - s[usual]!) * ((0.8 * mean[index]!) / (1 - mean[usual]!) + 0.2 / (s.length - 1)),
    );
  };
  const shows = (cause: FaultTree["causes"][number], symptom: string) => {
    const unlinked = tree.causes.filter((one) => one.shows[symptom] === undefined).reduce((sum, one) => sum + base(one) * 0.001, 0);
    const linked = tree.causes
      .filter((one) => one.shows[symptom] !== undefined)
      .reduce((sum, one) => sum + base(one) * p(one.shows[symptom]!), 0);
    const scale = linked > 0 && unlinked / (unlinked + linked) > 0.05 ? (0.05 * linked) / 0.95 / unlinked : 1;
    return cause.shows[symptom] === undefined ? 0.001 * scale : p(cause.shows[symptom]);
  };
  const told = (cause: FaultTree["causes"][number]) =>
    evidence.symptoms.reduce((product, { symptom, present }) => product * (present ? shows(cause, symptom) : 1 - shows(cause, symptom)), 1);

  const found = (rowOf: (check: FaultTree["checks"][number]) => number[]) =>
    evidence.findings.reduce((product, { check: key, finding }) => {
      const check = tree.checks.find((one) => one.key === key)!;
      return finding === null ? product : product * rowOf(check)[check.findings.findIndex((one) => one.key === finding)]!;
    }, 1);
  const tried = (cure: (remedy: string) => number, betterLeast: number) =>
    evidence.remedies.reduce((product, { remedy, result }) => {
      if (result === "could-not") return product;
      const q = cure(remedy);
      return product * (result === "cured" ? q : result === "better" ? Math.max(betterLeast, 0.2 * q) : 1 - q);
    }, 1);

  const weights = new Map<string, number>();
  for (const cause of tree.causes)
    weights.set(
      cause.key,
      ((0.95 * base(cause)) / total) *
        told(cause) *
        found((check) => row(check, cause.gives[check.key])) *
        tried((remedy) => (cause.curedBy[remedy] === undefined ? 0.01 : p(cause.curedBy[remedy])), 0.002),
    );
  const meanTold = tree.causes.reduce((sum, cause) => sum + (base(cause) / total) * told(cause), 0);
  weights.set("?", 0.05 * meanTold * found(unknownRow) * tried(() => 0, 0.002));
  const sum = [...weights.values()].reduce((all, one) => all + one, 0);
  return new Map([...weights].map(([key, weight]) => [key, weight / sum]));
}
