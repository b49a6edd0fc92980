import Link from "next/link";
import { LinkButton } from "@/components/ui/link-button";
import { Notice } from "@/components/ui/notice";
import type { SurfaceState } from "@/lib/client/screen/surface";
import { Frame } from "./frame";

/** Why nothing can be shown yet, and what to do about it. */
export function NotReady({ kind }: { kind: Exclude<SurfaceState["kind"], "ready"> }) {
  return (
    <Frame ready={null} who="Gudgeon">
      {kind === "opening" && <p role="status">Opening what is kept on this phone.</p>}
      {kind === "sign-in" && (
        <div className="grid gap-4">
          <h1>Sign in once on this phone</h1>
          <p>Your boats, engines and the fault tree are then kept on it, and this page works without a signal.</p>
          <LinkButton href="/sign-in?next=/diagnose" tone="strong" size="large">
            Sign in
          </LinkButton>
        </div>
      )}
      {kind === "no-signal" && (
        <Notice tone="look" title="No signal, and nothing kept on this phone yet">
          Open this page once with a signal. After that it works without one. It tries again by itself when a signal returns.
        </Notice>
      )}
      {kind === "no-fleet" && (
        <Notice tone="look" title="You do not belong to a fleet yet">
          Accept an invitation from its owner, or start your own from the{" "}
          <Link className="link" href="/">
            front page
          </Link>
          .
        </Notice>
      )}
    </Frame>
  );
}
