"use client";

import { Button } from "@/components/ui/button";

type Props = { error: Error & { digest?: string }; retry: () => void };

/** The page could not be made. What was typed into the phone's own path is not touched by it, and that is said. */
export function WentWrong({ error, retry }: Props) {
  return (
    <div className="max-w-xl" role="alert">
      <title>This page could not be shown · Gudgeon</title>
      <h1 className="text-3xl">This page could not be shown</h1>
      <p className="mt-2">
        The server could not make it this time. Nothing that was saved is lost, and a diagnosis under way is kept on your device. Try again;
        if it stays like this, wait a few minutes.
      </p>
      <div className="mt-5">
        <Button tone="strong" onClick={retry}>
          Try again
        </Button>
      </div>
      {error.digest && <p className="mt-5 text-sm text-ink-2">To tell whoever keeps the server: {error.digest}</p>}
    </div>
  );
}
