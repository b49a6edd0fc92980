"use client";

import { agoInWords } from "@/lib/client/duration";
import type { Ready } from "@/lib/client/screen/surface";
import type { useAddress } from "@/lib/client/screen/use-address";
import { useNow } from "@/lib/client/screen/use-now";
import { useTree } from "@/lib/client/screen/use-phone";
import { useSummaries } from "@/lib/client/screen/use-summaries";
import type { Summary } from "@/lib/client/store/summary";
import type { Phone } from "@/lib/core/contract/phone";
import { EmptyState } from "@/components/ui/empty-state";
import { Fold } from "@/components/ui/fold";
import { LinkButton } from "@/components/ui/link-button";
import { BigRow } from "./big-row";
import { Frame } from "./frame";
import { ScreenHeading } from "./screen-heading";

type Props = { ready: Ready; phone: Phone; go: ReturnType<typeof useAddress>["go"] };

/** More than this of what was left unfinished is folded: the engine comes first. */
const IN_THE_OPEN = 3;

/** The engine, last used first; above them what was left unfinished. */
export function ChooseEngine({ ready, phone, go }: Props) {
  const summaries = useSummaries(ready.store);
  const now = useNow();
  const tree = useTree(ready.store, phone.treeVersion.id);
  const open = summaries.filter(({ ended, engineId }) => !ended && phone.engines.some(({ id }) => id === engineId));
  const usedAt = (engineId: string) => summaries.find((summary) => summary.engineId === engineId)?.touchedAt ?? "";
  const engines = [...phone.engines].sort(
    (a, b) => usedAt(b.id).localeCompare(usedAt(a.id)) || a.boatName.localeCompare(b.boatName) || a.name.localeCompare(b.name),
  );
  const engineName = (id: string) =>
    phone.engines.filter((engine) => engine.id === id).map(({ boatName, name }) => `${boatName}, ${name}`)[0];
  const symptomTitle = (key: string) => tree?.symptoms.find((symptom) => symptom.key === key)?.title;

  const row = (summary: Summary) => (
    <BigRow
      key={summary.id}
      title={engineName(summary.engineId)}
      detail={summary.symptoms.map(symptomTitle).filter(Boolean).join(" · ") || summary.complaint || "No symptom given"}
      more={`Resume: ${summary.answers === 1 ? "1 answer" : `${summary.answers} answers`}${now ? `, ${agoInWords(summary.touchedAt, now)}` : ""}`}
      onTap={() => go({ d: summary.id, at: "step" })}
    />
  );

  return (
    <Frame ready={ready} who={phone.fleet.name} under="Find the fault, prove the fix">
      {open.length > 0 && (
        <section aria-labelledby="unfinished" className="mb-6">
          <h2 id="unfinished" className="mb-2">
            Left unfinished
          </h2>
          <div className="grid gap-2">
            {open.slice(0, IN_THE_OPEN).map(row)}
            {open.length > IN_THE_OPEN && (
              <Fold title={`${open.length - IN_THE_OPEN} older`}>
                <div className="grid gap-2">{open.slice(IN_THE_OPEN).map(row)}</div>
              </Fold>
            )}
          </div>
        </section>
      )}
      <ScreenHeading of="engines">Which engine?</ScreenHeading>
      <div className="mt-3 grid gap-2">
        {engines.map((engine) => (
          <BigRow
            key={engine.id}
            title={`${engine.boatName}, ${engine.name}`}
            detail={engine.hours === null ? null : `${engine.hoursAreEstimated ? "about " : ""}${Math.round(engine.hours)} h`}
            onTap={() => go({ engine: engine.id, at: "say" })}
          />
        ))}
        {engines.length === 0 && (
          <EmptyState
            title="No engine yet"
            action={
              <LinkButton href={`/f/${phone.fleet.id}/boats/new`} tone="strong">
                Add a boat and its engine
              </LinkButton>
            }
          >
            A name is enough to begin with; all else can be &ldquo;don&rsquo;t know&rdquo;. This needs a signal.
          </EmptyState>
        )}
      </div>
      <p className="mt-4">
        <a className="link inline-flex min-h-12 items-center" href={`/f/${phone.fleet.id}`}>
          Boats, log and people of {phone.fleet.name}
        </a>
      </p>
    </Frame>
  );
}
