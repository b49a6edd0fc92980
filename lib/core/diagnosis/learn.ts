import type { FindingLink } from "../tree/finding-link";
import type { Cause, FaultTree, KnownCase } from "../tree/schema";
import { answerOf, settingFor } from "./case-evidence";
import { causeRow } from "./cause-row";
import { readAnswer } from "./read-answer";
import { soundRow } from "./sound-row";

/** A word is worth so many cases: 10 where it is judgement, 30 where it has a source. */
const WORTH_OF_JUDGEMENT = 10;
const WORTH_OF_A_SOURCE = 30;
/** Sources that say nobody measured it. */
const UNMEASURED = /^(judgement|from-memory|common-practice)\b/;

/** Where the log speaks about a link: how often it was so, beside what the tree says. */
export type Learned = {
  readonly cause: string;
  readonly check: string;
  readonly finding: string;
  /** The link as it stands; null where the cause has none to this finding. */
  readonly link: FindingLink | null;
  /** P(finding given cause): as the tree has it, and with the log's cases added to it. */
  readonly tree: number;
  readonly withLog: number;
  /** Logged cases of this cause in which the check was answered, and in how many of them it gave this finding. */
  readonly cases: number;
  readonly times: number;
  /** How unlikely a count so far from the tree's share, or farther, would be if the tree were right (two-sided exact binomial). */
  readonly chance: number;
};

/**
 * Compares a tree's links with logged, proved outcomes. Each finding's share is
 * a Beta whose mean is the tree's word and whose weight is what the word is
 * worth; the log's cases are added as counts. A check that was not asked is no
 * evidence; "can't tell" neither. Worst disagreement first. Rule [V5].
 *
 * @param atLeast cases a cause and check must have, for the pair to be listed.
 */
export function learn(tree: FaultTree, cases: readonly KnownCase[], atLeast = 3): Learned[] {
  const counts = new Map<string, Map<string, number>>();
  for (const known of cases) {
    for (const causeKey of known.causes)
      for (const { check: key } of known.findings) {
        const check = tree.checks.find((one) => one.key === key);
        const answer = answerOf(known, key);
        const finding = check && answer ? readAnswer(check, answer, settingFor(known, "mechanic").profile, tree.features) : null;
        if (finding === null) continue;
        const row = counts.get(`${causeKey} ${key}`) ?? new Map<string, number>();
        row.set(finding, (row.get(finding) ?? 0) + 1);
        counts.set(`${causeKey} ${key}`, row);
      }
  }
  return [...counts]
    .flatMap(([pair, row]) => {
      const [causeKey = "", checkKey = ""] = pair.split(" ");
      const cases = [...row.values()].reduce((sum, one) => sum + one, 0);
      const check = tree.checks.find(({ key }) => key === checkKey);
      const cause = tree.causes.find(({ key }) => key === causeKey);
      if (cases < atLeast || check === undefined || cause === undefined) return [];
      const sound = soundRow(check);
      const links = cause.gives[checkKey];
      const shares = links ? causeRow(check, links, sound) : sound;
      return check.findings.map(({ key }, index) => learned(cause, checkKey, key, shares[index] ?? 0, cases, row.get(key) ?? 0));
    })
    .sort((a, b) => a.chance - b.chance || (a.cause < b.cause ? -1 : 1));
}

function learned(cause: Cause, check: string, finding: string, share: number, cases: number, times: number): Learned {
  const worth = cause.sources.every((source) => UNMEASURED.test(source)) ? WORTH_OF_JUDGEMENT : WORTH_OF_A_SOURCE;
  return {
    cause: cause.key,
    check,
    finding,
    link: cause.gives[check]?.[finding] ?? null,
    tree: share,
    withLog: (share * worth + times) / (worth + cases),
    cases,
    times,
    chance: twoSided(times, cases, share),
  };
}

/** Exact two-sided binomial test: the sum of all outcomes no likelier than the one seen. */
function twoSided(times: number, cases: number, share: number): number {
  const likely = Array.from({ length: cases + 1 }, (_, count) => binomial(count, cases, share));
  const seen = likely[times] ?? 0;
  return Math.min(
    1,
    likely.reduce((sum, one) => (one <= seen * (1 + 1e-9) ? sum + one : sum), 0),
  );
}

function binomial(count: number, of: number, share: number): number {
  let choose = 1;
  for (let i = 0; i < count; i++) choose = (choose * (of - i)) / (i + 1);
  return choose * share ** count * (1 - share) ** (of - count);
}
