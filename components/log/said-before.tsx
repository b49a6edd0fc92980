import { Card } from "@/components/ui/card";
import { Moment } from "./moment";

type Before = {
  version: number;
  takenBack: boolean;
  at: string;
  by: string;
  lines: readonly (readonly [title: string, says: string | null])[];
};

/** What a line said until it was corrected or taken back, the newest first. Nothing that was written is thrown away. */
export function SaidBefore({ before }: { before: readonly Before[] }) {
  if (before.length === 0) return null;
  return (
    <Card aria-labelledby="before">
      <h2 id="before">What it said before</h2>
      <ol className="divide-y divide-rule">
        {before.toReversed().map(({ version, takenBack, at, by, lines }) => (
          <li key={version} className="py-3">
            <p className="text-sm text-ink-2">
              {takenBack ? "Taken back" : "Corrected"} by {by}, <Moment at={at} />
            </p>
            <dl className="mt-1 grid gap-x-4 sm:grid-cols-[12rem_1fr]">
              {lines
                .filter(([, says]) => says)
                .map(([title, says]) => (
                  <div key={title} className="contents">
                    <dt className="text-ink-2">{title}</dt>
                    <dd className="mb-1 whitespace-pre-line sm:mb-0">{says}</dd>
                  </div>
                ))}
            </dl>
          </li>
        ))}
      </ol>
    </Card>
  );
}
