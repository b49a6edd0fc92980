/** A heading of the hand-over and its lines. */
export function HandOverPart({ title, lines, none }: { title: string; lines: readonly string[]; none: string }) {
  return (
    <section aria-label={title} className="break-inside-avoid">
      <h2 className="text-base">{title}</h2>
      {lines.length === 0 ? (
        <p className="text-ink-2">{none}</p>
      ) : (
        <ul className="list-disc pl-5">
          {lines.map((line) => (
            <li key={line}>{line}</li>
          ))}
        </ul>
      )}
    </section>
  );
}
