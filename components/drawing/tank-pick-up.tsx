import { Arrow, Box, Hose, Label, Liquid, Part, Picture, Pointer } from "./parts";

export function TankPickUp() {
  return (
    <Picture of="tank-pick-up" height={272}>
      <Box x={20} y={70} w={288} h={160} r={10} />
      <Liquid x={22} y={110} w={284} h={116} />
      <Part d="M22 202q40 -8 80 0t80 -2t60 3t64 -2v20q0 7 -8 7h-268q-8 0 -8 -7Z" of="metal" />
      <Hose d="M70 20V196" />
      <Hose d="M206 36V120" />
      <Part d="M58 186h24v16h-24Z" of="metal" />
      <path d="M58 192h24m-24 5h24m-18 -11v16m6 -16v16m6 -16v16" strokeWidth={1.5} />
      <Arrow along="70 168 70 96" />
      <Arrow along="206 60 206 132" />
      <Hose d="M262 70V50Q262 40 272 40H296" of="empty" width={8} />
      <Arrow along="326 40 304 40" tone="ink" />
      <Label x={84} y={34}>
        To the filter
      </Label>
      <Label x={196} y={60} at="end">
        Return
      </Label>
      <Label x={296} y={28} at="middle">
        Vent
      </Label>
      <Label x={100} y={154} tone="hurt">
        {"Dirt closes\nits end"}
      </Label>
      <Pointer along="98 166 84 190" />
      <Label x={164} y={222} at="middle">
        Water and dirt
      </Label>
      <Label x={164} y={258} at="middle">
        The tube ends above the bottom
      </Label>
    </Picture>
  );
}
