"use client";

import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { useHere } from "./here";

/** Two phones answered the same step differently: neither counts until someone says which is right. */
export function ConflictNotice() {
  const { view, go } = useHere();
  if (view.conflicts.length === 0) return null;
  return (
    <div className="mb-4">
      <Notice
        tone="look"
        title={
          view.conflicts.length === 1
            ? "Two phones answered one step differently"
            : `Two phones answered ${view.conflicts.length} steps differently`
        }
        live
      >
        <p>Neither answer counts until you pick one.</p>
        <Button className="mt-2" onClick={() => go("said")}>
          Pick the right one
        </Button>
      </Notice>
    </div>
  );
}
