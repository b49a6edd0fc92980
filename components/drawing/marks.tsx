/** A numbered place in brass: where you are, and in which order. */
export function Spot({ x, y, n }: { x: number; y: number; n: number | string }) {
  return (
    <g>
      <circle cx={x} cy={y} r={12} fill="var(--plate)" stroke="var(--brass)" strokeWidth={2.5} />
      <text x={x} y={y + 5.5} textAnchor="middle" fontWeight={700} fill="var(--on-plate)" stroke="none">
        {n}
      </text>
    </g>
  );
}

/** A gauge or meter with its needle, ringed in brass; `says` is a letter on its face. */
export function Gauge({ x, y, r = 17, says }: { x: number; y: number; r?: number; says?: string }) {
  return (
    <g>
      <circle cx={x} cy={y} r={r} fill="var(--sheet)" strokeWidth={2} />
      <circle cx={x} cy={y} r={r - 3} stroke="var(--brass)" strokeWidth={3} />
      {says ? (
        <text x={x} y={y + 5.5} textAnchor="middle" fontWeight={700} fill="var(--ink)" stroke="none">
          {says}
        </text>
      ) : (
        <path d={`M${x} ${y + 3}L${x - r * 0.35} ${y - r * 0.4}`} strokeWidth={2.5} />
      )}
    </g>
  );
}

/** Right. */
export function Tick({ x, y }: { x: number; y: number }) {
  return <path d={`M${x - 7} ${y}l5 6l9 -12`} stroke="var(--sound)" strokeWidth={3.5} />;
}

/** Wrong. */
export function Cross({ x, y }: { x: number; y: number }) {
  return <path d={`M${x - 6} ${y - 6}l12 12M${x + 6} ${y - 6}l-12 12`} stroke="var(--lead)" strokeWidth={3.5} />;
}

/** The line between two views that stand side by side. */
export function Divide({ x = 164, from = 6, to }: { x?: number; from?: number; to: number }) {
  return <path d={`M${x} ${from}V${to}`} stroke="var(--rule)" strokeWidth={1.5} strokeDasharray="2 6" />;
}
