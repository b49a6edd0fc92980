import type { ReactNode } from "react";

/** Said alike of what never was and of what belongs to others: a stranger learns nothing from it. */
export function NothingHere({ action }: { action: ReactNode }) {
  return (
    <div className="max-w-xl">
      <h1 className="text-3xl">There is nothing here</h1>
      <p className="mt-2">
        The address may be mistyped, the thing may have been taken off the lists, or it belongs to a fleet you are not in. If somebody sent
        you the link, ask them which fleet it is in.
      </p>
      <div className="mt-5">{action}</div>
    </div>
  );
}
