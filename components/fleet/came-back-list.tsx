import Link from "next/link";
import { repeatInWords } from "@/components/engine/repeat-in-words";
import type { Engine } from "@/lib/core/contract/engine";
import type { RepeatFault } from "@/lib/core/contract/log";

/** Over the fleet: which faults came back, on which engine. The evidence stands on the engine's page. */
export function CameBackList({
  fleetId,
  repeats,
  engines,
}: {
  fleetId: string;
  repeats: readonly RepeatFault[];
  engines: readonly Engine[];
}) {
  const lines = repeats.flatMap((repeat) => {
    const engine = engines.find((e) => e.id === repeat.engineId);
    return engine ? [{ repeat, engine }] : [];
  });
  if (lines.length === 0) return null;
  return (
    <section
      aria-labelledby="came-back"
      className="rounded-xl border-[1.5px] border-lead bg-linear-to-r from-lead-wash to-sheet px-4 py-4 sm:px-5"
    >
      <h2 id="came-back">Came back</h2>
      <ul className="mt-1">
        {lines.map(({ repeat, engine }) => (
          <li key={`${repeat.engineId} ${repeat.cause}`}>
            <Link className="link inline-flex min-h-12 items-center py-1" prefetch={false} href={`/f/${fleetId}/engines/${engine.id}`}>
              <span>
                {engine.boatName}, {engine.name}. {repeatInWords(repeat)}
              </span>
            </Link>
          </li>
        ))}
      </ul>
    </section>
  );
}
