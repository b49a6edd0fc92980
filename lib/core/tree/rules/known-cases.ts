import { findUnit } from "../../units/units";
import type { FaultTree } from "../schema";
import type { Found, Rule } from "./rule";

function readingsThatCannotBe(tree: FaultTree): Found[] {
  return tree.knownCases.flatMap((known) =>
    known.findings.flatMap((seen) => {
      const node = { kind: "known case" as const, key: known.key };
      const reading = tree.checks.find(({ key }) => key === seen.check)?.reading;
      if (seen.finding === undefined && seen.value === undefined)
        return [{ node, says: `it says nothing of check ${seen.check}.`, mend: 'Add "finding", or "value" and "unit".' }];
      if (seen.value === undefined) return [];
      if (reading === undefined)
        return [{ node, says: `it gives a value of check ${seen.check}, which is not a reading.`, mend: 'Give a "finding".' }];
      const quantity = seen.unit === undefined ? null : (findUnit(seen.unit)?.quantity ?? null);
      if (quantity !== reading.quantity)
        return [
          {
            node,
            says: `"${seen.unit ?? "no unit"}" is no unit of ${reading.quantity}, which check ${seen.check} reads.`,
            mend: `Add a "unit" of ${reading.quantity}.`,
          },
        ];
      return [];
    }),
  );
}

export const knownCaseRules: readonly Rule[] = [{ name: "known-case-reading", severity: "error", find: readingsThatCannotBe }];
