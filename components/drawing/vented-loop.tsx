import { Arrow, Box, Hose, Label, Liquid, Picture, Pointer } from "./parts";

export function VentedLoop() {
  return (
    <Picture of="vented-loop" height={304}>
      <Liquid x={0} y={190} w={24} h={100} />
      <path d="M34 70L26 190V288H320" strokeWidth={4} />
      <path d="M30 188H320" stroke="var(--fill)" strokeDasharray="6 6" />
      <Hose d="M206 220H170Q152 220 152 238V284" of="gas" width={16} />
      <Hose d="M96 262V92Q96 64 124 64T152 92V218" />
      <Box x={206} y={196} w={112} h={62} of="metal" />
      <Label x={262} y={232} at="middle">
        Engine
      </Label>
      <Box x={114} y={38} w={20} h={24} />
      <path d="M118 46h12m-6 0v10" />
      <Arrow along="124 8 124 34" tone="ink" />
      <Label x={136} y={22}>
        Air in, when it stops
      </Label>
      <Label x={150} y={56}>
        Valve at the top
      </Label>
      <Arrow along="96 232 96 206" />
      <Arrow along="96 160 96 120" />
      <Arrow along="152 110 152 150" />
      <Label x={78} y={134} at="end">
        From
      </Label>
      <Label x={82} y={153} at="end">
        cooler
      </Label>
      <Label x={316} y={180} at="end">
        Waterline
      </Label>
      <Label x={172} y={102} tone="hurt">
        {"Stuck valve: the sea\nsiphons over"}
      </Label>
      <Arrow along="152 176 152 216 204 220" tone="hurt" width={3} />
      <Label x={206} y={280}>
        Elbow
      </Label>
      <Pointer along="202 274 158 230" />
    </Picture>
  );
}
