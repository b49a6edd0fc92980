import { Box, Label, Part } from "./parts";

type Way = "heavy" | "quiet";

/** Battery, switch, starter and the engine as the way back, 328 by 210 under `y`. A heavy leg is filled, a quiet one hollow. */
export function StartLoop({ y, positive, negative }: { y: number; positive: Way; negative: Way }) {
  const cable = (way: Way) => (way === "heavy" ? "var(--fill)" : "var(--sheet)");
  return (
    <g transform={`translate(0 ${y})`}>
      <path d="M30 128V44H72M112 44H212V60" stroke="var(--ink)" strokeWidth={9} strokeLinecap="butt" />
      <path d="M30 128V44H72M112 44H212V60" stroke={cable(positive)} strokeWidth={5} strokeLinecap="butt" />
      <path d="M84 128V112H150V182H250V134" stroke="var(--ink)" strokeWidth={9} strokeLinecap="butt" />
      <path d="M84 128V112H150V182H250V134" stroke={cable(negative)} strokeWidth={5} strokeLinecap="butt" />
      <circle cx={92} cy={44} r={20} fill="var(--sheet)" />
      <path d="M80 50L104 38" strokeWidth={4} />
      <Box x={196} y={58} w={72} h={30} r={8} />
      <Part d="M190 92h92v44h-92q-8 0 -8 -8v-28q0 -8 8 -8Z" of="metal" />
      <Box x={282} y={102} w={14} h={24} />
      <Box x={204} y={50} w={16} h={10} r={2} of="metal" />
      <Part d="M22 134v-10h16v10M76 134v-10h16v10" of="metal" />
      <Box x={10} y={134} w={94} h={60} />
      <path d="M24 152h12m-6 -6v12M78 152h12" strokeWidth={2.5} />
      <Label x={57} y={182} at="middle">
        Battery
      </Label>
      <Label x={236} y={120} at="middle">
        Starter
      </Label>
    </g>
  );
}
