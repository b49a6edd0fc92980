import { Chip } from "@/components/ui/chip";
import type { LogEntry } from "@/lib/core/contract/log";

const hours = (h: number) => `${Math.round(h).toLocaleString("en-GB")} h`;

/** How a logged cure stands: it held so long, it came back, it was only held, or it is still open. */
export function Standing({ entry }: { entry: LogEntry }) {
  return (
    <span className="whitespace-nowrap">
      <StandingChip entry={entry} />
    </span>
  );
}

function StandingChip({ entry }: { entry: LogEntry }) {
  if (entry.outcome === null) return <Chip tone="buoy">Open</Chip>;
  if (entry.outcome === "handed-over") return <Chip tone="quiet">Handed over</Chip>;
  if (entry.outcome === "broken-off") return <Chip tone="quiet">Broken off</Chip>;
  if (entry.outcome === "by-itself") return <Chip tone="quiet">Ran again by itself</Chip>;
  if (entry.cameBackAfterHours !== null) return <Chip tone="buoy">Came back at {hours(entry.cameBackAfterHours)}</Chip>;
  const held = entry.heldHours === null ? "" : ` ${hours(entry.heldHours)}`;
  if (entry.outcome === "held") return <Chip tone="buoy">Held for now{held}</Chip>;
  return <Chip tone="sound">{`Held${held}`}</Chip>;
}
