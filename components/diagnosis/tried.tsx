"use client";

import { BackLink } from "./back-link";
import { useHere } from "./here";
import { NodePicker } from "./node-picker";
import { ScreenHeading } from "./screen-heading";
import { Told } from "./told";

/** A repair that was tried before it was proposed. */
export function Tried() {
  const { tree, address, go } = useHere();
  const remedy = tree.remedies.find(({ key }) => key === address.which);
  if (remedy) return <Told node={{ remedy }} />;
  return (
    <>
      <BackLink />
      <ScreenHeading of="tried">What have you tried?</ScreenHeading>
      <div className="mt-3">
        <NodePicker id="find-remedy" label="Find it by a word" tree={tree} nodes={tree.remedies} onPick={(key) => go("tried", key)} />
      </div>
    </>
  );
}
