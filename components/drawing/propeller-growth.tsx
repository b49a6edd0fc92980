import { Cross, Divide, Tick } from "./marks";
import { Label, METAL, Part, Picture } from "./parts";

const BLADES = [0, 120, 240];
const BARNACLES: readonly [number, number][] = [
  [238, 62],
  [250, 76],
  [232, 84],
  [246, 94],
  [284, 138],
  [296, 152],
  [278, 150],
  [208, 138],
  [196, 152],
  [214, 152],
  [248, 118],
  [240, 128],
];

const Propeller = ({ x }: { x: number }) => (
  <g>
    {BLADES.map((turn) => (
      <g key={turn} transform={`rotate(${turn} ${x} 122)`}>
        <Part d={`M${x - 9} 108Q${x - 40} 74 ${x - 18} 46Q${x + 4} 30 ${x + 26} 56Q${x + 34} 82 ${x + 9} 108Z`} of="metal" />
      </g>
    ))}
    <circle cx={x} cy={122} r={17} fill="var(--sheet)" />
    <circle cx={x} cy={122} r={6} fill={METAL} />
  </g>
);

export function PropellerGrowth() {
  return (
    <Picture of="propeller-growth" height={262}>
      <Divide to={254} />
      <Tick x={16} y={16} />
      <Label x={32} y={22} bold>
        Clean
      </Label>
      <Propeller x={82} />
      <Label x={82} y={226} at="middle">
        {"Smooth faces,\nsharp edges"}
      </Label>
      <Cross x={182} y={16} />
      <Label x={198} y={22} bold tone="hurt">
        Grown over
      </Label>
      <Propeller x={246} />
      <path
        d="M270 56q10 12 4 26t6 24M308 150q8 8 6 20t6 16M190 166q-6 10 0 20M232 44q-8 -6 -6 -14"
        stroke="var(--sound)"
        strokeWidth={3}
      />
      {BARNACLES.map(([x, y]) => (
        <g key={`${x} ${y}`}>
          <path d={`M${x - 6} ${y + 5}l3 -9h6l3 9Z`} fill="var(--sheet)" stroke="var(--lead)" />
        </g>
      ))}
      <Label x={246} y={226} at="middle">
        {"A thin layer already\ncosts revs"}
      </Label>
    </Picture>
  );
}
