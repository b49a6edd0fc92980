"use client";

import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { useObservable } from "@/lib/client/screen/use-observable";
import type { Workbench } from "@/lib/client/workshop/workbench";
import type { Collision } from "@/lib/core/tree/merge-trees";

/** Fields that another mechanic changed at the same time, each to something else: nothing is lost, somebody has to say which. */
export function Collisions({ bench }: { bench: Workbench }) {
  const { collisions } = useObservable(bench.session);
  if (collisions.length === 0) return null;
  return (
    <Notice
      tone="look"
      title={collisions.length === 1 ? "One field was changed by both of you" : `${collisions.length} fields were changed by both of you`}
      live
    >
      <p>Theirs stands in the draft now. Yours is kept here until you choose.</p>
      <ul className="mt-2 grid gap-3">
        {collisions.map((collision) => (
          <li key={collision.path.join("/")} className="grid gap-2">
            <b className="font-semibold">
              {collision.node.kind} {collision.node.key}
              {collision.field.length > 0 && `: ${collision.field.join(" › ")}`}
            </b>
            <Sides collision={collision} />
            <div className="flex flex-wrap gap-2">
              <Button onClick={() => bench.choose(collision, "mine")}>Keep mine</Button>
              <Button onClick={() => bench.choose(collision, "theirs")}>Take theirs</Button>
            </div>
          </li>
        ))}
      </ul>
    </Notice>
  );
}

function Sides({ collision }: { collision: Collision }) {
  const sides = [
    ["It was", collision.base],
    ["You have", collision.mine],
    ["They have", collision.theirs],
  ] as const;
  return (
    <dl className="grid grid-cols-[6rem_minmax(0,1fr)] gap-x-3">
      {sides.map(([who, value]) => (
        <div key={who} className="contents">
          <dt className="text-ink-2">{who}</dt>
          <dd>{shown(value)}</dd>
        </div>
      ))}
    </dl>
  );
}

function shown(value: unknown): string {
  if (value === undefined) return "not there";
  if (typeof value === "string" || typeof value === "number") return String(value);
  const text = JSON.stringify(value);
  return text.length > 300 ? `${text.slice(0, 297)}…` : text;
}
