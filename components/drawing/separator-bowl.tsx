import { Arrow, Box, Label, Liquid, METAL, Part, Picture } from "./parts";

const BOWL = "h72v62l-18 26h-36l-18 -26Z";

function Bowl({ x }: { x: number }) {
  return (
    <g>
      <Part d={`M${x} 40${BOWL}`} />
      <Box x={x - 6} y={16} w={84} h={24} of="metal" />
      <path d={`M${x + 30} 128v10h12v-10`} fill={METAL} />
    </g>
  );
}

const DIRT = [72, 80, 84, 90, 76, 88, 96, 82];
const BUBBLES: readonly [number, number, number][] = [
  [262, 112, 4],
  [272, 96, 5],
  [258, 80, 4],
  [282, 72, 6],
  [268, 56, 5],
  [292, 54, 4],
];

export function SeparatorBowl() {
  return (
    <Picture of="separator-bowl" height={204}>
      <Bowl x={20} />
      <Bowl x={128} />
      <Bowl x={236} />
      <Liquid x={21} y={92} w={70} h={11} />
      <Part d="M20 102h72l-18 26h-36Z" of="liquid" />
      <path d="M22 102h68" stroke="var(--shoal)" strokeWidth={3} />
      <Part d="M137 115q12 -8 26 -2t28 1l-9 14h-36Z" of="metal" />
      {DIRT.map((dy, index) => (
        <circle key={dy} cx={138 + index * 7} cy={dy + 22} r={2.5} fill="var(--ink)" stroke="none" />
      ))}
      {BUBBLES.map(([x, y, r]) => (
        <circle key={y} cx={x} cy={y} r={r} stroke="var(--fill)" fill="var(--sheet)" />
      ))}
      <Arrow along="302 92 302 62" />
      <Label x={56} y={72} at="middle">
        Fuel
      </Label>
      <Label x={56} y={120} at="middle">
        Water
      </Label>
      <Label x={56} y={164} at="middle">
        {"Clear layer\nat the bottom"}
      </Label>
      <Label x={166} y={164} at="middle">
        {"Specks\nor slime"}
      </Label>
      <Label x={272} y={164} at="middle">
        {"Air, while\nit runs"}
      </Label>
    </Picture>
  );
}
