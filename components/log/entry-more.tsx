import type { LogEntry } from "@/lib/core/contract/log";

/** What a line of the log has beyond its columns: proof, parts, note, and who wrote it. */
export function EntryMore({ entry }: { entry: LogEntry }) {
  const parts = entry.parts.map((p) => (p.quantity === 1 ? p.title : `${p.quantity} × ${p.title}`)).join(", ");
  const lines = [entry.proof && `Proved: ${entry.proof}`, parts && `Used: ${parts}`, entry.note, `Written by ${entry.by}`].filter(
    (line): line is string => Boolean(line),
  );
  return (
    <details>
      <summary className="link inline-flex min-h-12 items-center sm:min-h-8">More</summary>
      {lines.map((line) => (
        <p key={line} className="max-w-md">
          {line}
        </p>
      ))}
    </details>
  );
}
