"use client";

import type { Said } from "@/lib/core/diagnosis/view";
import { Button } from "@/components/ui/button";
import { useGuard } from "@/lib/client/screen/use-guard";
import { useHere } from "./here";
import { Photo } from "./photo";

const CHANGEABLE = new Set(["answered", "remedy-tried", "rule-answered", "begun"]);
/** Danger is changed where what to do about it is said; what is wrong, where all symptoms stand. */
const CHANGED_AT = { "rule-answered": "rules", begun: "symptoms" } as const;

export function SaidRow({ said }: { said: Said }) {
  const { go, record, setUndo, view } = useHere();
  const guard = useGuard();
  const change = () => {
    if (said.kind === "rule-answered" || said.kind === "begun") go(CHANGED_AT[said.kind], said.key ?? undefined);
    else go("change", said.event);
  };
  return (
    <li className="rounded-xl border border-rule bg-sheet p-3.5">
      <p className="text-sm text-ink-2">{said.title}</p>
      <p className="font-semibold">{said.says}</p>
      {said.note && <p className="mt-1 text-sm whitespace-pre-wrap">{said.note}</p>}
      {said.photos.length > 0 && (
        <div className="mt-2 flex flex-wrap gap-2">
          {said.photos.map((id, index) => (
            <Photo key={id} id={id} number={index + 1} />
          ))}
        </div>
      )}
      {(said.mayChange || (said.kind === "begun" && !view.outcome)) && (
        <div className="mt-2 flex flex-wrap gap-2">
          {CHANGEABLE.has(said.kind) && (
            <Button aria-label={`Change: ${said.title}`} onClick={change}>
              Change
            </Button>
          )}
          {said.mayChange && (
            <Button
              tone="quiet"
              aria-label={`Take back: ${said.title}`}
              onClick={() =>
                // The next row moves up under the finger.
                guard("take back", () => {
                  setUndo(null);
                  void record("taken-back", { event: said.event });
                })
              }
            >
              Take back
            </Button>
          )}
        </div>
      )}
    </li>
  );
}
