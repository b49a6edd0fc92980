import { Cross, Divide, Tick } from "./marks";
import { Arrow, Label, METAL, Part, Picture, Pointer } from "./parts";

/** Rocker, lever and valve, 150 wide from `x`; `lifted`: the lever holds the valve off its seat. */
function ValveGear({ x, lifted }: { x: number; lifted: boolean }) {
  const down = lifted ? 16 : 0;
  return (
    <g transform={`translate(${x} 0)`}>
      <Part d="M20 168H72L84 186H20ZM140 168H112L100 186H140Z" of="metal" />
      <path d={`M92 ${96 + down}V${170 + down}`} strokeWidth={6} />
      <Part d={`M72 ${168 + down}h40l-12 16h-16Z`} of="metal" />
      <path d={`M84 ${108 + down}l16 8l-16 8l16 8l-16 8l16 8`} stroke="var(--edge)" />
      <Part d={lifted ? "M18 92L98 98Q108 100 106 108L100 112L18 108Z" : "M18 92L98 82Q108 82 106 92L100 96L18 108Z"} />
      <circle cx={48} cy={100} r={6} fill={METAL} />
      <g transform={lifted ? "rotate(180 92 62)" : undefined}>
        <path d="M92 62H140" strokeWidth={7} />
        <path d="M76 72A20 20 0 0 1 74 54Q78 30 92 30T110 54A20 20 0 0 1 108 72Z" fill={METAL} />
        <circle cx={92} cy={62} r={4} fill="var(--sheet)" />
      </g>
    </g>
  );
}

export function Decompressor() {
  return (
    <Picture of="decompressor" height={256}>
      <Divide to={248} />
      <Tick x={16} y={16} />
      <Label x={32} y={22} bold>
        Run
      </Label>
      <ValveGear x={4} lifted={false} />
      <Label x={8} y={64}>
        Play
      </Label>
      <Pointer along="44 62 92 77" />
      <Label x={10} y={222}>
        {"A little play here,\nand the valve shuts"}
      </Label>
      <Cross x={182} y={16} />
      <Label x={198} y={22} bold tone="hurt">
        Lifted
      </Label>
      <ValveGear x={172} lifted />
      <Arrow along="222 188 222 206" tone="hurt" />
      <Label x={176} y={222}>
        {"Valve held open:\nno compression"}
      </Label>
    </Picture>
  );
}
