import { Arrow, Box, Hose, Label, Liquid, Part, Picture } from "./parts";

export function RawWaterPath() {
  return (
    <Picture of="raw-water-path" height={372}>
      <path d="M0 326H286Q310 326 312 300L317 236H328V372H0Z" fill="var(--shoal)" stroke="none" />
      <path d="M0 236H328" stroke="var(--fill)" strokeWidth={1.5} strokeDasharray="6 6" />
      <path d="M0 326H286Q310 326 312 300L322 96" strokeWidth={4} />
      <Hose d="M36 326V150Q36 132 54 132H104" />
      <Hose d="M198 132Q208 132 208 122V64Q208 46 224 46T240 64V184" />
      <Hose d="M206 178H232Q240 178 240 186V244" of="gas" />
      <Hose d="M240 184V244" />
      <Hose d="M266 280V222Q266 210 280 210H318" />
      <Part d="M24 326v-22h24v22" of="metal" />
      <path d="M48 314h16" strokeWidth={5} />
      <Box x={14} y={222} w={44} h={48} />
      <path d="M22 234h28v26h-28Z" stroke="var(--edge)" strokeDasharray="3 4" />
      <circle cx={62} cy={132} r={22} fill="var(--sheet)" />
      <path d="M62 132l16 -6m-16 6l3 17m-3 -17l-14 10m14 -10l-12 -12m12 12l7 -16" />
      <Box x={104} y={112} w={94} h={40} r={18} />
      <path d="M118 124h66m-66 8h66m-66 8h66" stroke="var(--edge)" strokeWidth={1.5} />
      <Box x={112} y={154} w={94} h={76} of="metal" />
      <Box x={204} y={244} w={80} h={54} r={10} />
      <Liquid x={206} y={282} w={76} h={14} />
      <path d="M216 28h16v14h-16Z" fill="var(--sheet)" />
      <Label x={72} y={319}>
        1 Seacock
      </Label>
      <Label x={66} y={251}>
        2 Strainer
      </Label>
      <Label x={50} y={100}>
        3 Pump
      </Label>
      <Label x={150} y={86} at="middle">
        {"4 Heat\nexchanger"}
      </Label>
      <Label x={196} y={36} at="end">
        5 Vented loop
      </Label>
      <Label x={252} y={150}>
        6 Elbow
      </Label>
      <Label x={196} y={282} at="end">
        7 Silencer
      </Label>
      <Label x={306} y={194} at="end">
        8 Outlet
      </Label>
      <Label x={159} y={198} at="middle">
        Engine
      </Label>
      <Arrow along="36 298 36 276" />
      <Arrow along="36 212 36 180" />
      <Arrow along="86 132 102 132" />
      <Arrow along="208 112 208 84" />
      <Arrow along="240 84 240 112" />
      <Arrow along="240 208 240 232" />
      <Arrow along="266 270 266 240" />
      <Arrow along="304 210 326 210" />
    </Picture>
  );
}
