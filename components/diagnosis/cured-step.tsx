"use client";

import { Button } from "@/components/ui/button";
import { useHere } from "./here";
import { ScreenHeading } from "./screen-heading";

/** A repair cured it: there is nothing left to ask but how it ended. */
export function CuredStep() {
  const { view, tree, go } = useHere();
  const cured = view.curedCause;
  if (!cured) return null;
  const said = view.said.findLast(({ kind, key, mayChange }) => kind === "remedy-tried" && key === cured.remedy && mayChange);
  const remedy = tree.remedies.find(({ key }) => key === cured.remedy)?.title ?? cured.remedy;
  const cause = tree.causes.find(({ key }) => key === cured.cause)?.title ?? cured.cause;
  return (
    <>
      <ScreenHeading of="cured">{cured.temporary ? "It gets you home" : "That cured it"}</ScreenHeading>
      <p className="mt-2">
        {remedy}. So it was most likely: <b>{cause}</b>.
      </p>
      {cured.proof === null && <p className="mt-2">The cure is not proved yet. Prove it before trusting the engine far from help.</p>}
      <div className="mt-4 grid gap-3">
        <Button tone="strong" size="large" wide onClick={() => go("outcome")}>
          Log the outcome
        </Button>
        <Button size="large" wide onClick={() => go("symptoms")}>
          Cured, but it still does something else
        </Button>
        {said && (
          <Button size="large" wide onClick={() => go("change", said.event)}>
            It is not cured after all
          </Button>
        )}
      </div>
    </>
  );
}
