"use client";

import { useState } from "react";
import type { Situation } from "@/lib/core/tree/schema";
import { SITUATIONS } from "@/lib/client/hand-over/facts";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { Fold } from "@/components/ui/fold";
import { Segmented } from "@/components/ui/segmented";
import { BigRow } from "./big-row";
import { BoatFirst } from "./boat-first";
import { CrankTimer } from "./crank-timer";
import { useHere } from "./here";
import { NoteOnly } from "./note-only";
import { NotAboard } from "./not-aboard";
import { useStepDue } from "./step-due";

/** Whatever one wants to say without being asked. */
export function OutOfTurn() {
  const { view, go, record, setUndo } = useHere();
  const due = useStepDue();
  const [open, setOpen] = useState(false);
  /** The boat has got under way since: what makes her safe comes before the engine. */
  const [castOff, setCastOff] = useState(false);
  const leave = (work: () => void) => () => {
    setOpen(false);
    work();
  };
  return (
    <div className="mt-6">
      <Button wide onClick={() => setOpen(true)}>
        Say something else
      </Button>
      <Dialog open={open} onClose={() => setOpen(false)} title="Say something else" sheet>
        <div className="grid gap-2">
          <BigRow
            title="Something dangerous has turned up"
            detail="Smoke, fuel, water, heat or hurt: what to do now"
            onTap={leave(() => go("rules"))}
          />
          <BigRow title="I have already looked at something" detail="Any check, in any order" onTap={leave(() => go("looked"))} />
          <BigRow title="I have already tried something" detail="Any repair, and what it did" onTap={leave(() => go("tried"))} />
          <BigRow
            title="It does something else too, or not any more"
            detail="Add or take back a symptom"
            onTap={leave(() => go("symptoms"))}
          />
          <BigRow
            title="It runs again by itself"
            detail="Nothing was found, or nothing was done"
            onTap={leave(() => {
              void record("runs-again", {}).then((event) => {
                setUndo({ event: event.id, says: "It runs again by itself", withdraws: null });
                go("outcome");
              });
            })}
          />
          <BigRow title="Call for help" detail="A page to hand over, to send or to read out" onTap={leave(() => go("hand-over"))} />
          <BigRow title="End it and log the outcome" onTap={leave(() => go("outcome"))} />
          <Segmented<Situation>
            name="situation-now"
            legend="Where is the boat now?"
            options={(["alongside", "at-anchor", "under-way"] as const).map((value) => ({ value, title: SITUATIONS[value] }))}
            value={view.situation}
            onChange={(situation) => {
              if (situation === view.situation) return;
              setCastOff(situation === "under-way");
              void record("situation-changed", { situation });
            }}
          />
          {castOff && <BoatFirst safe={false} onSafe={leave(() => setCastOff(false))} onCall={leave(() => go("hand-over"))} />}
          {/* A step that cranks has the clock on its own screen: one burst is never counted by two. */}
          {(due?.cranks ?? null) === null && (
            <Fold title="It is being cranked">
              <CrankTimer asks={null} />
            </Fold>
          )}
          <NotAboard onSaid={() => setOpen(false)} />
          <NoteOnly onSaid={() => setOpen(false)} />
        </div>
      </Dialog>
    </div>
  );
}
