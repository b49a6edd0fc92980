"use client";

import { agoInWords } from "@/lib/client/duration";
import type { Ready } from "@/lib/client/screen/surface";
import { useNow } from "@/lib/client/screen/use-now";
import { useSummaries } from "@/lib/client/screen/use-summaries";
import type { Engine } from "@/lib/core/contract/engine";
import type { FaultTree } from "@/lib/core/tree/schema";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";

type Props = { ready: Ready; engine: Engine; tree: FaultTree; onGoOn: (diagnosis: string) => void };

/** A diagnosis of this engine that is still open: to go on with it comes before beginning another. */
export function GoOnFirst({ ready, engine, tree, onGoOn }: Props) {
  const now = useNow();
  const open = useSummaries(ready.store).find(({ engineId, ended }) => engineId === engine.id && !ended);
  if (!open) return null;
  const symptoms = open.symptoms.flatMap((key) => tree.symptoms.filter((symptom) => symptom.key === key).map(({ title }) => title));
  const answers = open.answers === 1 ? "1 answer" : `${open.answers} answers`;
  return (
    <div className="mb-5">
      <Notice tone="look" title="A diagnosis of this engine is still open">
        <p>
          {symptoms.join(", ") || open.complaint || "No symptom given"}: {answers}
          {now ? `, ${agoInWords(open.touchedAt, now)}` : ""}. Is it the same fault? Then what was found counts on.
        </p>
        <Button className="mt-2" onClick={() => onGoOn(open.id)}>
          Go on with that one
        </Button>
      </Notice>
    </div>
  );
}
