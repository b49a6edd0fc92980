import type { FaultTree, KnownCase, Who } from "../tree/schema";
import { baseRateMinutes } from "./base-rate-order";
import { believe, type Belief } from "./believe";
import { evidenceFor, settingFor, type Told } from "./case-evidence";
import { compile } from "./compile";
import type { Model } from "./model";
import { likeliestPairs } from "./pairs";
import { playCase, type Played } from "./play-case";

const TOLD: readonly Told[] = ["start", "but-confirming", "all"];

/** Closer shares than this are a tie, which counts against the right cause. */
const TIE = 1e-9;

export type CaseProof = {
  readonly key: string;
  readonly title: string;
  /** Place of the right cause among the causes, from 1; null: the tree does not have it for this engine. */
  readonly place: Readonly<Record<Told, number | null>>;
  /** The cause believed most on all but the confirming finding. */
  readonly believed: string | null;
  /** Of a case with two causes, on all but the confirming finding: both among the first three, and the likeliest pair is they. null: one cause. */
  readonly both: Both | null;
  readonly played: Played;
  readonly baseRateMinutes: number;
};

export type Both = { readonly inFirstThree: boolean; readonly likeliestPair: boolean };

export type Share = { readonly first: number; readonly inFirstThree: number };

export type Proof = {
  readonly cases: readonly CaseProof[];
  /** Shares of the cases with the right cause first, and in the first three; "but-confirming" is the bar. */
  readonly right: Readonly<Record<Told, Share>>;
  /** Cases with two causes, and of how many both were found. */
  readonly twoCauses: { readonly cases: number; readonly inFirstThree: number; readonly likeliestPair: number };
  readonly ends: Readonly<Record<Played["end"], number>>;
  readonly meanMinutes: number;
  readonly meanBaseRateMinutes: number;
  /** Planner's minutes to the base-rate order's, both summed over the cases. */
  readonly ratio: number;
};

/**
 * Replays known cases through a tree: is the right cause believed, and what
 * does the way to it cost beside the base-rate order. Rules [V1]-[V3].
 *
 * @param person whose hands do it; the same for both ways.
 */
export function prove(tree: FaultTree, cases: readonly KnownCase[], person: Who = "mechanic"): Proof {
  const proofs = cases.map((known) => proveCase(tree, known, person));
  const mean = (of: (proof: CaseProof) => number): number => proofs.reduce((sum, proof) => sum + of(proof), 0) / Math.max(1, proofs.length);
  const within = (told: Told, most: number): number => mean(({ place }) => ((place[told] ?? Infinity) <= most ? 1 : 0));
  const share = (told: Told): Share => ({ first: within(told, 1), inFirstThree: within(told, 3) });
  const ended = (end: Played["end"]): number => proofs.filter(({ played }) => played.end === end).length;
  const meanMinutes = mean(({ played }) => played.minutes);
  const meanBaseRateMinutes = mean((proof) => proof.baseRateMinutes);
  return {
    cases: proofs,
    right: { start: share("start"), "but-confirming": share("but-confirming"), all: share("all") },
    twoCauses: {
      cases: proofs.filter(({ both }) => both).length,
      inFirstThree: proofs.filter(({ both }) => both?.inFirstThree).length,
      likeliestPair: proofs.filter(({ both }) => both?.likeliestPair).length,
    },
    ends: { cured: ended("cured"), held: ended("held"), called: ended("called") },
    meanMinutes,
    meanBaseRateMinutes,
    ratio: meanBaseRateMinutes > 0 ? meanMinutes / meanBaseRateMinutes : NaN,
  };
}

function proveCase(tree: FaultTree, known: KnownCase, person: Who): CaseProof {
  const places = TOLD.map((told) => [told, placeOf(tree, known, told)] as const);
  return {
    key: known.key,
    title: known.title,
    place: Object.fromEntries(places.map(([told, { place }]) => [told, place])) as Record<Told, number | null>,
    believed: places[1]?.[1].believed ?? null,
    both: places[1]?.[1].both ?? null,
    played: playCase(tree, known, person),
    baseRateMinutes: baseRateMinutes(tree, known, person),
  };
}

/** Where the right cause stands among the causes, from 1, on so much of a known case; null where the tree does not have it for this engine. */
export type Placed = { place: number | null; believed: string | null; both: Both | null };

export function placeOf(tree: FaultTree, known: KnownCase, told: Told): Placed {
  const model = compile(tree, settingFor(known, "mechanic"));
  const belief = believe(model, evidenceFor(tree, known, told));
  const { shares } = belief;
  const ofCauses = shares.subarray(0, model.unknownAt);
  const right = new Set([...known.causes, ...known.alsoAccept.map(({ cause }) => cause)].flatMap((key) => model.causeAt.get(key) ?? []));
  const best = Math.max(-Infinity, ...[...right].map((index) => shares[index] ?? 0));
  const ahead = ofCauses.reduce((count, share, index) => count + (!right.has(index) && share >= best - TIE ? 1 : 0), 0);
  const most = ofCauses.indexOf(Math.max(...ofCauses));
  return { place: right.size > 0 ? ahead + 1 : null, believed: model.causes[most]?.key ?? null, both: bothOf(model, belief, known) };
}

function bothOf(model: Model, { shares, pairs }: Belief, known: KnownCase): Both | null {
  if (known.causes.length < 2) return null;
  const right = new Set(known.causes.map((key) => model.causeAt.get(key) ?? -1));
  const ranked = [...model.causes.keys()].sort((a, b) => shares[b]! - shares[a]!).slice(0, 3);
  const [likeliest] = likeliestPairs(pairs, model.causes.length, 0, 1);
  return {
    inFirstThree: ranked.filter((index) => right.has(index)).length >= 2,
    likeliestPair: likeliest !== undefined && right.has(likeliest.a) && right.has(likeliest.b),
  };
}
