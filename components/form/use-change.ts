"use client";

import { useState } from "react";
import type { FieldValues, UseFormReturn } from "react-hook-form";
import { mergeChanges } from "@/lib/client/merge-changes";
import { useSave } from "./use-save";

type Nested = { readonly [key: string]: string | Nested };
type Versioned<V> = { values: V; version: number };

type Props<V extends FieldValues & Nested, Out> = {
  form: UseFormReturn<V, unknown, Out>;
  /** What stood there when the page was made. */
  start: Versioned<V>;
  /** Sends the change to one version; the answer is the thing as it then is. */
  send: (change: Out, version: number) => Promise<unknown>;
  /** Reads a thing that the server sent back. */
  read: (thing: unknown) => Versioned<V>;
  onSaved?: () => void;
};

/** A change to a thing that others may change too: saved against the version seen, joined with theirs or dropped when it was stale. */
export function useChange<V extends FieldValues & Nested, Out>({ form, start, send, read, onSaved }: Props<V, Out>) {
  const [base, setBase] = useState(start);
  const [saved, setSaved] = useState(false);
  const { saving, refusal, save, forget } = useSave();
  const theirs = refusal?.status === 412 ? read(refusal.current) : null;

  const sendTo = (version: number) => async (change: Out) => {
    setSaved(false);
    const outcome = await save(() => send(change, version));
    if (!("answer" in outcome)) return;
    const now = read(outcome.answer);
    setBase(now);
    form.reset(now.values);
    setSaved(true);
    onSaved?.();
  };

  return {
    saving,
    refusal,
    saved,
    base,
    theirs,
    submit: form.handleSubmit(sendTo(base.version)),
    keepMine: () => {
      if (!theirs) return;
      form.reset(mergeChanges<V>(base.values, form.getValues(), theirs.values), { keepDefaultValues: true });
      setBase(theirs);
      void form.handleSubmit(sendTo(theirs.version))();
    },
    takeTheirs: () => {
      if (!theirs) return;
      form.reset(theirs.values);
      setBase(theirs);
      forget();
    },
  };
}
