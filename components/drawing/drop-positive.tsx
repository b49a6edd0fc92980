import { Gauge } from "./marks";
import { Label, Picture, Probe } from "./parts";
import { StartLoop } from "./start-parts";

export function DropPositive() {
  return (
    <Picture of="drop-positive" height={268}>
      <StartLoop y={60} positive="heavy" negative="quiet" />
      <Probe along="112 34 14 34 14 184 24 184" />
      <Probe along="140 34 212 34 212 104" />
      <Gauge x={126} y={34} r={22} says="V" />
      <Label x={226} y={40}>
        On the stud
      </Label>
      <Label x={22} y={22}>
        On the +
      </Label>
      <Label x={92} y={152} at="middle">
        Switch
      </Label>
      <Label x={318} y={262} at="end">
        Read while it cranks
      </Label>
    </Picture>
  );
}
