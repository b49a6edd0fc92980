import { Cross } from "./marks";
import { Arrow, Box, Label, Part, Picture, Pointer } from "./parts";

export function RunawayAir() {
  return (
    <Picture of="runaway-air" height={288}>
      <Box x={8} y={104} w={116} h={132} of="metal" />
      <Label x={66} y={176} at="middle">
        Engine
      </Label>
      <Part d="M124 128H176V100H192V200H176V172H124Z" />
      <Arrow along="180 150 136 150" tone="ink" />
      {/* The plate, coming from above, and where it ends. */}
      <path d="M200 92V208" stroke="var(--edge)" strokeWidth={2} strokeDasharray="5 5" />
      <Box x={197} y={44} w={12} h={118} r={2} />
      <path d="M199 46h8v114h-8Z" fill="var(--brass)" stroke="none" />
      <Part d="M209 52h34q8 0 8 8v6q0 8 -8 8h-34Z" />
      <Arrow along="224 92 224 132" width={3.5} />
      <Label x={12} y={24} bold>
        A flat, stiff plate, from the side
      </Label>
      <Label x={236} y={116}>
        {"larger than\nthe opening"}
      </Label>
      <Label x={12} y={62}>
        {"Air intake,\nfilter off"}
      </Label>
      <Pointer along="96 72 182 112" />
      <Arrow along="320 180 284 180" tone="ink" />
      <Arrow along="320 198 284 198" tone="ink" />
      <Label x={218} y={176}>
        Suction
      </Label>
      <Label x={218} y={195}>
        holds it
      </Label>
      <Cross x={152} y={240} />
      <Label x={168} y={246} bold tone="hurt">
        Never a hand
      </Label>
      <Cross x={152} y={266} />
      <Label x={168} y={272} bold tone="hurt">
        Never cloth
      </Label>
    </Picture>
  );
}
