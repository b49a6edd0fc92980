"use client";

import { useMemo, useState } from "react";
import { symptomFinder } from "@/lib/client/find-symptoms";
import type { Ready } from "@/lib/client/screen/surface";
import type { Address, useAddress } from "@/lib/client/screen/use-address";
import { useDraft } from "@/lib/client/screen/use-draft";
import { useGuard } from "@/lib/client/screen/use-guard";
import { useTree } from "@/lib/client/screen/use-phone";
import { begin } from "@/lib/client/begin";
import { inWords } from "@/lib/client/count-in-words";
import type { Engine } from "@/lib/core/contract/engine";
import type { Phone } from "@/lib/core/contract/phone";
import type { Situation } from "@/lib/core/tree/schema";
import { Button } from "@/components/ui/button";
import { Checkbox } from "@/components/ui/checkbox";
import { Segmented } from "@/components/ui/segmented";
import { BoatFirst } from "./boat-first";
import { Frame } from "./frame";
import { GoOnFirst } from "./go-on-first";
import { OtherEngine } from "./other-engine";
import { ScreenHeading } from "./screen-heading";
import { SymptomHits } from "./symptom-hits";
import { SymptomList } from "./symptom-list";

type Props = { ready: Ready; phone: Phone; engine: Engine; address: Address; go: ReturnType<typeof useAddress>["go"] };

/** Where the boat is and what is wrong, in the person's own words. */
export function Say({ ready, phone, engine, go }: Props) {
  const tree = useTree(ready.store, phone.treeVersion.id);
  const onlyMechanic = phone.roles.includes("mechanic") && phone.roles.length === 1;
  const [draft, change] = useDraft(ready.store, engine.id, onlyMechanic);
  const [asked, setAsked] = useState(false);
  const [beginning, setBeginning] = useState(false);
  const [listOpen, setListOpen] = useState(false);
  const guard = useGuard();
  const find = useMemo(() => symptomFinder(tree?.symptoms ?? []), [tree]);
  const hits = useMemo(() => find(draft?.complaint ?? ""), [find, draft?.complaint]);
  const who = `${engine.boatName}, ${engine.name}`;
  const line = (
    <button type="button" className="min-h-12 underline underline-offset-4" onClick={() => go({ at: "engines" })}>
      Another engine
    </button>
  );
  if (!draft || !tree)
    return (
      <Frame ready={ready} who={who} line={line}>
        <p role="status">
          {tree === null ? "The fault tree is not on this phone yet. It comes with the next signal." : "Opening the fault tree."}
        </p>
      </Frame>
    );

  const fits = new Map(hits.map((hit) => [hit.key, hit.fits]));
  const isPicked = (key: string) => draft.chosen[key] ?? fits.get(key) ?? false;
  const picked = tree.symptoms.map(({ key }) => key).filter(isPicked);
  const toggle = (key: string) => change({ chosen: { ...draft.chosen, [key]: !isPicked(key) } });
  const shown = [...hits.map(({ key }) => key), ...picked.filter((key) => !fits.has(key))];
  const needsSafety = draft.situation === "under-way" && !draft.boatIsSafe;

  const goOn = () => {
    setAsked(true);
    const { situation } = draft;
    // It stands above the fold: the question comes to whoever missed it.
    if (!situation) document.querySelector<HTMLInputElement>('input[name="situation"]')?.focus();
    if (!situation || needsSafety || beginning) return;
    guard("begin", () => start(situation, "rules"));
  };
  /** A call for help needs no more than where the boat is: what is said so far goes with it. */
  const start = (situation: Situation, at: "rules" | "hand-over") => {
    if (beginning) return;
    setBeginning(true);
    void begin({ store: ready.store, phone, engine, tree, draft: { ...draft, situation }, symptoms: picked }).then((d) => {
      ready.exchange.nudge();
      go({ d, at });
    });
  };

  return (
    <Frame ready={ready} who={who} line={line}>
      <GoOnFirst ready={ready} engine={engine} tree={tree} onGoOn={(d) => go({ d, at: "step" })} />
      <Segmented<Situation>
        name="situation"
        legend="Where is the boat?"
        options={[
          { value: "alongside", title: "alongside" },
          { value: "at-anchor", title: "at anchor" },
          { value: "under-way", title: "under way" },
        ]}
        value={draft.situation}
        onChange={(situation) => change({ situation, boatIsSafe: false })}
      />
      {asked && !draft.situation && (
        <p role="alert" className="mt-2 font-semibold text-lead">
          Say where the boat is first. It decides what is safe to try.
        </p>
      )}
      {draft.situation === "under-way" && (
        <BoatFirst safe={draft.boatIsSafe} onSafe={(boatIsSafe) => change({ boatIsSafe })} onCall={() => start("under-way", "hand-over")} />
      )}
      <div className="mt-6">
        <ScreenHeading of={engine.id}>What is the engine doing, or not doing?</ScreenHeading>
      </div>
      <label htmlFor="complaint" className="mt-1 block text-sm text-ink-2">
        In your own words; several at once will do.
      </label>
      <textarea
        id="complaint"
        rows={2}
        value={draft.complaint}
        onChange={(event) => change({ complaint: event.target.value })}
        maxLength={1000}
        autoCapitalize="none"
        className="mt-2 w-full rounded-xl border-2 border-fill bg-sheet p-3.5 text-xl"
      />
      <SymptomHits
        symptoms={tree.symptoms}
        keys={shown}
        isPicked={isPicked}
        onToggle={toggle}
        said={draft.complaint.trim().length > 2}
        onlyNearest={hits.length > 0 && hits.every(({ weak }) => weak)}
      />
      <button type="button" aria-expanded={listOpen} className="link mt-2 min-h-12" onClick={() => setListOpen(!listOpen)}>
        {listOpen ? "Close the list" : "Pick from a list by system"}
      </button>
      {listOpen && <SymptomList tree={tree} isPicked={isPicked} onToggle={toggle} />}
      {picked.length > 0 && (
        <OtherEngine
          tree={tree}
          engine={engine}
          engines={phone.engines}
          situation={draft.situation}
          value={draft.otherEngine}
          onChange={(otherEngine) => change({ otherEngine })}
        />
      )}
      <div className="mt-4">
        <Checkbox
          checked={draft.mechanic}
          hint="Steps that need a mechanic’s hands and tools are then asked for too: opening fuel pipes, measuring compression."
          onChange={(event) => change({ mechanic: event.target.checked })}
        >
          A mechanic is at the engine
        </Checkbox>
      </div>
      {needsSafety && asked && (
        <p role="alert" className="mt-2 font-semibold text-lead">
          See to the boat first, then say so above.
        </p>
      )}
      <Button tone="strong" size="large" wide className="mt-4" onClick={goOn}>
        {picked.length === 0
          ? "Go on without a symptom"
          : picked.length === 1
            ? "Go on with this one"
            : `Go on with these ${inWords(picked.length)}`}
      </Button>
    </Frame>
  );
}
