import { negEntropyOf } from "@/lib/core/diagnosis/compile-check";
import { compile } from "@/lib/core/diagnosis/compile";
import type { CheckModel, Model, RemedyModel } from "@/lib/core/diagnosis/model";
import { cause, check, remedy, tree } from "../core/diagnosis/small-trees";
import { setting } from "../core/diagnosis/random-trees";

/**
 * A diagnosis in bare numbers: causes with priors, the last hypothesis is what
 * no remedy cures; checks with a row a finding; remedies with a chance a
 * hypothesis; and what a call costs, whatever is at fault.
 */
export type PlainModel = {
  /** A share a hypothesis, the unknown last; they sum to 1. */
  readonly prior: readonly number[];
  readonly checks: readonly { readonly minutes: number; readonly rows: readonly Float64Array[] }[];
  readonly remedies: readonly { readonly minutes: number; readonly cures: readonly (readonly [cause: number, chance: number])[] }[];
  readonly callMinutes: number;
};

const numbered = (what: string, place: number): string => `${what}-${String(place).padStart(4, "0")}`;

/**
 * The same as what the planner works on. There a call costs its price and no
 * more, and whoever is asked can always tell: what cannot be told is a finding.
 */
export function modelOf(plain: PlainModel): Model {
  const causes = plain.prior.slice(0, -1).map((_, place) => cause(numbered("cause", place)));
  const skeleton = compile(
    tree({
      causes,
      checks: plain.checks.map(({ rows }, place) =>
        check(
          numbered("check", place),
          rows.map((_, finding) => `finding-${finding}`),
        ),
      ),
      remedies: plain.remedies.map((_, place) => remedy(numbered("mend", place))),
    }),
    { ...setting, callMinutes: plain.callMinutes, faults: "one" },
  );
  const prior = Float64Array.from(plain.prior);
  return {
    ...skeleton,
    logPrior: prior.map(Math.log),
    logPriorOfCauses: Math.log1p(-prior[prior.length - 1]!),
    checks: skeleton.checks.map((one, place) => checkOf(one, plain.checks[place]!)),
    remedies: skeleton.remedies.map((one, place) => remedyOf(one, plain.remedies[place]!, prior.length)),
    pairs: null,
    helpersMinutes: new Float64Array(prior.length),
    helperFinds: 0,
    tells: { told: 1e9, asked: 1e9 },
  };
}

function checkOf(skeleton: CheckModel, { minutes, rows }: PlainModel["checks"][number]): CheckModel {
  return { ...skeleton, minutes, rows, logRows: rows.map((row) => row.map(Math.log)), negEntropy: negEntropyOf(rows), linked: true };
}

function remedyOf(skeleton: RemedyModel, { minutes, cures }: PlainModel["remedies"][number], size: number): RemedyModel {
  const cure = new Float64Array(size);
  for (const [cause, chance] of cures) cure[cause] = chance;
  return {
    ...skeleton,
    minutes,
    cure,
    logResults: { cured: cure.map(Math.log), better: cure.map(Math.log), "no-change": cure.map((chance) => Math.log1p(-chance)) },
    linkedAt: Int32Array.from(cures, ([cause]) => cause),
    linkedCure: Float64Array.from(cures, ([, chance]) => chance),
  };
}
