"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useEffect, useMemo, useRef } from "react";
import { Controller, useForm, useWatch, type FieldErrors, type FieldValues } from "react-hook-form";
import type * as z from "zod";
import { LIST_KINDS, type ListName } from "@/lib/core/tree/flaw";
import { nameOf, type TreeNode } from "@/lib/core/tree/edits/edit";
import { FaultTree } from "@/lib/core/tree/schema";
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
  const schema = listSchema(list);
  const kept = useMemo(() => unfinished(draftId, list, node.key), [draftId, list, node.key]);
  const form = useForm<FieldValues>({
    resolver: zodResolver(schema as z.ZodType<FieldValues, FieldValues>),
    defaultValues: kept ?? node,
    mode: "onChange",
  });
  const { control, reset, handleSubmit, getValues } = form;
  const values = useWatch({ control });
  const lastPut = useRef<TreeNode>(node);

  // The node changed under the form: an undo, another mechanic, the table.
  useEffect(() => {
    if (sameValue(node, lastPut.current)) return;
    lastPut.current = node;
    reset(node);
  }, [node, reset]);

  useEffect(() => {
    const timer = setTimeout(() => {
      if (sameValue(getValues(), lastPut.current)) return keepUnfinished(draftId, list, node.key, null);
      void handleSubmit(
        (whole) => {
          const put = typographicAll(whole) as TreeNode;
          if (sameValue(put, lastPut.current)) return;
          lastPut.current = put;
          keepUnfinished(draftId, list, node.key, null);
          onChange(put, `${LIST_KINDS[list]} “${nameOf(put)}” changed`);
        },
        () => keepUnfinished(draftId, list, node.key, getValues()),
      )();
    }, QUIET_MS);
    return () => clearTimeout(timer);
  }, [values, handleSubmit, getValues, onChange, draftId, list, node.key]);

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

const listSchema = (list: ListName) => {
  const def = FaultTree.shape[list].def as unknown as { element?: unknown; innerType?: { def: { element: unknown } } };
  return (def.element ?? def.innerType?.def.element) as Parameters<typeof fieldsOf>[0];
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
