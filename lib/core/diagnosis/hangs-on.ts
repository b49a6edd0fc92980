import type { Cause } from "../tree/schema";
import type { FindingLink, Strength } from "../tree/finding-link";
import { BASE_RATES, type BaseRate } from "../tree/strength";
import { believe } from "./believe";
import { factorOf } from "./cause-row";
import { compile } from "./compile";
import { compileCheck } from "./compile-check";
import type { Evidence } from "./evidence";
import type { Model } from "./model";
import { linksBeside, ratesBeside, strengthsBeside } from "./one-word-off";
import { symptomShares } from "./symptom-shares";

/** A word of the tree that would put another cause first, were it one step stronger or weaker. */
export type HangsOn = {
  readonly cause: string;
  /** What the link leads to: a check with its finding, a symptom, or how common the cause is. */
  readonly to: { readonly kind: "check" | "symptom" | "base"; readonly key: string; readonly finding: string | null };
  readonly from: FindingLink;
  readonly moved: FindingLink;
  /** The cause that would then be first. */
  readonly first: string;
  /** Its lead over the cause that is first now: the quotient of their shares. */
  readonly lead: number;
  /** All of it in a sentence. */
  readonly says: string;
};

/** The likeliest causes, whose links are tried; what stands further down is not put first by one word. */
const TRIED = 4;

type Move = Omit<HangsOn, "first" | "lead" | "says"> & { readonly model: () => Model };

/**
 * The words that the first place hangs on most: each link of the likeliest
 * causes to what was told, and how common each is, moved by one word, all else
 * as it is, and belief worked out again. Rule [X10].
 *
 * @returns the moves that put another cause first, the clearest first; empty: no single word would.
 */
export function hangsOn(model: Model, evidence: Evidence): readonly HangsOn[] {
  const { shares } = believe(model, evidence);
  const ranked = [...model.causes.keys()].sort((a, b) => shares[b]! - shares[a]! || a - b).slice(0, TRIED);
  const [leader] = ranked;
  if (leader === undefined) return [];
  return ranked
    .flatMap((index) => movesOf(model, evidence, index, index === leader))
    .flatMap(({ model: moved, ...move }): HangsOn[] => {
      const then = believe(moved(), evidence).shares;
      const first = model.causes.reduce((best, _, index) => (then[index]! > then[best]! ? index : best), leader);
      if (first === leader) return [];
      const says = said(model, move, model.causes[first]!);
      return [{ ...move, first: model.causes[first]!.key, lead: then[first]! / then[leader]!, says }];
    })
    .sort((a, b) => b.lead - a.lead || (a.cause < b.cause ? -1 : 1));
}

function movesOf(model: Model, evidence: Evidence, index: number, leads: boolean): readonly Move[] {
  const cause = model.causes[index]!;
  const findings = evidence.findings.flatMap(({ check: key, finding }) => {
    const link = finding === null ? undefined : cause.gives[key]?.[finding];
    if (link === undefined || finding === null) return [];
    return linksBeside(link).map((moved): Move => ({
      ...{ cause: cause.key, to: { kind: "check", key, finding }, from: link, moved },
      model: () =>
        withCheck(model, key, changed(model, index, { gives: { ...cause.gives, [key]: { ...cause.gives[key], [finding]: moved } } })),
    }));
  });
  const symptoms = evidence.symptoms.flatMap(({ symptom: key }) => {
    const link = cause.shows[key];
    if (link === undefined) return [];
    return strengthsBeside(link).map((moved): Move => ({
      ...{ cause: cause.key, to: { kind: "symptom", key, finding: null }, from: link, moved },
      model: () => withSymptom(model, key, changed(model, index, { shows: { ...cause.shows, [key]: moved as Strength } })),
    }));
  });
  // Only the leader made rarer, or another made commoner, can change who is first; each costs compiling the tree.
  const turns = (base: BaseRate): boolean => rateOf(base) < rateOf(cause.base) === leads;
  const rates = ratesBeside(cause.base)
    .filter(turns)
    .map((moved): Move => ({
      ...{
        cause: cause.key,
        to: { kind: "base", key: cause.key, finding: null },
        from: cause.base as Strength,
        moved: moved as unknown as Strength,
      },
      model: () => compile(withBase(model, cause, moved), model.setting),
    }));
  return [...findings, ...symptoms, ...rates];
}

const rateOf = (base: Cause["base"]): number => (typeof base === "number" ? base : BASE_RATES[base]);

const quoted = (title: string): string => `\u201c${title}\u201d`;

/** "usually", "in 27 of 100", "20 times as often as a sound engine". */
function linkSaid(link: FindingLink): string {
  if (typeof link === "number") return `in ${Math.round(link * 100)} of 100`;
  if (factorOf(link) === null) return link;
  return link === "x1" ? "as often as a sound engine" : `${link.slice(1)} times as often as a sound engine`;
}

function said(model: Model, { cause, to, from, moved }: Omit<Move, "model">, first: Cause): string {
  const title = quoted(model.causes.find(({ key }) => key === cause)?.title ?? cause);
  const then = `${quoted(first.title)} would stand first`;
  if (to.kind === "base") return `Were ${title} ${moved} and not ${typeof from === "number" ? `of weight ${from}` : from}, ${then}.`;
  if (to.kind === "symptom") {
    const symptom = model.tree.symptoms.find(({ key }) => key === to.key)?.title ?? to.key;
    return `Did ${title} show ${quoted(symptom)} ${linkSaid(moved)} and not ${linkSaid(from)}, ${then}.`;
  }
  const check = model.checks[model.checkAt.get(to.key) ?? -1]?.check;
  const finding = check?.findings.find(({ key }) => key === to.finding)?.title ?? to.finding ?? "";
  return `Did ${title} give ${quoted(finding)} at ${quoted(check?.title ?? to.key)} ${linkSaid(moved)} and not ${linkSaid(from)}, ${then}.`;
}

const changed = (model: Model, index: number, over: Partial<Cause>): readonly Cause[] =>
  model.causes.map((cause, at) => (at === index ? { ...cause, ...over } : cause));

/** The model with one check's tables made anew. */
function withCheck(model: Model, key: string, causes: readonly Cause[]): Model {
  const prior = model.logPrior.map(Math.exp);
  return { ...model, checks: model.checks.map((check) => (check.key === key ? compileCheck(check.check, check, causes, prior) : check)) };
}

/** The model with one symptom's shares made anew. */
function withSymptom(model: Model, key: string, causes: readonly Cause[]): Model {
  const weights = model.logPrior.subarray(0, model.unknownAt).map(Math.exp);
  const shares = new Float64Array(model.unknownAt + 1).fill(1);
  shares.set(symptomShares(key, causes, weights).shares);
  return {
    ...model,
    symptoms: new Map([...model.symptoms, [key, shares]]),
    logSymptoms: new Map([
      ...model.logSymptoms,
      [key, { present: shares.map(Math.log), absent: shares.map((share) => Math.log1p(-share)) }],
    ]),
  };
}

const withBase = (model: Model, cause: Cause, base: Cause["base"]): Model["tree"] => ({
  ...model.tree,
  causes: model.tree.causes.map((one) => (one.key === cause.key ? { ...one, base } : one)),
});
