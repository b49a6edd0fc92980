import { ViewportPortal } from "@xyflow/react";
import { LANES, type Places } from "./tree-layout";

const LANE_TITLES = [
  ["symptom", "Symptom"],
  ["check", "Checks and their findings"],
  ["cause", "Likely causes"],
  ["remedy", "Remedies"],
] as const;

/** The ruled ground of the picture: a lane a column, each with its heading. */
export function Lanes({ places }: { places: Places }) {
  const bottom = Math.max(...[...places.values()].map((p) => p.y + p.height)) + 40;
  return (
    <ViewportPortal>
      {LANE_TITLES.map(([lane, title]) => (
        <div key={lane} className="absolute text-ink-2" style={{ left: LANES[lane].x, top: 8 }}>
          {title}
        </div>
      ))}
      {(["check", "cause", "remedy"] as const).map((lane) => (
        <div key={lane} className="absolute w-px bg-rule" style={{ left: LANES[lane].x - 24, top: 0, height: bottom }} />
      ))}
    </ViewportPortal>
  );
}
