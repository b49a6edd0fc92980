"use client";

import { BackLink } from "./back-link";
import { useHere } from "./here";
import { NodePicker } from "./node-picker";
import { ScreenHeading } from "./screen-heading";
import { Told } from "./told";

/** A check made before it was asked for. It counts as if it had been. */
export function Looked() {
  const { tree, address, go } = useHere();
  const check = tree.checks.find(({ key }) => key === address.which);
  if (check) return <Told node={{ check }} />;
  return (
    <>
      <BackLink />
      <ScreenHeading of="looked">What have you looked at?</ScreenHeading>
      <div className="mt-3">
        <NodePicker id="find-check" label="Find it by a word" tree={tree} nodes={tree.checks} onPick={(key) => go("looked", key)} />
      </div>
    </>
  );
}
