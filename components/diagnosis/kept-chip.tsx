"use client";

import Link from "next/link";
import { standingInShort, standingInWords } from "@/lib/client/exchange/standing";
import type { Ready } from "@/lib/client/screen/surface";
import { useObservable } from "@/lib/client/screen/use-observable";
import { Chip } from "@/components/ui/chip";

/** Where the answers are, in a word or two. */
export function KeptChip({ ready }: { ready: Ready }) {
  const standing = useObservable(ready.exchange.standing);
  const unsaved = useObservable(ready.store.unsaved);
  return <Chip tone={unsaved ? "lead" : "on-deep"}>{standingInShort(standing, unsaved)}</Chip>;
}

/** The same as a sentence, with what can be done about it. */
export function KeptLine({ ready }: { ready: Ready }) {
  const standing = useObservable(ready.exchange.standing);
  const unsaved = useObservable(ready.store.unsaved);
  return (
    <div className="flex flex-wrap items-center gap-x-3 text-sm text-ink-2">
      <p role="status">{standingInWords(standing, unsaved)}</p>
      {standing.trouble === "sign-in" && (
        <Link className="link inline-flex min-h-12 items-center" href="/sign-in?next=/diagnose" prefetch={false}>
          Sign in
        </Link>
      )}
      {standing.waiting > 0 && standing.trouble !== "sign-in" && !standing.sending && (
        <button type="button" className="link min-h-12" onClick={() => ready.exchange.sendNow()}>
          Send now
        </button>
      )}
    </div>
  );
}
