import { Arrow, Label, METAL, Part, Picture, Pointer } from "./parts";

export function BeltDeflection() {
  return (
    <Picture of="belt-deflection" height={240}>
      <circle cx={66} cy={130} r={52} fill="var(--sheet)" />
      <circle cx={278} cy={114} r={36} fill="var(--sheet)" />
      <circle cx={66} cy={130} r={7} fill={METAL} />
      <circle cx={278} cy={114} r={7} fill={METAL} />
      <path d="M66 78Q14 80 14 130T66 182L278 150Q314 148 314 114T278 78" strokeWidth={9} strokeLinecap="butt" />
      <path d="M66 78L164 106L278 78" strokeWidth={9} />
      <path d="M66 78Q14 80 14 130T66 182L278 150Q314 148 314 114T278 78L164 106L66 78" stroke="var(--edge)" strokeWidth={4} />
      <path d="M50 71H296" stroke="var(--brass)" strokeWidth={5} />
      <path d="M50 68.5H296V73.5H50Z" strokeWidth={1} />
      <Part d="M153 92V42q0 -11 11 -11t11 11v50q0 9 -11 9t-11 -9Z" />
      <path d="M159 84q5 -5 10 0v10h-10Z" strokeWidth={1.5} />
      <Arrow along="164 12 164 28" tone="ink" width={3} />
      <Label x={176} y={22}>
        Thumb, firmly
      </Label>
      <Label x={12} y={52}>
        Straight edge
      </Label>
      <path d="M190 77V96m-4 -4l4 5l4 -5m-8 -10l4 -5l4 5" strokeWidth={1.5} />
      <Pointer along="196 126 191 88" />
      <Label x={148} y={140} bold>
        10 to 13 mm
      </Label>
      <Label x={164} y={208} at="middle">
        {"on a span of 300 mm;\nin the middle of the longest span"}
      </Label>
    </Picture>
  );
}
