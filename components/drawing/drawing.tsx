"use client";

import { Component, lazy, Suspense, type ComponentType, type LazyExoticComponent, type ReactNode } from "react";
import { DRAWINGS, isDrawing, type DrawingKey } from "@/lib/core/tree/drawings";

/** Each drawing is a file of its own, fetched when it is first shown: the first step does not wait for any of them. */
const PICTURES: Record<DrawingKey, LazyExoticComponent<ComponentType>> = {
  "battery-scale": lazy(() => import("./battery-scale").then((file) => ({ default: file.BatteryScale }))),
  "belt-deflection": lazy(() => import("./belt-deflection").then((file) => ({ default: file.BeltDeflection }))),
  "bleeding-order": lazy(() => import("./bleeding-order").then((file) => ({ default: file.BleedingOrder }))),
  "clear-hose": lazy(() => import("./clear-hose").then((file) => ({ default: file.ClearHose }))),
  "coolant-levels": lazy(() => import("./coolant-levels").then((file) => ({ default: file.CoolantLevels }))),
  decompressor: lazy(() => import("./decompressor").then((file) => ({ default: file.Decompressor }))),
  dipstick: lazy(() => import("./dipstick").then((file) => ({ default: file.Dipstick }))),
  "drop-negative": lazy(() => import("./drop-negative").then((file) => ({ default: file.DropNegative }))),
  "drop-positive": lazy(() => import("./drop-positive").then((file) => ({ default: file.DropPositive }))),
  "elbow-section": lazy(() => import("./elbow-section").then((file) => ({ default: file.ElbowSection }))),
  "exhaust-outlet": lazy(() => import("./exhaust-outlet").then((file) => ({ default: file.ExhaustOutlet }))),
  "fuel-path": lazy(() => import("./fuel-path").then((file) => ({ default: file.FuelPath }))),
  "glow-bus-bar": lazy(() => import("./glow-bus-bar").then((file) => ({ default: file.GlowBusBar }))),
  impeller: lazy(() => import("./impeller").then((file) => ({ default: file.Impeller }))),
  "lid-seal": lazy(() => import("./lid-seal").then((file) => ({ default: file.LidSeal }))),
  "primer-lever": lazy(() => import("./primer-lever").then((file) => ({ default: file.PrimerLever }))),
  "propeller-growth": lazy(() => import("./propeller-growth").then((file) => ({ default: file.PropellerGrowth }))),
  "raw-water-path": lazy(() => import("./raw-water-path").then((file) => ({ default: file.RawWaterPath }))),
  "runaway-air": lazy(() => import("./runaway-air").then((file) => ({ default: file.RunawayAir }))),
  "separator-bowl": lazy(() => import("./separator-bowl").then((file) => ({ default: file.SeparatorBowl }))),
  "start-circuit": lazy(() => import("./start-circuit").then((file) => ({ default: file.StartCircuit }))),
  "stop-by-hand": lazy(() => import("./stop-by-hand").then((file) => ({ default: file.StopByHand }))),
  "strainer-seal": lazy(() => import("./strainer-seal").then((file) => ({ default: file.StrainerSeal }))),
  "tank-pick-up": lazy(() => import("./tank-pick-up").then((file) => ({ default: file.TankPickUp }))),
  "thermostat-pan": lazy(() => import("./thermostat-pan").then((file) => ({ default: file.ThermostatPan }))),
  "throttle-stops": lazy(() => import("./throttle-stops").then((file) => ({ default: file.ThrottleStops }))),
  "vented-loop": lazy(() => import("./vented-loop").then((file) => ({ default: file.VentedLoop }))),
  "wet-exhaust": lazy(() => import("./wet-exhaust").then((file) => ({ default: file.WetExhaust }))),
};

/** The drawing of that key; in words where the picture has not reached this device, or nobody here knows the key. */
export function Drawing({ of }: { of: string }) {
  if (!isDrawing(of)) return <p className="p-3 text-sm text-ink-2">A newer version of Gudgeon has a drawing here.</p>;
  const Picture = PICTURES[of];
  const inWords = <p className="p-3 text-sm">{DRAWINGS[of].describes}</p>;
  return (
    <InWords key={of} words={inWords}>
      <Suspense fallback={inWords}>
        <Picture />
      </Suspense>
    </InWords>
  );
}

/** A picture that cannot be fetched, with no signal and not kept here, is told instead. */
class InWords extends Component<{ words: ReactNode; children: ReactNode }, { failed: boolean }> {
  override state = { failed: false };
  static getDerivedStateFromError() {
    return { failed: true };
  }
  override render() {
    return this.state.failed ? this.props.words : this.props.children;
  }
}
