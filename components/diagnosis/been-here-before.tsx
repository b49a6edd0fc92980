"use client";

import { beenHere } from "@/lib/client/been-here";
import { useHere } from "./here";

/** A cause that was cured on this engine before and is here again: a fact, and a reason to look upstream. */
export function BeenHereBefore({ cause }: { cause: string }) {
  const { phone, tree, engine, summary } = useHere();
  const { times, last, upstream } = beenHere(phone.recentLog, tree, engine.id, cause, summary.id);
  if (times === 0 || !last) return null;
  const title = tree.causes.find(({ key }) => key === cause)?.title ?? cause;
  return (
    <section aria-label="Been here before" className="rounded-xl border-[1.5px] border-lead bg-lead-wash px-4 py-3">
      <p className="text-sm font-bold text-lead">Came back</p>
      <p className="font-semibold">
        {title}: {times === 1 ? "once before" : `${times} times before`} on this engine
      </p>
      <p className="mt-1 text-sm">
        {times === 1 ? "That was on " : "The last time was on "}
        {new Date(last.at).toLocaleDateString("en-GB", { day: "numeric", month: "short", year: "numeric" })}
        {last.engineHours !== null && (
          <>
            {" at "}
            <span className="dial">{Math.round(last.engineHours)}</span> h
          </>
        )}
        .
      </p>
      {upstream.length > 0 && (
        <>
          <p className="mt-2 text-sm font-semibold">Putting it right again treats the sign. Look upstream at:</p>
          <ul className="list-disc pl-5 text-sm">
            {upstream.slice(0, 5).map(({ title: root, share }) => (
              <li key={root}>
                {root}
                {share !== null && `, behind it in about ${Math.round(share * 100)} of 100 cases`}
              </li>
            ))}
          </ul>
        </>
      )}
    </section>
  );
}
