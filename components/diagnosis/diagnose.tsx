"use client";

import { useEffect, useState } from "react";
import { Reasoner } from "@/lib/client/compute/reasoner";
import { Surface } from "@/lib/client/screen/surface";
import { useAddress, type Address } from "@/lib/client/screen/use-address";
import { useObservable } from "@/lib/client/screen/use-observable";
import { Fleet } from "./fleet";
import { Frame } from "./frame";
import { NotReady } from "./not-ready";

/** The skipper's path, from the choice of an engine to the outcome. */
export function Diagnose() {
  const { address, go } = useAddress();
  if (!address)
    return (
      <Frame ready={null} who="Gudgeon">
        <p>Opening what is kept on this phone.</p>
      </Frame>
    );
  return <Awake address={address} go={go} />;
}

type Props = { address: Address; go: ReturnType<typeof useAddress>["go"] };

function Awake({ address, go }: Props) {
  const [surface] = useState(() => new Surface());
  const [reasoner] = useState(() => new Reasoner());
  const [fleetWanted] = useState(address.fleet);
  useEffect(() => surface.start(fleetWanted), [surface, fleetWanted]);
  useEffect(() => reasoner.warm(), [reasoner]);
  const state = useObservable(surface.state);
  if (state.kind !== "ready") return <NotReady kind={state.kind} />;
  return <Fleet key={`${state.person.userId} ${state.person.fleetId}`} ready={state} reasoner={reasoner} address={address} go={go} />;
}
