"use client";

import { Redo2, Undo2 } from "lucide-react";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { useObservable } from "@/lib/client/screen/use-observable";
import type { Workbench } from "@/lib/client/workshop/workbench";
import type { TreeVersionInfo } from "@/lib/core/contract/tree";
import { MoreMenu } from "./more-menu";
import type { Place } from "./place";
import { Publish } from "./publish";
import { SavingWords } from "./saving-words";
import { TakeUpNewer } from "./take-up-newer";
import type { Checked } from "./use-checked";

type Props = {
  fleetId: string;
  bench: Workbench;
  current: TreeVersionInfo;
  newestShipped: TreeVersionInfo | null;
  place: Place;
  go: (to: Partial<Place>) => void;
  checked: Checked;
  onGone: () => void;
};

/** The head of the workshop: what the draft is, whether it is saved, and what can be done with the whole of it. */
export function Head({ fleetId, bench, current, newestShipped, checked, onGone }: Props) {
  const session = useObservable(bench.session);
  const refused = useObservable(bench.refused);
  const saving = useObservable(bench.saving);
  return (
    <header className="grid gap-2">
      <div className="flex flex-wrap items-end gap-x-5 gap-y-2">
        <div className="mr-auto">
          <h1>{session.tree.title}</h1>
          <p className="text-sm text-ink-2">
            Draft · version {current.number} is in use · <SavingWords bench={bench} />
          </p>
        </div>
        <Button disabled={session.undo.length === 0} onClick={() => bench.undo()} title={session.undo.at(-1)?.says}>
          <Undo2 aria-hidden size={18} /> Undo
        </Button>
        <Button disabled={session.redo.length === 0} onClick={() => bench.redo()} title={session.redo.at(-1)?.says}>
          <Redo2 aria-hidden size={18} /> Redo
        </Button>
        <MoreMenu fleetId={fleetId} bench={bench} onGone={onGone} />
        <Publish fleetId={fleetId} bench={bench} checked={checked} current={current} />
      </div>
      {refused && (
        <Notice tone="look" live>
          {refused}
        </Notice>
      )}
      {saving.state === "gone" && (
        <Notice tone="look" title="This draft is closed" live>
          <p>Open the draft that is there now; what you changed since the last save can be put into it.</p>
          <Button className="mt-2" onClick={onGone}>
            Open it
          </Button>
        </Notice>
      )}
      {newestShipped && <TakeUpNewer fleetId={fleetId} bench={bench} newest={newestShipped} />}
    </header>
  );
}
