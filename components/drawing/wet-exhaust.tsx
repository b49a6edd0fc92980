import { Cross, Tick } from "./marks";
import { Arrow, Box, Hose, Label, Liquid, Picture } from "./parts";

/** Engine, elbow, silencer and riser, 328 by 140 under `y`. */
function Exhaust({ y, flooded }: { y: number; flooded: boolean }) {
  return (
    <g transform={`translate(0 ${y})`}>
      <Hose d="M84 50H120Q136 50 136 66V104" of={flooded ? "liquid" : "gas"} width={16} />
      <Box x={112} y={88} w={104} h={50} r={8} />
      <Liquid x={114} y={flooded ? 92 : 124} w={100} h={flooded ? 44 : 12} />
      <Hose d="M136 88V100" of={flooded ? "liquid" : "gas"} width={16} />
      <Hose d="M196 130V52Q196 38 210 38H274Q288 38 288 52V90Q288 104 302 104H326" of={flooded ? "empty" : "liquid"} width={16} />
      {flooded && <Hose d="M196 130V78" width={16} />}
      <path d="M316 8L308 138" strokeWidth={4} />
      <Box x={8} y={26} w={76} h={96} of="metal" />
      <Box x={22} y={40} w={48} h={60} r={2} />
      {flooded && <Liquid x={23} y={72} w={46} h={6} />}
      <path d="M24 78h44v18h-44Z" fill="var(--edge)" />
    </g>
  );
}

export function WetExhaust() {
  return (
    <Picture of="wet-exhaust" height={386}>
      <Tick x={16} y={18} />
      <Label x={32} y={22} bold>
        Running: gas blows the water out
      </Label>
      <Exhaust y={34} flooded={false} />
      <Hose d="M132 60V84" width={9} />
      <Arrow along="132 58 132 80" />
      <Label x={146} y={64}>
        Water
      </Label>
      <Arrow along="92 84 114 84" tone="ink" />
      <Arrow along="196 148 196 110" />
      <Arrow along="232 72 268 72" />
      <Arrow along="304 138 326 138" />
      <Label x={222} y={166}>
        Silencer
      </Label>
      <Cross x={16} y={206} />
      <Label x={32} y={212} bold tone="hurt">
        Cranking: no gas to lift it
      </Label>
      <Exhaust y={226} flooded />
      <Hose d="M132 252V276" width={9} />
      <Arrow along="132 244 132 266" />
      <Arrow along="136 336 136 290 124 276 78 276" tone="hurt" width={3} />
      <Label x={222} y={356}>
        {"Fills, then\nruns back"}
      </Label>
    </Picture>
  );
}
