import { Cross, Tick } from "./marks";
import { Label, Part, Picture } from "./parts";

/** A stick about `x`, wet with oil from its tip up to `oil`; its marks stand at 92 and 152. */
function Stick({ x, oil }: { x: number; oil: number }) {
  return (
    <g>
      <circle cx={x} cy={26} r={14} strokeWidth={5} />
      <Part d={`M${x - 9} 40h18v140l-9 12l-9 -12Z`} />
      <path d={`M${x - 9} ${oil}h18V180l-9 12l-9 -12Z`} fill="var(--ink)" />
      <path d={`M${x - 20} 92h40M${x - 20} 152h40`} stroke="var(--brass)" strokeWidth={4} />
    </g>
  );
}

export function Dipstick() {
  return (
    <Picture of="dipstick" height={276}>
      <Stick x={62} oil={168} />
      <Stick x={164} oil={106} />
      <Stick x={266} oil={62} />
      <Label x={94} y={97}>
        high
      </Label>
      <Label x={96} y={157}>
        low
      </Label>
      <Cross x={62} y={212} />
      <Tick x={164} y={212} />
      <Cross x={266} y={212} />
      <Label x={62} y={242} at="middle" tone="hurt">
        Too low
      </Label>
      <Label x={164} y={242} at="middle">
        {"Between\nthe marks"}
      </Label>
      <Label x={266} y={242} at="middle" tone="hurt">
        {"Over: fuel or\nwater in it?"}
      </Label>
    </Picture>
  );
}
