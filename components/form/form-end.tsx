"use client";

import type { ReactNode } from "react";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import type { Refusal } from "./use-save";

type Props = { submit: string; saving: boolean; refusal: Refusal | null; wrong?: boolean; done?: ReactNode; also?: ReactNode };

/** The foot of a form: what went wrong, what is done, and the button. A stale version is told by StaleNotice instead. */
export function FormEnd({ submit, saving, refusal, wrong = false, done, also }: Props) {
  return (
    <>
      {wrong && !refusal && <Notice tone="bad">Look at what is marked above.</Notice>}
      {refusal && refusal.status !== 412 && (
        <Notice tone="bad" live>
          {refusal.says}
        </Notice>
      )}
      {done && (
        <Notice tone="good" live>
          {done}
        </Notice>
      )}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" tone="strong" disabled={saving}>
          {saving ? "One moment…" : submit}
        </Button>
        {also}
      </div>
    </>
  );
}
