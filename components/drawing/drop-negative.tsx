import { Gauge } from "./marks";
import { Label, Picture, Probe } from "./parts";
import { StartLoop } from "./start-parts";

export function DropNegative() {
  return (
    <Picture of="drop-negative" height={280}>
      <StartLoop y={10} positive="quiet" negative="heavy" />
      <Probe along="148 240 118 240 118 136 94 136" />
      <Probe along="176 240 296 240 296 142 276 142" />
      <Gauge x={162} y={240} r={22} says="V" />
      <Label x={20} y={226}>
        On the −
      </Label>
      <Label x={288} y={228} at="end">
        On bare metal
      </Label>
      <Label x={92} y={92} at="middle">
        Switch
      </Label>
      <Label x={12} y={270}>
        Read as it cranks
      </Label>
    </Picture>
  );
}
