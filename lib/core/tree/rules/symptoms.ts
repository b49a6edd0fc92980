import { probabilityOf } from "../../diagnosis/cause-row";
import type { FaultTree } from "../schema";
import { BASE_RATES } from "../strength";
import { symptomNode, type Found, type Rule } from "./rule";

/** How often a cause shows a symptom it has no link to, and the most that all such causes may hold after a first symptom. */
const STRAY = { shown: 0.001, most: 0.05 };

/** As a search sees it: case, signs and spaces do not count. */
const plain = (phrase: string): string =>
  phrase
    .toLowerCase()
    .replaceAll(/[^\p{L}\p{N}]+/gu, " ")
    .trim();

function phrasesTwice(tree: FaultTree): Found[] {
  const owners = new Map<string, string>();
  return tree.symptoms.flatMap(({ key, phrases }) =>
    phrases.flatMap((phrase) => {
      const owner = owners.get(plain(phrase));
      owners.set(plain(phrase), owner ?? key);
      if (owner === undefined) return [];
      const says =
        owner === key
          ? `the phrase "${phrase}" stands twice.`
          : `the phrase "${phrase}" belongs to symptom ${owner} too, so a search cannot tell them apart.`;
      return [{ node: symptomNode(key), says, mend: "Keep it where it fits better." }];
    }),
  );
}

/** What causes without a link would hold after one symptom alone, or null where no cause is linked at all. */
function shareOfStrays(tree: FaultTree, key: string): number | null {
  let [linked, strays] = [0, 0];
  for (const { base, shows } of tree.causes) {
    const weight = typeof base === "number" ? base : BASE_RATES[base];
    const shown = shows[key];
    if (shown === undefined) strays += weight * STRAY.shown;
    else linked += weight * probabilityOf(shown);
  }
  return linked === 0 ? null : strays / (linked + strays);
}

/**
 * After one symptom, causes that have no link to it should hardly count; where
 * they do, their share is scaled down. Either a cause is missing, or few
 * engines show the symptom: then its author says why, and the case is closed.
 */
function straysThatWeighTooMuch(tree: FaultTree): Found[] {
  return tree.symptoms.flatMap(({ key, rare }) => {
    const share = shareOfStrays(tree, key);
    if (share === null || share <= STRAY.most || rare !== undefined) return [];
    return [
      {
        node: symptomNode(key),
        says: `causes without a link to it would hold ${Math.round(share * 100)} % after it; they are scaled down to ${STRAY.most * 100} %.`,
        mend: 'See whether a cause that shows it is missing, or is too rare; if few engines show it, say why under "rare".',
      },
    ];
  });
}

function calledRareInVain(tree: FaultTree): Found[] {
  return tree.symptoms.flatMap(({ key, rare }) => {
    const share = shareOfStrays(tree, key);
    if (rare === undefined || share === null || share > STRAY.most) return [];
    return [{ node: symptomNode(key), says: "it is called rare, and its causes show it often enough.", mend: 'Take "rare" out.' }];
  });
}

export const symptomRules: readonly Rule[] = [
  { name: "phrase-twice", severity: "error", find: phrasesTwice },
  { name: "strays-heavy", severity: "look-at", find: straysThatWeighTooMuch },
  { name: "rare-in-vain", severity: "look-at", find: calledRareInVain },
];
