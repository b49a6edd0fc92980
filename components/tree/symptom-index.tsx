import Link from "next/link";
import { clsx } from "clsx";
import { Fold } from "@/components/ui/fold";
import type { FaultTree } from "@/lib/core/tree/schema";

type Props = { path: string; tree: Pick<FaultTree, "symptoms" | "causes">; here: string };

/** The tree's symptoms, each with the number of causes that show it. */
export function SymptomIndex({ path, tree, here }: Props) {
  const counts = new Map<string, number>();
  for (const cause of tree.causes) for (const key of Object.keys(cause.shows)) counts.set(key, (counts.get(key) ?? 0) + 1);
  const list = (
    <>
      <p className="px-2 text-sm text-ink-2">Causes that hang on</p>
      <ul>
        {tree.symptoms.map((symptom) => (
          <li key={symptom.key}>
            <Link
              prefetch={false}
              scroll={false}
              href={`${path}?symptom=${symptom.key}`}
              aria-current={symptom.key === here ? "true" : undefined}
              className={clsx(
                "flex min-h-12 items-center justify-between gap-3 rounded-lg px-2 text-sm",
                symptom.key === here ? "bg-shoal font-semibold night:border night:border-rule" : "hover:bg-shoal",
              )}
            >
              <span>{symptom.title}</span>
              <span className="dial">{counts.get(symptom.key) ?? 0}</span>
            </Link>
          </li>
        ))}
      </ul>
    </>
  );
  return (
    <>
      {/* Beside the part where there is room; on a phone it would stand before it, three screens long. */}
      <nav aria-label="Symptoms" className="no-print hidden lg:block">
        {list}
      </nav>
      <nav aria-label="Symptoms" className="no-print lg:hidden">
        <Fold title={`Another symptom (${tree.symptoms.length})`}>{list}</Fold>
      </nav>
    </>
  );
}
