"use client";

import { useState } from "react";
import { NoAnswer } from "@/lib/client/exchange/request";
import type { FieldError } from "@/lib/core/contract/problem";

/** Why a change was not taken. `current`: with a 412, the thing as somebody else has left it. */
export type Refusal = { status: number; says: string; errors: readonly FieldError[]; current: unknown };

type Saving = { saving: boolean; refusal: Refusal | null };

/** Sends a form's change and keeps what came of it. `save` gives the answer, or null when it was refused. */
export function useSave() {
  const [state, setState] = useState<Saving>({ saving: false, refusal: null });
  const save = async <T>(send: () => Promise<T>): Promise<{ answer: T } | { refusal: Refusal }> => {
    setState({ saving: true, refusal: null });
    try {
      const answer = await send();
      setState({ saving: false, refusal: null });
      return { answer };
    } catch (failure) {
      const refusal = refusalOf(failure);
      setState({ saving: false, refusal });
      return { refusal };
    }
  };
  return { ...state, save, forget: () => setState({ saving: false, refusal: null }) };
}

function refusalOf(failure: unknown): Refusal {
  if (!(failure instanceof NoAnswer)) throw failure;
  const { status, because, errors, current } = failure;
  const says =
    status === 0
      ? "No answer from the server. What you typed is still here; try again when there is a signal."
      : (errors[0]?.says ?? because);
  return { status, says, errors, current };
}
