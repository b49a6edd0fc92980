import type { Engine } from "@/lib/core/contract/engine";

/** Engine hours as a figure off an instrument; estimated ones say so. */
export function Hours({ engine }: { engine: Pick<Engine, "hours" | "hoursAreEstimated"> }) {
  if (engine.hours === null) return <span className="text-ink-2">hours not known yet</span>;
  return (
    <span className="whitespace-nowrap">
      {engine.hoursAreEstimated && "about "}
      <span className="dial">{Math.round(engine.hours)}</span> h{engine.hoursAreEstimated && ", estimated"}
    </span>
  );
}
