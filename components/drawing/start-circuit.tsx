import { Arrow, Box, Label, Picture } from "./parts";
import { StartLoop } from "./start-parts";

const COMMAND = [
  { x: 44, says: "Fuse" },
  { x: 118, says: "Key" },
  { x: 202, says: "Neutral" },
  { x: 284, says: "Relay" },
];

export function StartCircuit() {
  return (
    <Picture of="start-circuit" height={320}>
      <path d="M30 140V56H284V166H268" stroke="var(--fill)" strokeWidth={2} />
      {COMMAND.map(({ x, says }) => (
        <g key={says}>
          <Box x={x - 20} y={40} w={40} h={32} />
          <Label x={x} y={28} at="middle">
            {says}
          </Label>
        </g>
      ))}
      <path d="M34 56h20" />
      <circle cx={118} cy={52} r={5} />
      <path d="M118 57v10m0 -3h5" />
      <path d="M190 60h8l10 -8M208 60h6" />
      <path d="M272 64h24M276 60v-10h16v10" />
      <StartLoop y={92} positive="heavy" negative="heavy" />
      <Label x={92} y={184} at="middle">
        Switch
      </Label>
      <Label x={232} y={170} at="middle">
        Solenoid
      </Label>
      <Label x={164} y={306} at="middle">
        The engine is the way back
      </Label>
      <Arrow along="140 122 184 122" />
      <Arrow along="230 286 180 286" />
      <Label x={96} y={94}>
        Thin wires command it
      </Label>
    </Picture>
  );
}
