import { Box, Label, Picture } from "./parts";

/** The bands of the shipped tree's check of the rested battery; from the top. */
const BANDS = [
  { says: "Full, or nearly", charge: 1, from: ["12.5", "25.0"] },
  { says: "Half to three quarters", charge: 0.66, from: ["12.2", "24.4"] },
  { says: "Under half", charge: 0.28, from: ["11.0", "22.0"] },
  { says: "Flat, or a cell dead", charge: 0.06, from: null },
];
const ROW = 46;

export function BatteryScale() {
  return (
    <Picture of="battery-scale" height={252}>
      <Label x={28} y={22} at="middle" bold>
        12 V
      </Label>
      <Label x={80} y={22} at="middle" bold>
        24 V
      </Label>
      {BANDS.map(({ says, charge, from }, index) => {
        const top = 34 + index * ROW;
        return (
          <g key={says}>
            <path d={`M120 ${top + 8}h6v-4h8v4h6v30h-20Z`} fill="var(--sheet)" />
            <rect x={122} y={top + 10 + 27 * (1 - charge)} width={16} height={27 * charge} fill="var(--fill)" stroke="none" />
            <Label x={150} y={top + 30} tone={index === 3 ? "hurt" : "ink"}>
              {says}
            </Label>
            {from && (
              <g>
                <path d={`M104 ${top + ROW}h216`} stroke="var(--edge)" strokeWidth={1.5} strokeDasharray="4 4" />
                <Label x={28} y={top + ROW + 5} at="middle">
                  {from[0] ?? ""}
                </Label>
                <Label x={80} y={top + ROW + 5} at="middle">
                  {from[1] ?? ""}
                </Label>
              </g>
            )}
          </g>
        );
      })}
      <Box x={109} y={34} w={6} h={ROW * 4} r={2} of="metal" />
      <Label x={12} y={242}>
        Rested; lead, not lithium
      </Label>
    </Picture>
  );
}
