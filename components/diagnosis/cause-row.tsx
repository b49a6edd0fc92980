import type { EvidenceShown, PossibleCause } from "@/lib/core/diagnosis/view";
import { Swatch, type Pattern } from "./swatch";

/** One cause; a tap opens what speaks for it, what against, and what lies behind it. */
export function CauseRow({ cause, pattern }: { cause: PossibleCause; pattern: Pattern }) {
  return (
    <details>
      <summary className="grid min-h-12 grid-cols-[1fr_44px_20px] items-center gap-2.5 text-sm">
        <span>
          <Swatch pattern={pattern} />
          {cause.title}
        </span>
        <span className="dial text-right">{cause.of100 === 0 ? "<1" : cause.of100}</span>
      </summary>
      <div className="grid gap-2 border-l-2 border-rule pb-2 pl-3 text-sm">
        <p>{cause.is}</p>
        {cause.inAll > cause.of100 + 1 && <p>Alone or beside another fault it is there in {cause.inAll} of 100.</p>}
        {cause.ofThisEngine && (
          <p>
            <span className="font-semibold">This engine{"\u2019"}s log</span> makes it{" "}
            {cause.ofThisEngine.times >= 1 ? "likelier" : "less likely"}. {cause.ofThisEngine.reason}
          </p>
        )}
        <Evidence title="Speaks for it" list={cause.speaksFor} />
        <Evidence title="Speaks against it" list={cause.speaksAgainst} />
        {cause.speaksFor.length + cause.speaksAgainst.length === 0 && (
          <p className="text-ink-2">Nothing found so far speaks for or against it.</p>
        )}
        {cause.notChecked.length > 0 && (
          <div>
            <p className="font-semibold">Not looked at yet</p>
            <ul className="list-disc pl-5">
              {cause.notChecked.slice(0, 5).map(({ check, title }) => (
                <li key={check}>{title}</li>
              ))}
            </ul>
          </div>
        )}
        {cause.behind.length > 0 && (
          <div>
            <p className="font-semibold">What may lie behind it</p>
            <ul className="list-disc pl-5">
              {cause.behind.map(({ cause: key, title, share }) => (
                <li key={key}>
                  {title}, in about {Math.round(share * 100)} of 100 cases of it
                </li>
              ))}
            </ul>
          </div>
        )}
      </div>
    </details>
  );
}

function Evidence({ title, list }: { title: string; list: readonly EvidenceShown[] }) {
  if (list.length === 0) return null;
  return (
    <div>
      <p className="font-semibold">{title}</p>
      <ul className="list-disc pl-5">
        {list.map((evidence) => (
          <li key={`${evidence.title} ${evidence.says}`}>
            {evidence.title}: {evidence.says} <span className="text-ink-2">({weight(evidence.factor)})</span>
          </li>
        ))}
      </ul>
    </div>
  );
}

/** By how much it moved the odds, in three steps: more would be a false precision. */
function weight(factor: number): string {
  const size = factor >= 1 ? factor : 1 / factor;
  return size >= 10 ? "strongly" : size >= 3 ? "clearly" : "a little";
}
