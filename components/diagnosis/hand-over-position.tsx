"use client";

import { useState } from "react";
import type { Position } from "@/lib/client/hand-over/facts";
import { positionInFigures } from "@/lib/client/hand-over/position";
import { Button } from "@/components/ui/button";

/** The phone is asked where it is only when someone taps for it; it stays on this page. */
export function HandOverPosition({ position, onPosition }: { position: Position | null; onPosition: (position: Position) => void }) {
  const [says, setSays] = useState("");
  const ask = () => {
    if (!("geolocation" in navigator)) return setSays("This phone does not give its position.");
    setSays("Asking the phone.");
    navigator.geolocation.getCurrentPosition(
      ({ coords, timestamp }) => {
        setSays("");
        onPosition({ latitude: coords.latitude, longitude: coords.longitude, at: new Date(timestamp).toISOString() });
      },
      ({ code }) =>
        setSays(
          code === 1 ? "The phone is set not to give its position here." : "The phone has no position yet. Try again under open sky.",
        ),
      { enableHighAccuracy: true, timeout: 30_000, maximumAge: 60_000 },
    );
  };
  return (
    <div>
      <Button wide onClick={ask}>
        {position ? "Take the position again" : "Add the position"}
      </Button>
      <p role="status" className="mt-1 text-sm">
        {position ? `Added: ${positionInFigures(position)}. Check it against the plotter.` : says}
      </p>
    </div>
  );
}
