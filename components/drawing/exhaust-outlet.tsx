import { Cross, Tick } from "./marks";
import { Arrow, Hose, Label, Liquid, Picture, Pointer } from "./parts";

/** The stern cut, 328 by 110 under `y`, with the pipe through it. */
function Stern({ y }: { y: number }) {
  return (
    <g transform={`translate(0 ${y})`}>
      <Liquid x={172} y={92} w={156} h={26} />
      <path d="M176 0L166 30M158 66L146 118" strokeWidth={7} strokeLinecap="butt" />
      <Hose d="M14 48H172" of="empty" width={36} />
    </g>
  );
}

export function ExhaustOutlet() {
  return (
    <Picture of="exhaust-outlet" height={332}>
      <Tick x={16} y={18} />
      <Label x={32} y={23} bold>
        Free
      </Label>
      <Stern y={36} />
      <path d="M174 66L206 98" strokeWidth={5} stroke="var(--brass)" />
      <circle cx={174} cy={66} r={3.5} fill="var(--ink)" />
      <Arrow along="30 84 130 84" />
      <Arrow along="184 98 200 120" />
      <Label x={196} y={74}>
        The flap swings
      </Label>
      <Label x={40} y={60}>
        Pipe
      </Label>
      <Cross x={16} y={184} />
      <Label x={32} y={189} bold tone="hurt">
        Blocked
      </Label>
      <Stern y={202} />
      <path
        d="M96 234q10 12 22 2q8 12 20 4q12 8 34 -4v-4H96ZM88 266q14 -14 26 -4q12 -12 24 0q14 -8 34 0v3H88Z"
        fill="var(--lead-wash)"
        stroke="var(--lead)"
      />
      <path d="M177 230V270" strokeWidth={5} stroke="var(--brass)" />
      <circle cx={177} cy={230} r={3.5} fill="var(--ink)" />
      <Arrow along="20 250 76 250" tone="ink" />
      <Label x={196} y={240}>
        {"The flap is\nstuck shut"}
      </Label>
      <Label x={10} y={306} tone="hurt">
        Growth
      </Label>
      <Pointer along="50 292 104 262" />
    </Picture>
  );
}
