"use client";

import type { Said } from "@/lib/core/diagnosis/view";
import { Button } from "@/components/ui/button";
import { useGuard } from "@/lib/client/screen/use-guard";
import { useHere } from "./here";
import { Photo } from "./photo";

const CHANGEABLE = new Set(["answered", "remedy-tried", "rule-answered"]);

export function SaidRow({ said }: { said: Said }) {
  const { go, record, setUndo } = useHere();
  const guard = useGuard();
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
      {said.mayChange && (
        <div className="mt-2 flex flex-wrap gap-2">
          {CHANGEABLE.has(said.kind) && (
            <Button aria-label={`Change: ${said.title}`} onClick={() => go("change", said.event)}>
              Change
            </Button>
          )}
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
        </div>
      )}
    </li>
  );
}
