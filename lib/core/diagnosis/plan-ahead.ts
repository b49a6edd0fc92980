import { TELLS_NOTHING, type Candidate } from "./candidates";
import type { BestTry, ExpectedCost } from "./expected-cost";
import { informationOf, type Outcomes } from "./outcomes";

/** A check of the plan, over the hypotheses that are reckoned with. */
type Asked = { readonly minutes: number; readonly learns: number; readonly outcomes: Outcomes; readonly sight: string | undefined };

/** What the plan can do next, by place among the candidates or among the options. */
export type Act = { readonly kind: "check" | "remedy"; readonly place: number };

type Branch = Act & { readonly minutes: number; readonly then: readonly { readonly chance: number; readonly node: Node }[] };

/** A belief that the plan may come to. */
type Node = {
  readonly weights: Float64Array;
  /** Chance to come here, if what leads here is done. */
  readonly reach: number;
  readonly asked: readonly number[];
  readonly tried: readonly number[];
  readonly trying: BestTry;
  /** null while nobody has looked further. */
  branches: readonly Branch[] | null;
};

/** Within the plan a remedy less likely than this is left to the order of cure chance per minute. */
const WORTH_A_BRANCH = 0.15;
/** A belief come to less often than this is not followed. */
const HARDLY_EVER = 1e-4;

/**
 * Thinks ahead on a tree of beliefs. Each belief has its most telling check for
 * the minutes and its likeliest cheap remedy for branches; where the tree ends,
 * remedies are tried in their order and help is called. Folded back, stopping
 * wherever that is cheaper, the value is what a real way of going on costs, so
 * it can be trusted against "call now". Beliefs likely to be met are followed
 * first. Rules [N3], [N5].
 */
export class PlanAhead {
  readonly #cost: ExpectedCost;
  readonly #checks: readonly Asked[];

  /** @param kept the hypotheses reckoned with, by their index in the model. */
  constructor(candidates: readonly Candidate[], cost: ExpectedCost, kept: readonly number[]) {
    this.#cost = cost;
    this.#checks = candidates.map(({ check, minutes, learns, outcomes }) => ({
      minutes,
      learns,
      outcomes: compact(outcomes, kept),
      sight: check.check.sameSight,
    }));
  }

  /**
   * Expected minutes if `act` is done next and `beliefs` beliefs are followed after it.
   *
   * @param second what is then done first, instead of what the plan would do.
   */
  worthOf(act: Act, weights: Float64Array, beliefs: number, second?: Act): number {
    const root: Node = { weights, reach: 1, asked: [], tried: [], trying: this.#cost.from(weights), branches: null };
    root.branches = [this.#branch(root, act)];
    if (second) for (const { node } of root.branches[0]!.then) node.branches = [this.#branch(node, second)];
    const ends = root.branches.flatMap(({ then }) => then.map(({ node }) => node));
    for (let done = 0; done < beliefs && ends.length > 0; done++) {
      const [node] = ends.splice(likeliest(ends), 1);
      if (!node || node.reach < HARDLY_EVER) break;
      node.branches = this.#branchesOf(node);
      for (const branch of node.branches) for (const { node: next } of branch.then) ends.push(next);
    }
    return valueOf(root.branches[0]!);
  }

  #branch(node: Node, act: Act): Branch {
    return act.kind === "check" ? this.#asking(node, act.place) : this.#attempt(node, act.place);
  }

  #branchesOf(node: Node): readonly Branch[] {
    const branches: Branch[] = [];
    const check = this.#mostTelling(node);
    if (check !== null) branches.push(this.#asking(node, check));
    const { first } = node.trying;
    if (first !== null && this.#cost.chanceOf(first, node.weights) > WORTH_A_BRANCH) branches.push(this.#attempt(node, first));
    return branches;
  }

  #mostTelling(node: Node): number | null {
    let best: number | null = null;
    let most = 0;
    for (let place = 0; place < this.#checks.length; place++) {
      const check = this.#checks[place]!;
      if (this.#isSeen(check, place, node.asked)) continue;
      const information = informationOf(check.outcomes, node.weights) * check.learns;
      if (information < TELLS_NOTHING || information <= most * check.minutes) continue;
      most = information / check.minutes;
      best = place;
    }
    return best;
  }

  #isSeen({ sight }: Asked, place: number, asked: readonly number[]): boolean {
    for (const one of asked) if (one === place || (sight !== undefined && this.#checks[one]!.sight === sight)) return true;
    return false;
  }

  #asking(node: Node, place: number): Branch {
    const { outcomes, minutes, learns } = this.#checks[place]!;
    const asked = [...node.asked, place];
    const then = outcomes.predict.map((row, finding) => {
      const weigh = outcomes.weigh[finding]!;
      const weights = new Float64Array(row.length);
      let chance = 0;
      for (let index = 0; index < row.length; index++) {
        chance += node.weights[index]! * row[index]!;
        weights[index] = node.weights[index]! * weigh[index]!;
      }
      return this.#come(node, weights, chance * learns, asked, node.tried);
    });
    if (learns < 1) then.push(this.#come(node, Float64Array.from(node.weights), 1 - learns, asked, node.tried));
    return { kind: "check", place, minutes, then };
  }

  #attempt(node: Node, place: number): Branch {
    const { minutes, held, linkedAt, cure } = this.#cost.options[place]!;
    const weights = Float64Array.from(node.weights);
    linkedAt.forEach((at, link) => (weights[at] = weights[at]! * (1 - cure[link]!)));
    const chance = this.#cost.chanceOf(place, node.weights);
    const then = [this.#come(node, weights, 1 - chance, node.asked, [...node.tried, place])];
    return { kind: "remedy", place, minutes: minutes + held * chance, then };
  }

  /** A belief come to with `chance`; its weights are made to sum to 1, in place. */
  #come(from: Node, weights: Float64Array, chance: number, asked: readonly number[], tried: readonly number[]) {
    let total = 0;
    for (let index = 0; index < weights.length; index++) total += weights[index]!;
    if (total > 0) for (let index = 0; index < weights.length; index++) weights[index] = weights[index]! / total;
    const trying = this.#cost.from(weights, tried);
    return { chance, node: { weights, reach: from.reach * chance, asked, tried, trying, branches: null } };
  }
}

const valueOf = (branch: Branch): number => branch.then.reduce((sum, { chance, node }) => sum + chance * worth(node), branch.minutes);

const worth = (node: Node): number => Math.min(node.trying.minutes, ...(node.branches ?? []).map(valueOf));

function likeliest(nodes: readonly Node[]): number {
  let best = 0;
  for (let place = 1; place < nodes.length; place++) if (nodes[place]!.reach > nodes[best]!.reach) best = place;
  return best;
}

const pick = (row: Float64Array, kept: readonly number[]): Float64Array => Float64Array.from(kept, (index) => row[index] ?? 0);

/** The same outcomes over fewer hypotheses. */
function compact({ predict, weigh, negEntropy }: Outcomes, kept: readonly number[]): Outcomes {
  const rows = predict.map((row) => pick(row, kept));
  return {
    predict: rows,
    weigh: weigh === predict ? rows : weigh.map((row) => pick(row, kept)),
    negEntropy: negEntropy && pick(negEntropy, kept),
  };
}
