"use client";

import { BackLink } from "./back-link";
import { Defers } from "./defers";
import { useHere } from "./here";
import { NodePicker } from "./node-picker";
import { RemedyResultForm } from "./remedy-result-form";
import { ScreenHeading } from "./screen-heading";

/** A repair that was tried before it was proposed. */
export function Tried() {
  const { tree, view, address, go, record, setUndo } = useHere();
  const remedy = tree.remedies.find(({ key }) => key === address.which);
  if (!remedy)
    return (
      <>
        <BackLink />
        <ScreenHeading of="tried">What have you tried?</ScreenHeading>
        <div className="mt-3">
          <NodePicker id="find-remedy" label="Find it by a word" tree={tree} nodes={tree.remedies} onPick={(key) => go("tried", key)} />
        </div>
      </>
    );
  const before = view.said.find(({ kind, key }) => kind === "remedy-tried" && key === remedy.key);
  return (
    <>
      <BackLink />
      <ScreenHeading of={remedy.key}>{remedy.title}</ScreenHeading>
      {before && <p className="mt-2 text-sm text-ink-2">Said before: {before.says}. A new result takes its place.</p>}
      <RemedyResultForm
        of={remedy.key}
        proof={remedy.proof}
        onResult={async ({ result, proof, note, photos, says }) => {
          const payload = { remedy: remedy.key, result, ...(proof ? { proof } : {}), ...(note ? { note } : {}), photos: [...photos] };
          const event = await record("remedy-tried", payload, before?.event);
          setUndo({ event: event.id, says: `${remedy.title}: ${says}`, withdraws: null });
          go(result === "cured" ? "outcome" : "step");
        }}
      />
      <Defers />
    </>
  );
}
