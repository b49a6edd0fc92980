"use client";

import { useRouter } from "next/navigation";
import { useActionState, useEffect, useState, type ReactNode } from "react";
import { Button } from "@/components/ui/button";
import { Form } from "@/components/ui/form";
import { Notice } from "@/components/ui/notice";
import { untouched } from "@/lib/core/contract/form-state";
import type { FormAction } from "./form-action";

type Props = {
  action: FormAction;
  /** What the form carries without showing it. */
  hidden?: Readonly<Record<string, string>>;
  submit: string;
  tone?: "strong" | "plain" | "quiet" | "grave";
  /** The fields; `wrong(name)` is what the server says of one, `before(name)` what was given the last time the form was done. */
  children?: (wrong: (name: string) => string | undefined, before: (name: string) => string | undefined) => ReactNode;
  /** Shown in place of the form once it is done; `again` brings the form back. */
  onceDone?: (says: string, given: FormData, again: () => void) => ReactNode;
  /** The page shows what the form changes: it is read again once that is done. */
  changesPage?: boolean;
  /** Beside the button. */
  also?: ReactNode;
};

/** A form round a server action: says what is wrong where it is wrong, keeps what was typed, and says when it is done. */
export function ActionForm(props: Props) {
  const [round, setRound] = useState<{ n: number; given: FormData | null }>({ n: 0, given: null });
  return <OneRound key={round.n} {...props} before={round.given} again={(given) => setRound(({ n }) => ({ n: n + 1, given }))} />;
}

type Round = Props & { before: FormData | null; again: (given: FormData | null) => void };

function OneRound({ before, again, action, hidden = {}, submit, tone = "strong", children, onceDone, changesPage = false, also }: Round) {
  const [state, act, waits] = useActionState(action, untouched);
  const [given, setGiven] = useState<FormData | null>(null);
  const { refresh } = useRouter();
  useEffect(() => {
    if (changesPage && state.status === "done") refresh();
  }, [changesPage, state, refresh]);
  if (state.status === "done" && onceDone) return <>{onceDone(state.says, given ?? new FormData(), () => again(given))}</>;
  const wrong = (name: string) => (state.status === "refused" ? state.fields[name] : undefined);
  return (
    <Form
      className="grid gap-4"
      action={act}
      onSubmit={(event) => setGiven(new FormData(event.currentTarget))}
      // React empties a form when its action has ended; what a person typed stays until it has been taken.
      onReset={(event) => {
        if (state.status !== "done") event.preventDefault();
      }}
    >
      {Object.entries(hidden).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      {children?.(wrong, (name) => before?.get(name)?.toString())}
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
    </Form>
  );
}

const timeOf = (moment: string) => new Date(moment).toLocaleTimeString("en-GB", { hour: "2-digit", minute: "2-digit" });
