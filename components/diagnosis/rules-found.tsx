"use client";

import { useHere } from "./here";
import { RuleLift } from "./rule-lift";
import { RuleSays } from "./rule-says";

/** Rules that a finding, or the seconds of cranking, brought into force: nobody was asked, so there is no answer to change. */
export function RulesFound() {
  const { view } = useHere();
  const found = view.rules.filter((rule) => rule.found);
  if (found.length === 0) return null;
  return (
    <section aria-labelledby="rules-found" className="mb-5">
      <h2 id="rules-found">In force by what was found</h2>
      {found.map((rule) => (
        <div key={rule.key}>
          <RuleSays rule={rule} />
          <p className="mt-1 text-sm text-ink-2">{rule.because}</p>
          <RuleLift rule={rule} />
        </div>
      ))}
    </section>
  );
}
