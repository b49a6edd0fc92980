"use client";

import { useHere } from "./here";

/** Perhaps two faults at once, or one of two put right: said only when the numbers do. */
export function TwoFaults() {
  const { view } = useHere();
  const { two } = view.possible;
  if (view.putRight) {
    const { remedy, cause, gone } = view.putRight;
    return (
      <p className="my-2 text-sm">
        <b>What is left.</b> {remedy.title} made it better{cause ? `, so ${quoted(cause.title)} was most likely part of it` : ""}.
        {gone.length > 0 && ` Gone since: ${gone.join(", ")}.`} The counts are of what is still wrong.
      </p>
    );
  }
  if (!two) return null;
  const [one, other] = two.likeliest;
  return (
    <p className="my-2 text-sm">
      <b>Perhaps two faults at once,</b> in {two.of100} of 100 engines like this; most likely {quoted(one.title)} and {quoted(other.title)}.
      Each counts half here.
    </p>
  );
}

const quoted = (title: string): string => `\u201c${title}\u201d`;
