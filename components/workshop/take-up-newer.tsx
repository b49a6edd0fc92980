"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { NoAnswer, request } from "@/lib/client/exchange/request";
import { useObservable } from "@/lib/client/screen/use-observable";
import type { Workbench } from "@/lib/client/workshop/workbench";
import { TreeVersionDocument, type TreeVersionInfo } from "@/lib/core/contract/tree";

type Props = { fleetId: string; bench: Workbench; newest: TreeVersionInfo };

/** A newer shipped tree than the one this draft grew from: joined in, this fleet's own changes kept. */
export function TakeUpNewer({ fleetId, bench, newest }: Props) {
  const [state, setState] = useState<"offer" | "working" | "done" | { failed: string }>("offer");
  const { saved, takesUp } = useObservable(bench.session);
  const takeUp = async () => {
    setState("working");
    try {
      const [base, newer] = await Promise.all([saved.takenUp, newest.id].map((id) => readVersion(fleetId, id)));
      if (base && newer) bench.takeUp(base.document, newer);
      setState("done");
    } catch (failure) {
      setState({ failed: failure instanceof NoAnswer ? failure.because : "The newer tree could not be read." });
    }
  };
  const isTakenUp = (takesUp ?? saved.takenUp) === newest.id;
  if (state === "done" && isTakenUp)
    return (
      <Notice tone="good" live>
        Version {newest.number} of the shipped tree is in the draft. Your own changes are kept; what collides is listed above. Undo takes it
        back.
      </Notice>
    );
  if (isTakenUp) return null;
  return (
    <Notice title={`Version ${newest.number} of the shipped tree is newer than what this draft grew from`}>
      {typeof state === "object" && <p>{state.failed}</p>}
      <Button className="mt-2" disabled={state === "working"} onClick={() => void takeUp()}>
        {state === "working" ? "One moment…" : "Take it up, own changes kept"}
      </Button>
    </Notice>
  );
}

const readVersion = async (fleetId: string, id: string): Promise<TreeVersionDocument> =>
  TreeVersionDocument.parse(await request(`/api/v1/fleets/${fleetId}/trees/versions/${id}`));
