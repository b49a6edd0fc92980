"use client";

import { X } from "lucide-react";
import { Button } from "@/components/ui/button";
import { useObservable } from "@/lib/client/screen/use-observable";
import type { Workbench } from "@/lib/client/workshop/workbench";
import { linkStrength, setLink, type CauseLink } from "@/lib/core/tree/edits/set-link";
import type { FaultTree } from "@/lib/core/tree/schema";
import { StrengthValue } from "../form/strength-value";
import { linkOfId } from "./link-of";

type Props = { bench: Workbench; symptom: string; id: string; onClose: () => void };

/** The strength of the link that was chosen in the picture, said as a sentence. */
export function LinkPicker({ bench, symptom, id, onClose }: Props) {
  const { tree } = useObservable(bench.session);
  const drawn = linkOfId(id, symptom);
  const cause = tree.causes.find(({ key }) => key === drawn?.cause);
  const strength = drawn && cause ? linkStrength(cause, drawn.link) : null;
  if (!drawn || !cause || strength === null) return null;
  return (
    <div
      role="group"
      aria-label="The chosen link"
      className="absolute inset-x-3 bottom-3 z-10 flex flex-wrap items-center gap-3 rounded-xl border-[1.5px] border-edge bg-sheet p-3"
    >
      <p className="min-w-48 flex-1">{inWords(tree, cause.title, drawn.link)}</p>
      <StrengthValue
        id="link-strength"
        label="How often"
        value={strength}
        factors={"gives" in drawn.link}
        onChange={(next) => bench.edit(setLink(bench.session.get().tree, drawn.cause, drawn.link, next), "Strength changed")}
      />
      <Button
        onClick={() => {
          bench.edit(setLink(bench.session.get().tree, drawn.cause, drawn.link, null), "Link taken out");
          onClose();
        }}
      >
        Take it out
      </Button>
      <button type="button" aria-label="Close" onClick={onClose} className="inline-flex min-h-12 min-w-12 items-center justify-center">
        <X aria-hidden size={20} />
      </button>
    </div>
  );
}

function inWords(tree: FaultTree, cause: string, link: CauseLink): string {
  if ("shows" in link) return `${cause} shows itself as “${tree.symptoms.find(({ key }) => key === link.shows)?.title ?? link.shows}”`;
  if ("curedBy" in link)
    return `${cause} is put right by “${tree.remedies.find(({ key }) => key === link.curedBy)?.title ?? link.curedBy}”`;
  if ("broughtOnBy" in link)
    return `${cause} is brought on by “${tree.causes.find(({ key }) => key === link.broughtOnBy)?.title ?? link.broughtOnBy}”`;
  const check = tree.checks.find(({ key }) => key === link.gives);
  return `${cause}: “${check?.title ?? link.gives}” then finds “${check?.findings.find(({ key }) => key === link.finding)?.title ?? link.finding}”`;
}
