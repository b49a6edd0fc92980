import { Arrow, Box, Label, Part, Picture, Pointer } from "./parts";

export function ThrottleStops() {
  return (
    <Picture of="throttle-stops" height={286}>
      <Box x={70} y={136} w={190} h={104} of="metal" />
      <path d="M100 136v-10m28 10v-10m96 10v-10" strokeWidth={6} />
      {/* Stop screws in their lugs. */}
      <Part d="M60 84h18v34h-18Z" />
      <path d="M46 101h46" strokeWidth={7} />
      <Part d="M252 84h18v34h-18Z" />
      <path d="M236 101h48" strokeWidth={7} />
      <circle cx={284} cy={101} r={7} fill="var(--brass)" />
      {/* The lever as the cable brings it, and where it should be. */}
      <path d="M164 186L118 72" stroke="var(--edge)" strokeWidth={2} strokeDasharray="5 5" />
      <path d="M164 186L228 76" stroke="var(--edge)" strokeWidth={2} strokeDasharray="5 5" />
      <path d="M164 186L206 66" strokeWidth={13} />
      <path d="M164 186L206 66" stroke="var(--sheet)" strokeWidth={8} />
      <circle cx={164} cy={186} r={13} fill="var(--sheet)" />
      <circle cx={164} cy={186} r={4} fill="var(--ink)" />
      <path d="M206 66H322" strokeWidth={4} />
      <path d="M262 66H322" strokeWidth={9} />
      <circle cx={206} cy={66} r={5} fill="var(--brass)" />
      <Arrow along="130 48 152 40 188 42" />
      <Label x={12} y={72}>
        Idle stop
      </Label>
      <Label x={326} y={138} at="end">
        Full stop
      </Label>
      <Label x={326} y={50} at="end">
        Cable
      </Label>
      <Label x={12} y={24} tone="hurt">
        At full, daylight here: it falls short
      </Label>
      <Pointer along="226 30 222 96" />
      <Label x={164} y={228} at="middle">
        Injection pump
      </Label>
      <Label x={12} y={270}>
        Only look at the screws
      </Label>
    </Picture>
  );
}
