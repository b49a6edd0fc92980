"use client";

import { useEffect, useState } from "react";
import { NoAnswer } from "@/lib/client/exchange/request";
import { SessionKeeper } from "@/lib/client/workshop/session-keeper";
import { openWorkbench, type Workbench } from "@/lib/client/workshop/workbench";

export type Opened = { bench: Workbench } | { failure: string } | null;

/** The fleet's draft on this device, begun from the version in use where there is none; null while it is fetched. `attempt`: counts up to try again. */
export function useWorkbench(fleetId: string, userId: string, versionId: string, attempt: number): Opened {
  const [opened, setOpened] = useState<Opened>(null);
  useEffect(() => {
    let current = true;
    let bench: Workbench | null = null;
    openWorkbench(fleetId, new SessionKeeper(userId, fleetId), versionId)
      .then((made) => {
        bench = made;
        if (current) setOpened({ bench: made });
        else made.close();
      })
      .catch((failure: unknown) => current && setOpened({ failure: inWords(failure) }));
    const back = () => bench?.nudge();
    window.addEventListener("online", back);
    document.addEventListener("visibilitychange", back);
    return () => {
      current = false;
      bench?.close();
      window.removeEventListener("online", back);
      document.removeEventListener("visibilitychange", back);
    };
  }, [fleetId, userId, versionId, attempt]);
  return opened;
}

function inWords(failure: unknown): string {
  if (failure instanceof NoAnswer && failure.isNoSignal)
    return "There is no signal, and the draft is on the server. What you edited here before is kept on this device and goes ashore when the draft opens.";
  return failure instanceof Error ? failure.message : "The draft could not be opened.";
}
