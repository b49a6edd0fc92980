import type { FaultTree } from "../schema";
import { checkNode, findLoop, stepsOf, symptomNode, type Found, type Rule } from "./rule";

function stepsThatWaitForEachOther(tree: FaultTree): Found[] {
  const name = (before: { check: string } | { remedy: string }) => ("check" in before ? before.check : before.remedy);
  const loop = findLoop(new Map(stepsOf(tree).map(({ step }) => [step.key, step.after.map(name)])));
  if (loop === null) return [];
  const key = loop[0] ?? "";
  const kind = tree.checks.some((check) => check.key === key) ? "check" : "remedy";
  return [
    {
      node: { kind, key },
      says: `it waits for itself: ${loop.join(" after ")}.`,
      mend: 'Take out one "after", so that one of them can be the first.',
    },
  ];
}

/** Pins of one symptom, first one first. */
function pinsOf(tree: FaultTree, symptom: string) {
  return tree.checks
    .flatMap((check) => {
      const place = check.firstFor[symptom];
      return place === undefined ? [] : [{ check, place }];
    })
    .sort((a, b) => a.place - b.place);
}

const pinsThatTie = (tree: FaultTree): Found[] =>
  tree.symptoms.flatMap(({ key }) => {
    const pins = pinsOf(tree, key);
    return pins
      .filter(({ place }, index) => pins[index - 1]?.place === place)
      .map(({ check, place }) => ({
        node: checkNode(check),
        says: `for symptom ${key} it is number ${place}, and so is another check.`,
        mend: "Number them in the order they are to be asked.",
      }));
  });

/** A check sorts a symptom's causes when it is linked to so many of them, or to the only one. */
const SORTS = 2;

/** The first question about a complaint has to be one that anybody can answer with nothing in hand, and its answer has to sort the causes. */
const symptomsWithoutALook = (tree: FaultTree): Found[] =>
  tree.symptoms.flatMap(({ key, rulesOut }) => {
    const first = pinsOf(tree, key)[0]?.check;
    if (first !== undefined && first.tools.length > 0) {
      return [
        {
          node: symptomNode(key),
          says: `its first check, ${first.key}, needs tools (${first.tools.join(", ")}).`,
          mend: "Put a check that needs none before it.",
        },
      ];
    }
    const causes = tree.causes.filter(({ shows }) => shows[key] !== undefined);
    const enough = Math.min(SORTS, causes.length);
    const byHand = tree.checks.some(
      (check) =>
        check.tools.length === 0 &&
        !rulesOut?.includes(check.engine) &&
        causes.filter(({ gives }) => gives[check.key] !== undefined).length >= enough,
    );
    return byHand
      ? []
      : [
          {
            node: symptomNode(key),
            says: `no check that needs no tools and can be made while it lasts is linked to ${enough === 1 ? "its cause" : `${enough} of its causes`}.`,
            mend: "Add one that only looks, listens or feels, or link one.",
          },
        ];
  });

export const orderRules: readonly Rule[] = [
  { name: "precedence-cycle", severity: "error", find: stepsThatWaitForEachOther },
  { name: "pins-tie", severity: "error", find: pinsThatTie },
  { name: "symptom-without-a-look", severity: "error", find: symptomsWithoutALook },
];
