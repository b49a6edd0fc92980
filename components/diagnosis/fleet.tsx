"use client";

import type { Reasoner } from "@/lib/client/compute/reasoner";
import type { Ready } from "@/lib/client/screen/surface";
import type { Address, useAddress } from "@/lib/client/screen/use-address";
import { useObservable } from "@/lib/client/screen/use-observable";
import { usePhone } from "@/lib/client/screen/use-phone";
import { Notice } from "@/components/ui/notice";
import { ChooseEngine } from "./choose-engine";
import { Frame } from "./frame";
import { OpenDiagnosis } from "./open-diagnosis";
import { Say } from "./say";

type Props = { ready: Ready; reasoner: Reasoner; address: Address; go: ReturnType<typeof useAddress>["go"] };

/** With a store open: the engine, what is wrong with it, or a diagnosis under way. */
export function Fleet({ ready, reasoner, address, go }: Props) {
  const phone = usePhone(ready.store);
  const { trouble } = useObservable(ready.exchange.standing);
  if (!phone)
    return (
      <Frame ready={ready} who="Gudgeon">
        {trouble === null || phone === undefined ? (
          <p role="status">Fetching your boats and the fault tree.</p>
        ) : (
          <Notice tone="look" title="Your boats are not on this phone yet">
            It takes one visit with a signal while signed in. It is tried again by itself.
          </Notice>
        )}
      </Frame>
    );
  if (address.d) return <OpenDiagnosis key={address.d} id={address.d} {...{ ready, reasoner, phone, address, go }} />;
  const engine = phone.engines.find(({ id }) => id === address.engine);
  if (engine) return <Say key={engine.id} {...{ ready, phone, engine, address, go }} />;
  return <ChooseEngine {...{ ready, phone, go }} />;
}
