import { Cross, Divide, Tick } from "./marks";
import { Arrow, Label, Part, Picture, Pointer } from "./parts";

/** An elbow cut open, 140 wide from `x`: gas from the left, water from above, out at the bottom. */
function Elbow({ x }: { x: number }) {
  return (
    <g transform={`translate(${x} 0)`}>
      <Part d="M0 70H62V44H78V70Q136 72 136 130V216H124V130Q124 84 76 84H0Z" of="metal" />
      <Part d="M0 138H44Q60 138 60 154V216H48V160Q48 152 40 152H0Z" of="metal" />
    </g>
  );
}

export function ElbowSection() {
  return (
    <Picture of="elbow-section" height={282}>
      <Divide to={270} />
      <Tick x={16} y={18} />
      <Label x={32} y={23} bold>
        Clean
      </Label>
      <Elbow x={8} />
      <Arrow along="78 28 78 100 92 128" />
      <Arrow along="14 120 54 120" tone="ink" />
      <Arrow along="92 150 92 214" />
      <Label x={94} y={44}>
        Water
      </Label>
      <Label x={10} y={104}>
        Gas
      </Label>
      <Label x={82} y={252} at="middle">
        The bore is open
      </Label>
      <Cross x={182} y={18} />
      <Label x={198} y={23} bold tone="hurt">
        Choked
      </Label>
      <Elbow x={176} />
      <path
        d="M196 84H252Q300 86 300 134V196Q290 188 292 168Q276 166 282 142Q268 140 268 118Q250 122 240 106Q222 108 214 94Z"
        fill="var(--lead-wash)"
        stroke="var(--lead)"
      />
      <path d="M236 160Q248 158 248 172Q256 188 236 204Z" fill="var(--lead-wash)" stroke="var(--lead)" />
      <path d="M262 96l6 8m10 4l4 9m6 6l2 10m-48 -30l8 2" stroke="var(--lead)" strokeWidth={1.5} />
      <Arrow along="246 28 246 78" />
      <Arrow along="182 118 222 118" tone="ink" />
      <Arrow along="262 150 264 186" tone="ink" width={1.5} />
      <Label x={246} y={252} at="middle">
        {"Carbon and scale\nwhere they meet"}
      </Label>
      <Pointer along="268 238 290 178" />
    </Picture>
  );
}
