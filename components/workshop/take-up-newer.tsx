"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { NoAnswer, request } from "@/lib/client/exchange/request";
import type { Workbench } from "@/lib/client/workshop/workbench";
import { TreeDraft } from "@/lib/core/contract/draft";
import { TreeVersionDocument, type TreeVersionInfo } from "@/lib/core/contract/tree";

type Props = { fleetId: string; bench: Workbench; newest: TreeVersionInfo };

/** A newer shipped tree than the one this draft grew from: joined in, this fleet's own changes kept. */
export function TakeUpNewer({ fleetId, bench, newest }: Props) {
  const [state, setState] = useState<"offer" | "working" | "done" | { failed: string } | "hidden">("offer");
  const [takenUp, setTakenUp] = useState<string | null>(null);
  const look = async () => {
    setState("working");
    try {
      const draft = TreeDraft.parse(await request(`/api/v1/fleets/${fleetId}/trees/draft`));
      setTakenUp(draft.takenUp);
      if (draft.takenUp === newest.id) return setState("hidden");
      const [base, newer] = await Promise.all(
        [draft.takenUp, newest.id].map(async (id) =>
          TreeVersionDocument.parse(await request(`/api/v1/fleets/${fleetId}/trees/versions/${id}`)),
        ),
      );
      if (!base || !newer) return;
      bench.takeUp(base.document, newer);
      setState("done");
    } catch (failure) {
      setState({ failed: failure instanceof NoAnswer ? failure.because : "The newer tree could not be read." });
    }
  };
  if (state === "hidden" || takenUp === newest.id || bench.takenUp === newest.id) return null;
  if (state === "done")
    return (
      <Notice tone="good" live>
        Version {newest.number} of the shipped tree is in the draft. Your own changes are kept; what collides is listed above. Undo takes it
        back.
      </Notice>
    );
  return (
    <Notice title={`Version ${newest.number} of the shipped tree is newer than what this draft grew from`}>
      {typeof state === "object" && <p>{state.failed}</p>}
      <Button className="mt-2" disabled={state === "working"} onClick={() => void look()}>
        {state === "working" ? "One moment…" : "Take it up, own changes kept"}
      </Button>
    </Notice>
  );
}
