import { Cross, Divide, Tick } from "./marks";
import { Arrow, Label, METAL, Part, Picture } from "./parts";

/** A lift pump beside the engine's cam; `high`: the cam's high side holds the arm in. 150 wide from `x`. */
function PumpOnCam({ x, high }: { x: number; high: boolean }) {
  return (
    <g transform={`translate(${x} 0)`}>
      <circle cx={high ? 42 : 26} cy={86} r={28} fill={METAL} />
      <circle cx={34} cy={86} r={6} fill="var(--sheet)" />
      <Part d="M84 52h54v70h-54Z" />
      <path d="M84 88h54" stroke="var(--edge)" strokeDasharray="4 4" />
      <path d={high ? "M70 84L112 66" : "M54 86L112 66"} strokeWidth={8} />
      <path d={high ? "M70 84L112 66" : "M54 86L112 66"} stroke="var(--sheet)" strokeWidth={4} />
      <path d={high ? "M120 116L146 124" : "M120 116L140 148"} strokeWidth={7} />
      <path d="M104 52V36M122 52V36" strokeWidth={8} />
      <path d="M104 52V34M122 52V34" stroke="var(--shoal)" strokeWidth={4} />
    </g>
  );
}

export function PrimerLever() {
  return (
    <Picture of="primer-lever" height={244}>
      <Divide to={236} />
      <Tick x={16} y={16} />
      <Label x={32} y={22} bold>
        Cam low
      </Label>
      <PumpOnCam x={6} high={false} />
      <Arrow along="156 120 154 140 148 156" />
      <Label x={34} y={140} at="middle">
        Cam
      </Label>
      <Label x={10} y={190}>
        {"The lever has\nits full stroke"}
      </Label>
      <Cross x={184} y={16} />
      <Label x={200} y={22} bold tone="hurt">
        Cam high
      </Label>
      <PumpOnCam x={172} high />
      <Label x={200} y={140} at="middle">
        Cam
      </Label>
      <Label x={174} y={190}>
        {"No stroke: turn\nthe engine half\nto one turn"}
      </Label>
    </Picture>
  );
}
