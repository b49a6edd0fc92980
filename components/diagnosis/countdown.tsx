"use client";

import { useKeptMoment } from "@/lib/client/screen/use-kept-moment";
import { useTicking } from "@/lib/client/screen/use-ticking";
import { Button } from "@/components/ui/button";
import { clock } from "./clock";

/** Counts down something that has to be waited for, the page being open or not. `of`: what waits. */
export function Countdown({
  of,
  title,
  seconds,
  start,
  done,
}: {
  of: string;
  title: string;
  seconds: number;
  start: string;
  done: string;
}) {
  const [from, setFrom] = useKeptMoment(`gudgeon.wait.${of}`);
  const gone = useTicking(from);
  const left = gone === null ? seconds : Math.max(0, seconds - gone);
  return (
    <section aria-label={title} className="rounded-xl border-[1.5px] border-edge bg-sheet p-3.5">
      <div className="flex items-center justify-between gap-3">
        <p className="font-semibold">{title}</p>
        <p className="dial text-xl">{clock(left)}</p>
      </div>
      {from === null ? (
        <Button wide className="mt-2" onClick={() => setFrom(Date.now())}>
          {start}
        </Button>
      ) : (
        <>
          <p role="status" className="mt-1 text-sm">
            {left === 0 ? done : ""}
          </p>
          {/* It may have been run since. */}
          {left === 0 && (
            <Button wide className="mt-2" onClick={() => setFrom(Date.now())}>
              Start the clock again
            </Button>
          )}
        </>
      )}
    </section>
  );
}
