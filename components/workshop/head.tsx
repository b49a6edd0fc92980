"use client";

import { Redo2, Undo2 } from "lucide-react";
import Link from "next/link";
import { Mark } from "@/components/ui/mark";
import { useObservable } from "@/lib/client/screen/use-observable";
import type { Workbench } from "@/lib/client/workshop/workbench";
import type { TreeVersionInfo } from "@/lib/core/contract/tree";
import { onDeep } from "./on-deep";
import { MoreMenu } from "./more-menu";
import { Publish } from "./publish";
import { SavingWords } from "./saving-words";
import type { Checked } from "./use-checked";
import { ViewTabs } from "./view-tabs";
import type { Place } from "./place";

type Props = {
  fleetId: string;
  bench: Workbench;
  current: TreeVersionInfo;
  place: Place;
  go: (to: Partial<Place>) => void;
  checked: Checked;
};

/** The head of the workshop: what the draft is, whether it is saved, and what can be done with the whole of it. */
export function Head({ fleetId, bench, current, place, go, checked }: Props) {
  const session = useObservable(bench.session);
  return (
    <header className="no-print flex flex-wrap items-center gap-x-4 gap-y-2 bg-deep px-4 py-2 text-on-deep">
      <Link
        href={`/f/${fleetId}/trees`}
        prefetch={false}
        className="flex min-h-12 items-center gap-2.5 font-bold"
        title="Back to the fleet's trees"
      >
        <Mark />
        <span className="text-xl">Gudgeon</span>
        <span className="visually-hidden">Back to the fleet’s trees</span>
      </Link>
      <div className="mr-auto min-w-0">
        <h1 className="text-lg!">{session.tree.title}</h1>
        <p className="text-sm">
          Draft on version {current.number} · <SavingWords bench={bench} />
        </p>
      </div>
      <button
        type="button"
        className={onDeep()}
        disabled={session.undo.length === 0}
        onClick={() => bench.undo()}
        title={session.undo.at(-1)?.says}
      >
        <Undo2 aria-hidden size={18} /> Undo
      </button>
      <button
        type="button"
        className={onDeep()}
        disabled={session.redo.length === 0}
        onClick={() => bench.redo()}
        title={session.redo.at(-1)?.says}
      >
        <Redo2 aria-hidden size={18} /> Redo
      </button>
      <ViewTabs here={place.view} onChoose={(view) => go({ view })} />
      <MoreMenu fleetId={fleetId} bench={bench} />
      <Publish fleetId={fleetId} bench={bench} checked={checked} current={current} />
    </header>
  );
}
