import type { LogEntry } from "@/lib/core/contract/log";

type Props = { entries: readonly LogEntry[]; hoursNow: number | null; systems: readonly { key: string; title: string }[] };

const LANE = 34;

/** Along the hour meter: one lane a system, a dot a fault; dots of one cause that came back are joined. As wide as there is room. */
export function AlongTheMeter({ entries, hoursNow, systems }: Props) {
  const placed = entries.filter((e) => e.engineHours !== null && e.cause !== null && e.outcome !== null);
  if (placed.length === 0) return <p className="text-sm text-ink-2">Faults with engine hours are drawn here, system by system.</p>;
  const lanes = lanesOf(placed, systems);
  const { from, to, ticks } = scale(placed, hoursNow);
  // In shares of the width, with room at both ends for half a figure.
  const x = (h: number) => `${6 + ((h - from) / (to - from)) * 88}%`;
  const row = "sm:grid sm:grid-cols-[10rem_minmax(0,1fr)] sm:items-center sm:gap-3";
  return (
    <div role="img" aria-label={inWords(lanes)}>
      {lanes.map((lane) => (
        <div key={lane.title} className={`${row} mb-2 sm:mb-0`}>
          <span className="block text-sm">{lane.title}</span>
          <svg width="100%" height={LANE} aria-hidden>
            {ticks.map((t) => (
              <line key={t} x1={x(t)} x2={x(t)} y1={0} y2={LANE} stroke="var(--rule)" />
            ))}
            <Lane lane={lane} x={x} from={from} to={hoursNow ?? to} />
          </svg>
        </div>
      ))}
      <div className={row}>
        <span />
        <svg width="100%" height={24} aria-hidden>
          {ticks.map((t) => (
            <text key={t} x={x(t)} y={18} textAnchor="middle" fontSize={16} className="dial" fill="var(--ink-2)">
              {t}
            </text>
          ))}
        </svg>
      </div>
    </div>
  );
}

type LaneOf = { title: string; faults: readonly LogEntry[] };

function Lane({ lane, x, from, to }: { lane: LaneOf; x: (h: number) => string; from: number; to: number }) {
  const y = LANE / 2;
  return (
    <>
      <line x1={x(from)} x2={x(to)} y1={y} y2={y} stroke="var(--shoal)" strokeWidth={10} strokeLinecap="round" />
      {runsOf(lane.faults).map(([first, last]) => (
        <line
          key={`${first}-${last}`}
          x1={x(first)}
          x2={x(last)}
          y1={y}
          y2={y}
          stroke="var(--lead)"
          strokeWidth={1.5}
          strokeDasharray="2 4"
        />
      ))}
      {lane.faults.map((e) => (
        <circle
          key={e.id}
          cx={x(e.engineHours!)}
          cy={y}
          r={6.5}
          fill={e.timesHere > 1 || e.cameBackAfterHours !== null ? "var(--lead)" : "var(--fill)"}
          stroke="var(--sheet)"
        >
          <title>{`${e.cause!.title} at ${Math.round(e.engineHours!)} h`}</title>
        </circle>
      ))}
    </>
  );
}

function lanesOf(entries: readonly LogEntry[], systems: Props["systems"]): LaneOf[] {
  const bySystem = new Map<string, LogEntry[]>();
  for (const e of entries) {
    const key = e.cause?.system ?? "";
    bySystem.set(key, [...(bySystem.get(key) ?? []), e]);
  }
  const ordered = systems.filter((s) => bySystem.has(s.key)).map((s) => ({ title: s.title, faults: bySystem.get(s.key)! }));
  const known = new Set(systems.map((s) => s.key));
  const rest = [...bySystem].filter(([key]) => !known.has(key)).flatMap(([, faults]) => faults);
  return rest.length > 0 ? [...ordered, { title: "Other", faults: rest }] : ordered;
}

/** From the first to the last of each cause that came back. */
function runsOf(faults: readonly LogEntry[]): [number, number][] {
  const byCause = new Map<string, number[]>();
  for (const e of faults) {
    const key = e.cause!.key ?? e.cause!.title.toLowerCase();
    byCause.set(key, [...(byCause.get(key) ?? []), e.engineHours!]);
  }
  return [...byCause.values()].filter((h) => h.length > 1).map((h) => [Math.min(...h), Math.max(...h)]);
}

function scale(entries: readonly LogEntry[], hoursNow: number | null): { from: number; to: number; ticks: number[] } {
  const all = [...entries.map((e) => e.engineHours!), ...(hoursNow === null ? [] : [hoursNow])];
  const span = Math.max(...all) - Math.min(...all) || 50;
  const step = [10, 20, 50, 100, 200, 500, 1000, 2000, 5000].find((s) => span / s <= 5) ?? 10_000;
  const from = Math.floor((Math.min(...all) - step * 0.2) / step) * step;
  const to = Math.ceil((Math.max(...all) + step * 0.2) / step) * step;
  const start = Math.max(0, from);
  return { from: start, to, ticks: Array.from({ length: Math.round((to - start) / step) + 1 }, (_, i) => start + i * step) };
}

const inWords = (lanes: readonly LaneOf[]) =>
  `Faults by system along the hour meter. ${lanes.map((l) => `${l.title}: ${l.faults.map((f) => `${f.cause!.title} at ${Math.round(f.engineHours!)} hours`).join(", ")}`).join(". ")}.`;
