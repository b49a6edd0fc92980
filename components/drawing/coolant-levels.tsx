import { Arrow, Box, Hose, Label, Liquid, Picture, Pointer } from "./parts";

export function CoolantLevels() {
  return (
    <Picture of="coolant-levels" height={264}>
      <Box x={16} y={96} w={168} h={104} r={12} />
      <path d="M28 98H172Q182 98 182 108V188Q182 198 172 198H28Q18 198 18 188V108Q18 98 28 98Z" fill="var(--shoal)" stroke="none" />
      <Box x={70} y={70} w={52} h={42} r={2} />
      <path d="M72 98H120V116H72Z" fill="var(--shoal)" stroke="none" />
      <Liquid x={71} y={82} w={50} h={32} />
      <path d="M64 36h64v14h-64ZM74 50v6h44v-6" fill="var(--sheet)" />
      <Arrow along="140 60 140 36" tone="ink" />
      <Hose d="M122 78H214V70Q214 60 224 60H244V108" of="empty" width={9} />
      <Box x={220} y={96} w={80} h={104} r={8} />
      <Liquid x={222} y={146} w={76} h={52} />
      <path d="M244 96v72" strokeWidth={4} />
      <path d="M282 126h18M282 174h18" strokeWidth={3} />
      <Label x={276} y={131} at="end">
        high
      </Label>
      <Label x={276} y={180} at="end">
        low
      </Label>
      <Label x={100} y={160} at="middle">
        {"Header tank:\nfull to the neck"}
      </Label>
      <Label x={260} y={220} at="middle">
        {"Bottle: between\nthe marks"}
      </Label>
      <Label x={14} y={24} bold tone="hurt">
        Cap off only when it is cold
      </Label>
      <Label x={10} y={240}>
        Look for an oily film
      </Label>
      <Pointer along="20 224 20 120 68 84" />
    </Picture>
  );
}
