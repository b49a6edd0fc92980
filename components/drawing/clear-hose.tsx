import { Separator } from "./fuel-parts";
import { Arrow, Box, Hose, Label, Picture, Pointer } from "./parts";

const BUBBLES: readonly [number, number, number][] = [
  [112, 66, 4],
  [128, 60, 6],
  [146, 68, 4],
  [166, 61, 5],
  [184, 67, 4],
  [202, 60, 6],
];

export function ClearHose() {
  return (
    <Picture of="clear-hose" height={196}>
      <Hose d="M0 62H30" />
      <Hose d="M68 64H256" of="empty" width={30} />
      <g transform="translate(2 44) scale(1.5)" strokeWidth={1.35}>
        <Separator x={0} y={0} />
      </g>
      <circle cx={282} cy={64} r={30} fill="var(--sheet)" />
      <path d="M258 64q12 -12 24 0t24 0" />
      <Box x={84} y={46} w={8} h={36} r={2} of="metal" />
      <Box x={236} y={46} w={8} h={36} r={2} of="metal" />
      {BUBBLES.map(([x, y, r]) => (
        <circle key={x} cx={x} cy={y} r={r} stroke="var(--fill)" />
      ))}
      <Arrow along="112 98 220 98" />
      <Label x={164} y={34} at="middle" bold>
        Clear hose
      </Label>
      <Label x={282} y={116} at="middle">
        Lift pump
      </Label>
      <Label x={40} y={152} at="middle">
        Primary
      </Label>
      <Label x={112} y={152} tone="hurt">
        {"Bubbles: air gets in\nbetween here and the tank"}
      </Label>
      <Pointer along="156 138 156 120 147 70" />
    </Picture>
  );
}
