"use client";

import { useRouter } from "next/navigation";
import { useActionState, useEffect, type ReactNode } from "react";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { untouched } from "@/lib/core/contract/form-state";
import type { FormAction } from "./form-action";

type Props = {
  action: FormAction;
  /** What the form carries without showing it. */
  hidden?: Readonly<Record<string, string>>;
  submit: string;
  tone?: "strong" | "plain" | "quiet" | "grave";
  /** The fields; `wrong(name)` is what the server says of one. */
  children?: (wrong: (name: string) => string | undefined) => ReactNode;
  /** Shown in place of the form once it is done. */
  onceDone?: (says: string) => ReactNode;
  /** The page shows what the form changes: it is read again once that is done. */
  changesPage?: boolean;
  /** Beside the button. */
  also?: ReactNode;
};

/** A form round a server action: says what is wrong where it is wrong, keeps what was typed, and says when it is done. */
export function ActionForm({ action, hidden = {}, submit, tone = "strong", children, onceDone, changesPage = false, also }: Props) {
  const [state, act, waits] = useActionState(action, untouched);
  const { refresh } = useRouter();
  useEffect(() => {
    if (changesPage && state.status === "done") refresh();
  }, [changesPage, state, refresh]);
  if (state.status === "done" && onceDone) return <>{onceDone(state.says)}</>;
  const wrong = (name: string) => (state.status === "refused" ? state.fields[name] : undefined);
  return (
    <form
      className="grid gap-4"
      action={act}
      // React empties a form when its action has ended; what a person typed stays until it has been taken.
      onReset={(event) => {
        if (state.status !== "done") event.preventDefault();
      }}
    >
      {Object.entries(hidden).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      {children?.(wrong)}
      {state.status === "refused" && state.says && (
        <Notice tone="bad" live>
          {state.says}
          {state.until && <> Try again at {timeOf(state.until)}.</>}
        </Notice>
      )}
      {state.status === "done" && (
        <Notice tone="good" live>
          {state.says}
        </Notice>
      )}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" tone={tone} disabled={waits}>
          {waits ? "One moment…" : submit}
        </Button>
        {also}
      </div>
    </form>
  );
}

const timeOf = (moment: string) => new Date(moment).toLocaleTimeString("en-GB", { hour: "2-digit", minute: "2-digit" });
