import type { LogEntry } from "@/lib/core/contract/log";

type Props = { entries: readonly LogEntry[]; hoursNow: number | null; systems: readonly { key: string; title: string }[] };

const WIDTH = 960;
const LEFT = 170;
const ROW = 34;

/** Along the hour meter: one lane a system, a dot a fault; dots of one cause that came back are joined. */
export function AlongTheMeter({ entries, hoursNow, systems }: Props) {
  const placed = entries.filter((e) => e.engineHours !== null && e.cause !== null && e.outcome !== null);
  if (placed.length === 0) return <p className="text-sm text-ink-2">Faults with engine hours are drawn here, system by system.</p>;
  const lanes = lanesOf(placed, systems);
  const { from, to, ticks } = scale(placed, hoursNow);
  const x = (h: number) => LEFT + ((h - from) / (to - from)) * (WIDTH - LEFT - 24);
  const height = lanes.length * ROW + 44;
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Faults by system, drawn along the hour meter">
      <svg viewBox={`0 0 ${WIDTH} ${height}`} className="min-w-[60rem]" role="img" aria-label={inWords(lanes)}>
        {ticks.map((t) => (
          <g key={t}>
            <path d={`M${x(t)} 8V${height - 28}`} stroke="var(--rule)" />
            <text x={x(t)} y={height - 8} textAnchor="middle" fontSize={16} className="dial" fill="var(--ink-2)">
              {t}
            </text>
          </g>
        ))}
        {lanes.map((lane, i) => (
          <Lane key={lane.title} lane={lane} y={24 + i * ROW} x={x} to={hoursNow ?? to} from={from} />
        ))}
      </svg>
    </div>
  );
}

type LaneOf = { title: string; faults: readonly LogEntry[] };

function Lane({ lane, y, x, from, to }: { lane: LaneOf; y: number; x: (h: number) => number; from: number; to: number }) {
  return (
    <g>
      <text x={0} y={y + 5} fontSize={16} fill="var(--ink)">
        {lane.title}
      </text>
      <path d={`M${x(from)} ${y}H${x(to)}`} stroke="var(--shoal)" strokeWidth={10} strokeLinecap="round" />
      {runsOf(lane.faults).map(([first, last]) => (
        <path key={`${first}-${last}`} d={`M${x(first)} ${y}H${x(last)}`} stroke="var(--lead)" strokeWidth={1.5} strokeDasharray="2 4" />
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
    </g>
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
  const step = [10, 20, 50, 100, 200, 500, 1000, 2000, 5000].find((s) => span / s <= 6) ?? 10_000;
  const from = Math.floor((Math.min(...all) - step * 0.2) / step) * step;
  const to = Math.ceil((Math.max(...all) + step * 0.2) / step) * step;
  const start = Math.max(0, from);
  return { from: start, to, ticks: Array.from({ length: Math.round((to - start) / step) + 1 }, (_, i) => start + i * step) };
}

const inWords = (lanes: readonly LaneOf[]) =>
  `Faults by system along the hour meter. ${lanes.map((l) => `${l.title}: ${l.faults.map((f) => `${f.cause!.title} at ${Math.round(f.engineHours!)} hours`).join(", ")}`).join(". ")}.`;
