import type { TreeGraph } from "./tree-graph";

/** The same as the picture, as a list: for a screen reader, a small phone and a printer. */
export function TreeOutline({ graph }: { graph: TreeGraph }) {
  const titleOf = (check: string, finding: string) => {
    const c = graph.checks.find((k) => k.key === check);
    return { check: c?.title ?? check, finding: c?.findings.find((f) => f.key === finding)?.title ?? finding };
  };
  return (
    <ul className="grid gap-3">
      {graph.causes.map((cause) => (
        <li key={cause.key} className="rounded-lg border border-rule bg-sheet px-4 py-3">
          <h3>{cause.title}</h3>
          <p className="text-sm text-ink-2">{cause.is}</p>
          <dl className="mt-2 grid gap-1 text-sm sm:grid-cols-[9rem_1fr]">
            <dt className="text-ink-2">Told by</dt>
            <dd>
              <ul className="list-disc pl-5">
                {graph.tells
                  .filter((t) => t.cause === cause.key)
                  .sort((a, b) => b.ratio - a.ratio)
                  .map((t) => {
                    const { check, finding } = titleOf(t.check, t.finding);
                    return (
                      <li key={t.check + t.finding}>
                        {check}: {finding} (<span className="dial">{Math.round(t.ratio)}</span> times as often as in a sound engine)
                      </li>
                    );
                  })}
              </ul>
            </dd>
            <dt className="text-ink-2">Put right by</dt>
            <dd>
              {graph.cures
                .filter((c) => c.cause === cause.key)
                .map((c) => graph.remedies.find((r) => r.key === c.remedy)?.title ?? c.remedy)
                .join("; ")}
            </dd>
            {cause.roots.length > 0 && (
              <>
                <dt className="text-ink-2">Comes back through</dt>
                <dd>{cause.roots.join("; ")}</dd>
              </>
            )}
            <dt className="text-ink-2">Sources</dt>
            <dd>{cause.sources.join("; ")}</dd>
          </dl>
        </li>
      ))}
    </ul>
  );
}
