import { Arrow, Box, Label, Part, Picture, Pointer } from "./parts";

export function StopByHand() {
  return (
    <Picture of="stop-by-hand" height={260}>
      <Box x={30} y={94} w={210} h={112} of="metal" />
      <path d="M60 94v-24q0 -16 16 -16h40M92 94v-16q0 -8 8 -8h16M124 94v-10M156 94v-10" strokeWidth={5} />
      <Label x={96} y={190} at="middle">
        Injection pump
      </Label>
      <path d="M204 150L178 62" stroke="var(--edge)" strokeDasharray="5 5" />
      <path d="M204 150L258 84" strokeWidth={14} />
      <path d="M204 150L258 84" stroke="var(--brass)" strokeWidth={9} />
      <circle cx={204} cy={150} r={14} fill="var(--sheet)" />
      <circle cx={204} cy={150} r={4} fill="var(--ink)" />
      {/* A hand on the lever. */}
      <Part d="M244 60q10 -16 26 -10l40 8v44l-30 4q-14 6 -18 -4l12 -18q-6 4 -14 4q-16 -4 -16 -28Z" />
      <path d="M262 62q8 6 6 18M276 60q8 8 4 22" strokeWidth={1.5} />
      <Arrow along="188 44 214 36 240 46" tone="hurt" width={3.5} />
      <Label x={160} y={58} at="middle">
        Run
      </Label>
      <Label x={252} y={40} bold tone="hurt">
        Stop
      </Label>
      <path d="M218 164L320 194" strokeWidth={3} />
      <path d="M262 177L320 194" strokeWidth={8} />
      <Label x={322} y={180} at="end">
        Cable
      </Label>
      <Label x={12} y={24}>
        Stop lever
      </Label>
      <Pointer along="94 20 150 24 232 116" />
      <Label x={164} y={242} at="middle">
        Hold it there until the engine stands
      </Label>
    </Picture>
  );
}
