import { factorOf, probabilityOf } from "../../diagnosis/cause-row";
import { linkRatios } from "../link-ratios";
import type { Cause, Check, FaultTree } from "../schema";
import type { Strength } from "../finding-link";
import { TELLING } from "../telling-apart";
import { causeNode, findLoop, twice, type Found, type Once, type Rule } from "./rule";
import { findingsOfSpan } from "./bands";

const incurable = (tree: FaultTree): Found[] =>
  tree.causes
    .filter(({ curedBy }) => Object.keys(curedBy).length === 0)
    .map((cause) => ({
      node: causeNode(cause),
      says: "no remedy cures it.",
      mend: 'Name one under "curedBy"; handing over to a workshop is one too.',
    }));

function withoutTellingCheck(tree: FaultTree, once: Once): Found[] {
  const best = new Map<string, { ratio: number; check: string; finding: string }>();
  for (const link of once(linkRatios)) if (link.ratio > (best.get(link.cause)?.ratio ?? 0)) best.set(link.cause, link);
  return tree.causes
    .filter(({ key }) => (best.get(key)?.ratio ?? 0) < TELLING)
    .map((cause) => {
      const most = best.get(cause.key);
      const says =
        most === undefined
          ? "no check is linked to it."
          : `its most telling finding is ${most.finding} of ${most.check}, only ${most.ratio.toFixed(1)} times as often as on a sound engine.`;
      return {
        node: causeNode(cause),
        says,
        mend: `Link a check under "gives" with a finding at least ${TELLING} times as often as on a sound engine.`,
      };
    });
}

type LinkedRow = { cause: Cause; check: Check; links: Cause["gives"][string] };

const linkedRows = (tree: FaultTree): LinkedRow[] =>
  tree.causes.flatMap((cause) =>
    Object.entries(cause.gives).flatMap(([key, links]) => {
      const check = tree.checks.find((one) => one.key === key);
      return check === undefined ? [] : [{ cause, check, links }];
    }),
  );

const strengthsOf = (links: LinkedRow["links"]): number[] =>
  Object.values(links).flatMap((link) => (factorOf(link) === null ? [probabilityOf(link as Strength)] : []));

function rowsOverOne(_: FaultTree, once: Once): Found[] {
  return once(linkedRows).flatMap(({ cause, check, links }) => {
    const sum = strengthsOf(links).reduce((all, share) => all + share, 0);
    return sum <= 1 + 1e-9
      ? []
      : [
          {
            node: causeNode(cause),
            says: `its findings of check ${check.key} add up to ${sum.toFixed(2)}, and only one is seen at a time.`,
            mend: "Weaken some until they add up to 1 or less.",
          },
        ];
  });
}

/** All findings have a strength and leave a good part unsaid: the row is then scaled up, which was hardly meant. */
function rowsShortOfOne(_: FaultTree, once: Once): Found[] {
  return once(linkedRows).flatMap(({ cause, check, links }) => {
    const strengths = strengthsOf(links);
    const sum = strengths.reduce((all, share) => all + share, 0);
    if (strengths.length < check.findings.length || sum >= 0.9) return [];
    return [
      {
        node: causeNode(cause),
        says: `every finding of check ${check.key} has a strength, and together they are only ${sum.toFixed(2)}.`,
        mend: "Leave the commonest one out: it takes the rest.",
      },
    ];
  });
}

function findingsLinkedTwice(_: FaultTree, once: Once): Found[] {
  return once(linkedRows).flatMap(({ cause, check, links }) =>
    twice(Object.keys(links).flatMap((spec) => findingsOfSpan(check, spec) ?? [])).map((finding) => ({
      node: causeNode(cause),
      says: `it links finding ${finding} of check ${check.key} twice, once within a span.`,
      mend: "Shorten the span, or take the single link out.",
    })),
  );
}

function spansUnknown(_: FaultTree, once: Once): Found[] {
  return once(linkedRows).flatMap(({ cause, check, links }) =>
    Object.keys(links)
      .filter((spec) => spec.includes("..") && findingsOfSpan(check, spec) === null)
      .map((spec) => ({
        node: causeNode(cause),
        says: `"${spec}" is no span of bands of check ${check.key}.`,
        mend:
          check.reading === undefined
            ? "Only a check with a reading has bands: name its findings one by one."
            : 'Name the two outer bands: "low..high".',
      })),
  );
}

function broughtOnInACircle(tree: FaultTree): Found[] {
  const loop = findLoop(new Map(tree.causes.map((cause) => [cause.key, Object.keys(cause.broughtOnBy)])));
  return loop === null
    ? []
    : [
        {
          node: { kind: "cause", key: loop[0] ?? "" },
          says: `it is brought on by itself: ${loop.join(" by ")}.`,
          mend: "Take out the link that is not so.",
        },
      ];
}

/** A link that moves nothing costs its author work and its reader trust. */
function linksThatSayNothing(_: FaultTree, once: Once): Found[] {
  const strongest = new Map<string, { cause: string; check: string; shift: number }>();
  for (const { cause, check, ratio } of once(linkRatios)) {
    const id = `${cause} ${check}`;
    strongest.set(id, { cause, check, shift: Math.max(strongest.get(id)?.shift ?? 0, Math.abs(Math.log(ratio))) });
  }
  return [...strongest.values()]
    .filter(({ shift }) => shift < Math.log(1.25))
    .map(({ cause, check }) => ({
      node: { kind: "cause", key: cause },
      says: `its link to check ${check} shows what a sound engine shows.`,
      mend: "Strengthen it, or take it out.",
    }));
}

export const causeRules: readonly Rule[] = [
  { name: "cause-without-remedy", severity: "error", find: incurable },
  { name: "cause-without-telling-check", severity: "error", find: withoutTellingCheck },
  { name: "row-over-one", severity: "error", find: rowsOverOne },
  { name: "row-short-of-one", severity: "look-at", find: rowsShortOfOne },
  { name: "finding-linked-twice", severity: "error", find: findingsLinkedTwice },
  { name: "span-unknown", severity: "error", find: spansUnknown },
  { name: "brought-on-by-cycle", severity: "error", find: broughtOnInACircle },
  { name: "link-says-nothing", severity: "look-at", find: linksThatSayNothing },
];
