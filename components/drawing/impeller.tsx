import { Arrow, Box, Hose, Label, METAL, Part, Picture, Pointer } from "./parts";

/** Vanes of the impeller about (84, 104): root and curved tip, trailing behind a clockwise turn. One is torn off. */
const VANES = [100, 160, 220, 280, 340];

export function Impeller() {
  return (
    <Picture of="impeller" height={286}>
      <Hose d="M28 146V226" width={20} />
      <Hose d="M140 150V172Q140 186 154 186H200" width={20} />
      <circle cx={84} cy={104} r={72} fill="var(--sheet)" />
      <circle cx={84} cy={104} r={60} fill="var(--shoal)" />
      <Part d="M38 143Q84 184 130 143Q84 162 38 143Z" of="metal" />
      {VANES.map((turn) => (
        <path key={turn} d="M84 84Q86 66 74 48" transform={`rotate(${turn} 84 104)`} strokeWidth={7} />
      ))}
      <path d="M84 86l-1 -8" transform="rotate(40 84 104)" stroke="var(--lead)" strokeWidth={7} />
      <circle cx={84} cy={104} r={19} fill="var(--sheet)" />
      <circle cx={84} cy={104} r={7} fill={METAL} />
      <path d="M70 104a14 14 0 0 1 22 -11" stroke="var(--fill)" strokeWidth={2.5} />
      <Arrow along="88 91 95 96" />
      <Label x={46} y={216}>
        {"The cam bends\nthe vanes"}
      </Label>
      <Pointer along="84 200 84 158" />
      <Label x={168} y={34} tone="hurt">
        Torn vane
      </Label>
      <Pointer along="164 32 101 82" />
      <Label x={168} y={92}>
        {"Vanes trail\nthe turning"}
      </Label>
      <Pointer along="164 96 128 96" />
      <Arrow along="28 220 28 186" />
      <Box x={200} y={150} w={116} h={72} r={14} />
      <path d="M224 152V220" />
      <path d="M228 162h84m-84 12h84m-84 12h84m-84 12h84m-84 12h84" stroke="var(--edge)" strokeWidth={1.5} />
      <path d="M216 170l4 9M212 188l7 6M217 204l3 8M170 184l9 5" stroke="var(--lead)" strokeWidth={6} />
      <Label x={258} y={142} at="middle">
        First cooler
      </Label>
      <Label x={172} y={252} tone="hurt">
        {"Pieces stop here:\nfind every one"}
      </Label>
      <Pointer along="222 238 218 213" />
    </Picture>
  );
}
