import { Gauge } from "./marks";
import { Arrow, Box, Label, Part, Picture, Probe } from "./parts";

const PLUGS = [128, 180, 232, 284];

export function GlowBusBar() {
  return (
    <Picture of="glow-bus-bar" height={286}>
      <path d="M10 112H112" strokeWidth={8} />
      <path d="M10 112H112" stroke="var(--fill)" strokeWidth={4} />
      <Box x={100} y={170} w={224} h={46} of="metal" />
      {PLUGS.map((x) => (
        <g key={x}>
          <path d={`M${x} 208v40`} stroke="var(--lead)" strokeWidth={6} />
          <Part d={`M${x - 8} 150h16v12h5v14h-5v34h-16v-34h-5v-14h5Z`} />
          <path d={`M${x} 150V120`} strokeWidth={5} />
        </g>
      ))}
      <Box x={108} y={106} w={196} h={12} r={2} />
      <path d="M108 108h196v8h-196Z" fill="var(--brass)" stroke="none" />
      <Label x={210} y={98} at="middle" bold>
        Bus bar
      </Label>
      {/* Clamp round the feed. */}
      <ellipse cx={52} cy={112} rx={10} ry={18} strokeWidth={5} />
      <ellipse cx={52} cy={112} rx={10} ry={18} stroke="var(--brass)" strokeWidth={2} />
      <path d="M52 130V150" strokeWidth={5} />
      <Gauge x={52} y={170} r={20} says="A" />
      <Label x={8} y={212}>
        {"Clamp:\nall plugs\ntogether"}
      </Label>
      <Arrow along="72 96 96 96" />
      <Label x={8} y={84}>
        Feed
      </Label>
      <Probe along="66 36 24 36" />
      <Probe along="110 36 294 36 294 104" />
      <Gauge x={88} y={36} r={22} says="V" />
      <Label x={8} y={22}>
        {"To +"}
      </Label>
      <Label x={122} y={24}>
        Volts lost on the way
      </Label>
      <Label x={212} y={274} at="middle">
        Tips glow in the cylinders
      </Label>
    </Picture>
  );
}
