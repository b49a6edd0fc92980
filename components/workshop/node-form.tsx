"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useCallback, useEffect, useMemo, useRef } from "react";
import { Controller, useForm, useWatch, type FieldErrors, type FieldValues } from "react-hook-form";
import type * as z from "zod";
import { LIST_KINDS, type ListName } from "@/lib/core/tree/flaw";
import { nameOf, type TreeNode } from "@/lib/core/tree/edits/edit";
import { FaultTree } from "@/lib/core/tree/schema";
import { mergeValues } from "@/lib/core/tree/merge-values";
import { sameValue } from "@/lib/core/tree/same-value";
import { typographicAll } from "@/lib/core/tree/typographic";
import { Edited } from "./form/editing";
import { fieldsOf } from "./form/shape";
import { ShapeValue } from "./form/shape-value";
import { keepUnfinished, unfinished } from "./unfinished";

type Props = {
  tree: FaultTree;
  list: ListName;
  node: TreeNode;
  /** Names what is kept on this device while it is not yet a node. */
  draftId: string;
  onChange: (node: TreeNode, says: string) => void;
};

const QUIET_MS = 400;
/** Never typed by hand: it stays what it is for ever. */
const NOT_EDITED = new Set(["key"]);

/**
 * Every field of a node, as the document's schema has them. What makes a
 * whole node goes into the draft after a moment of quiet; what does not (yet)
 * is marked, and kept on this device meanwhile.
 */
export function NodeForm({ tree, list, node, draftId, onChange }: Props) {
  const schema = useMemo(() => listSchema(list), [list]);
  const kept = useMemo(() => unfinished(draftId, list, node.key), [draftId, list, node.key]);
  const form = useForm<FieldValues>({
    resolver: zodResolver(schema as z.ZodType<FieldValues, FieldValues>),
    defaultValues: kept ?? node,
    mode: "onChange",
  });
  const { control, reset, trigger, getValues } = form;
  const values = useWatch({ control });
  const lastPut = useRef<TreeNode>(node);

  /** Puts a whole node into the draft; what is not one (yet) stays on this device. */
  const settle = useCallback((): boolean => {
    const typed = getValues();
    const isNew = !sameValue(typed, lastPut.current);
    const whole = isNew ? schema.safeParse(typed) : null;
    keepUnfinished(draftId, list, node.key, whole?.success === false ? typed : null);
    if (!whole?.success) return !isNew;
    const put = typographicAll(whole.data) as TreeNode;
    if (sameValue(put, lastPut.current)) return true;
    lastPut.current = put;
    onChange(put, `${LIST_KINDS[list]} “${nameOf(put)}” changed`);
    return true;
  }, [getValues, schema, draftId, list, node.key, onChange]);

  // The node changed under the form (an undo, another mechanic, the table): what is typed and not in the draft yet stays.
  useEffect(() => {
    if (sameValue(node, lastPut.current)) return;
    const { value } = mergeValues(lastPut.current, getValues(), node);
    lastPut.current = node;
    reset(value as FieldValues);
  }, [node, reset, getValues]);

  useEffect(() => {
    const timer = setTimeout(() => {
      if (!settle()) void trigger();
    }, QUIET_MS);
    return () => clearTimeout(timer);
  }, [values, settle, trigger]);

  // Closed, or the page left, before the quiet was over: nothing typed is lost.
  useEffect(() => {
    const leaving = () => {
      const typed = getValues();
      const waits = !sameValue(typed, lastPut.current);
      settle();
      // The draft's own keeping takes a moment that a page on its way out may not have.
      if (waits) keepUnfinished(draftId, list, node.key, typed);
    };
    window.addEventListener("pagehide", leaving);
    return () => {
      window.removeEventListener("pagehide", leaving);
      settle();
    };
  }, [settle, getValues, draftId, list, node.key]);

  return (
    <Edited value={{ tree, node: values as Partial<TreeNode> }}>
      <form className="grid gap-4" noValidate onSubmit={(event) => event.preventDefault()}>
        {fieldsOf(schema)
          .filter(({ name }) => !NOT_EDITED.has(name))
          .map(({ name, shape, must }) => (
            <Controller
              key={name}
              control={control}
              name={name}
              render={({ field, fieldState }) => (
                <div>
                  <ShapeValue
                    name={name}
                    path={`${list}-${node.key}-${name}`}
                    shape={shape}
                    must={must}
                    value={field.value}
                    onChange={field.onChange}
                  />
                  {fieldState.invalid && (
                    <p role="alert" className="mt-1 text-sm font-semibold text-lead">
                      {errorIn(form.formState.errors[name])}
                    </p>
                  )}
                </div>
              )}
            />
          ))}
        <p className="text-sm text-ink-2">
          Key: <span className="dial">{node.key}</span>. It stays for ever: logged diagnoses name the node by it.
        </p>
      </form>
    </Edited>
  );
}

const listSchema = (list: ListName): z.ZodType => {
  const def = FaultTree.shape[list].def as unknown as { element?: unknown; innerType?: { def: { element: unknown } } };
  return (def.element ?? def.innerType?.def.element) as z.ZodType;
};

/** The first thing that is wrong in a field, with where in it. */
function errorIn(error: FieldErrors[string] | undefined, path = ""): string {
  if (error === undefined) return "Something here is not right.";
  if (typeof error.message === "string") return path === "" ? `${error.message}.` : `${path}: ${error.message}.`;
  const [first] = Object.entries(error).filter(([key, inner]) => key !== "ref" && typeof inner === "object" && inner !== null);
  if (!first) return "Something here is not right.";
  const step = /^\d+$/.test(first[0]) ? String(Number(first[0]) + 1) : first[0];
  return errorIn(first[1] as FieldErrors[string], path === "" ? step : `${path} ${step}`);
}
