import type { FaultTree } from "../schema";
import { twice, type Found, type Rule } from "./rule";

/** A remedy that keeps a cause away renews what wears into it, so it cures it too. */
function guardsWhatItDoesNotCure(tree: FaultTree): Found[] {
  const causes = new Map(tree.causes.map((cause) => [cause.key, cause]));
  return tree.remedies.flatMap(({ key, upkeep }) =>
    (upkeep?.guards ?? [])
      .filter((cause) => causes.has(cause) && causes.get(cause)?.curedBy[key] === undefined)
      .map((cause) => ({
        node: { kind: "remedy" as const, key },
        says: `its upkeep guards ${cause}, which it does not cure.`,
        mend: 'Link the cause to it under "curedBy", or take it off "guards".',
      })),
  );
}

/** Two kinds of upkeep for one cause would each be taken for the service that counts. */
function guardedTwice(tree: FaultTree): Found[] {
  const all = tree.remedies.flatMap(({ key, upkeep }) => (upkeep?.guards ?? []).map((cause) => ({ key, cause })));
  return twice(all.map(({ cause }) => cause)).map((cause) => {
    const [first, second] = all.filter((one) => one.cause === cause);
    return {
      node: { kind: "remedy" as const, key: second?.key ?? first?.key ?? "" },
      says: `its upkeep guards ${cause}, and so does that of ${first?.key ?? "another"}.`,
      mend: "Leave it to the one whose interval it is.",
    };
  });
}

export const upkeepRules: readonly Rule[] = [
  { name: "guarded-is-cured", severity: "error", find: guardsWhatItDoesNotCure },
  { name: "guarded-once", severity: "error", find: guardedTwice },
];
