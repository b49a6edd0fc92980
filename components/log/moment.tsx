"use client";

import { useSyncExternalStore } from "react";

const never = () => () => undefined;

/** A moment to the minute: in UTC from the server, in the reader's own zone once the page runs. */
export function Moment({ at }: { at: string }) {
  const zone = useSyncExternalStore(
    never,
    () => Intl.DateTimeFormat().resolvedOptions().timeZone,
    () => "UTC",
  );
  const words = new Intl.DateTimeFormat("en-GB", {
    day: "numeric",
    month: "short",
    year: "numeric",
    hour: "2-digit",
    minute: "2-digit",
    timeZone: zone,
  }).format(new Date(at));
  return <time dateTime={at}>{zone === "UTC" ? `${words} UTC` : words}</time>;
}
