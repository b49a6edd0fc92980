import { likelyRivals, type Rivals } from "../rivals";
import type { Cause, FaultTree } from "../schema";
import { tellingApart, TELLING } from "../telling-apart";
import { causeNode, type Found, type Once, type Rule } from "./rule";

type Pair = { a: Cause; b: Cause; untold: { which: "a" | "b" | "both"; where: Rivals } | null };

const nameOf = (one: string, other: string): string => [one, other].sort().join(" ");

/** Every pair of likely rivals once, with the worst place where they cannot be told apart, if there is one. */
function pairsOf(tree: FaultTree): Map<string, Pair> {
  const tells = tellingApart(tree);
  const pairs = new Map<string, Pair>();
  for (const where of likelyRivals(tree)) {
    const { a, b } = where;
    const name = nameOf(a.key, b.key);
    const pair = pairs.get(name) ?? { a, b, untold: null };
    pairs.set(name, pair);
    if (pair.untold?.which === "both") continue;
    const [forA, forB] = [tells(a, b, where), tells(b, a, where)];
    if (!forA && !forB) pair.untold = { which: "both", where };
    else if (pair.untold === null && !(forA && forB)) pair.untold = { which: forA ? "b" : "a", where };
  }
  return pairs;
}

const listed = (tree: FaultTree): Set<string> => new Set((tree.inseparable ?? []).map(({ causes: [a, b] }) => nameOf(a, b)));

const onEngine = ({ kind: { differsBy } }: Rivals): string =>
  differsBy === null ? "on the commonest engine" : `on an engine with ${differsBy.feature} ${differsBy.option}`;

const WANTED = `at least ${TELLING} times as often and at least "sometimes"`;

function rivalsWithoutTellingFinding(tree: FaultTree, once: Once): Found[] {
  const excused = listed(tree);
  return [...once(pairsOf)].flatMap(([name, { a, b, untold }]) => {
    if (untold === null || untold.which === "both" || excused.has(name)) return [];
    const [cause, rival] = untold.which === "a" ? [a, b] : [b, a];
    return [
      {
        node: causeNode(cause),
        says: `after ${untold.where.symptom.key}, ${onEngine(untold.where)}, no finding speaks for it against its likely rival ${rival.key}.`,
        mend: `Link a check that such an engine can have, with a finding seen ${WANTED} with it as with ${rival.key}.`,
      },
    ];
  });
}

function inseparableUnlisted(tree: FaultTree, once: Once): Found[] {
  const excused = listed(tree);
  return [...once(pairsOf)].flatMap(([name, { a, b, untold }]) =>
    untold?.which !== "both" || excused.has(name)
      ? []
      : [
          {
            node: causeNode(a),
            says: `after ${untold.where.symptom.key}, ${onEngine(untold.where)}, no check tells it and ${b.key} apart.`,
            mend: `Link a check with a finding seen ${WANTED} with the one as with the other, or list the pair under "inseparable" and say why.`,
          },
        ],
  );
}

function listedInVain(tree: FaultTree, once: Once): Found[] {
  if (tree.inseparable === undefined || tree.inseparable.length === 0) return [];
  const pairs = once(pairsOf);
  const seen = new Set<string>();
  return tree.inseparable.flatMap(({ causes: [a, b] }) => {
    const name = nameOf(a, b);
    const again = seen.has(name);
    seen.add(name);
    if (!again && pairs.get(name)?.untold) return [];
    const says = again
      ? `"inseparable" lists it and ${b} twice.`
      : pairs.has(name)
        ? `"inseparable" lists it and ${b}, and checks tell them apart wherever both are likely.`
        : `"inseparable" lists it and ${b}, and no symptom makes both likely.`;
    return [{ node: causeNode({ key: a }), says, mend: "Take the pair out of the list." }];
  });
}

export const rivalRules: readonly Rule[] = [
  { name: "rival-not-told-apart", severity: "error", find: rivalsWithoutTellingFinding },
  { name: "inseparable-unlisted", severity: "error", find: inseparableUnlisted },
  { name: "inseparable-in-vain", severity: "look-at", find: listedInVain },
];
