import { Cross, Divide, Tick } from "./marks";
import { Arrow, Label, Part, Picture } from "./parts";

/** Rim of the filter head with its groove, cut; 140 wide from x. */
const Rim = ({ x }: { x: number }) => <Part d={`M${x} 100H${x + 50}v20h32v-20H${x + 140}V164H${x}Z`} of="metal" />;

export function LidSeal() {
  return (
    <Picture of="lid-seal" height={234}>
      <Divide to={226} />
      <Tick x={18} y={18} />
      <Label x={34} y={23} bold>
        Seated
      </Label>
      <Rim x={12} />
      <circle cx={78} cy={108} r={13} fill="var(--ink)" />
      <Part d="M12 70H152V98H12Z" />
      <Label x={82} y={90} at="middle">
        Lid
      </Label>
      <Label x={82} y={150} at="middle">
        Head
      </Label>
      <Label x={12} y={190}>
        {"Ring whole in its\ngroove, lid flat"}
      </Label>
      <Cross x={186} y={18} />
      <Label x={202} y={23} bold tone="hurt">
        Pinched
      </Label>
      <Rim x={176} />
      <ellipse cx={266} cy={94} rx={17} ry={6} fill="var(--ink)" transform="rotate(-9 266 93)" />
      <Part d="M176 62L316 40V68L176 96Z" />
      <Arrow along="326 78 286 80 240 92 226 108" tone="hurt" width={3} />
      <Label x={240} y={80} at="middle">
        Lid
      </Label>
      <Label x={296} y={118} at="middle" tone="hurt">
        Air
      </Label>
      <Label x={176} y={190}>
        {"Ring out of its\ngroove, lid tilted"}
      </Label>
    </Picture>
  );
}
