"use client";

import { burstSeconds } from "@/lib/client/crank-clock";
import { useKeptMoment } from "@/lib/client/screen/use-kept-moment";
import { useTicking } from "@/lib/client/screen/use-ticking";
import { Button } from "@/components/ui/button";
import { Chip } from "@/components/ui/chip";
import { clock } from "./clock";
import { useHere } from "./here";

/** A small starter is not made for longer; a step may ask for less. */
const LONGEST_BURST = 10;
const REST_SECONDS = 60;

/** Cranking in bursts with rests between; both go on while the page is away. What is cranked adds up over all steps until the engine runs, since it fills a wet exhaust. */
export function CrankTimer({ asks }: { /** Seconds that the step asks for; null: none is on the screen. */ asks: number | null }) {
  const most = Math.min(LONGEST_BURST, asks ?? LONGEST_BURST);
  const { view, tree, summary, record } = useHere();
  const [burst, setBurst] = useKeptMoment(`gudgeon.burst.${summary.id}`);
  const [rest, setRest] = useKeptMoment(`gudgeon.rest.${summary.id}`);
  const cranking = useTicking(burst);
  const resting = useTicking(rest);
  const restLeft = resting === null ? 0 : Math.max(0, REST_SECONDS - resting);
  const inAll = Math.min(...tree.stopRules.flatMap(({ when }) => when.crankSeconds ?? []));
  const spent = view.crankSeconds + (cranking ?? 0) >= inAll;
  const stop = (ran: boolean) => {
    if (burst === null) return;
    const seconds = burstSeconds(burst, Date.now());
    setBurst(null);
    setRest(ran ? null : Date.now());
    void record("cranked", { seconds, ran });
  };
  return (
    <section aria-label="Cranking" className="rounded-xl border-[1.5px] border-edge bg-sheet p-3.5">
      <div className="flex flex-wrap items-center justify-between gap-2">
        <p className="font-semibold">Crank no more than {most} s at a time</p>
        <Chip tone={spent || view.crankSeconds >= inAll - LONGEST_BURST ? "lead" : "quiet"}>
          {view.crankSeconds === 0
            ? "Not cranked yet since it last ran"
            : `Cranked ${Math.round(view.crankSeconds)} s${Number.isFinite(inAll) ? ` of ${inAll} s` : ""} since it last ran`}
        </Chip>
      </div>
      {cranking !== null ? (
        <>
          <p className="dial my-2 text-3xl">{cranking.toFixed(1)} s</p>
          <p role="alert" className="min-h-6 font-semibold text-lead">
            {cranking >= most
              ? "Stop cranking. Let the starter rest."
              : spent
                ? `Stop cranking. It has had its ${inAll} s since it last ran.`
                : ""}
          </p>
          <div className="mt-1 grid grid-cols-2 gap-3">
            <Button size="large" tone="strong" onClick={() => stop(false)}>
              Stopped
            </Button>
            <Button size="large" onClick={() => stop(true)}>
              It runs
            </Button>
          </div>
        </>
      ) : (
        <>
          <p role="status" className="my-1 text-sm">
            {restLeft > 0 ? (
              <>
                Let the starter rest: <span className="dial">{clock(restLeft)}</span>
              </>
            ) : rest !== null ? (
              "Rested. Crank again if it is needed."
            ) : (
              "Tap when you turn the key; tap again when you let go."
            )}
          </p>
          <Button size="large" wide tone={restLeft > 0 ? "plain" : "strong"} onClick={() => setBurst(Date.now())}>
            {restLeft > 0 ? "Cranking all the same" : "Cranking now"}
          </Button>
        </>
      )}
    </section>
  );
}
