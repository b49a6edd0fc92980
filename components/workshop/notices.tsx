"use client";

import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { useObservable } from "@/lib/client/screen/use-observable";
import type { Workbench } from "@/lib/client/workshop/workbench";
import type { TreeVersionInfo } from "@/lib/core/contract/tree";
import { Collisions } from "./collisions";
import { TakeUpNewer } from "./take-up-newer";

type Props = {
  fleetId: string;
  bench: Workbench;
  newestShipped: TreeVersionInfo | null;
  /** Opens the draft that took this one's place. */
  onGone: () => void;
};

/** What the mechanic has to know or decide before going on. */
export function Notices({ fleetId, bench, newestShipped, onGone }: Props) {
  const refused = useObservable(bench.refused);
  const saving = useObservable(bench.saving);
  return (
    <div className="grid gap-2 px-4 not-empty:pt-3">
      {refused && (
        <Notice tone="look" live>
          {refused}
        </Notice>
      )}
      {saving.state === "gone" && (
        <Notice tone="look" title="This draft was published or given up by somebody else" live>
          <p>Open the draft that is there now: what you changed since the last save is brought into it.</p>
          <Button className="mt-2" onClick={onGone}>
            Open it
          </Button>
        </Notice>
      )}
      <Collisions bench={bench} />
      {newestShipped && <TakeUpNewer fleetId={fleetId} bench={bench} newest={newestShipped} />}
    </div>
  );
}
