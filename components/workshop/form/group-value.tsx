import type { Editing, FieldEditor } from "./editing";
import { hintOf, labelOf } from "./field-words";
import type { Field } from "./shape";

/** Fields that belong together. A group that may be left out is left out when its last field is emptied. */
export function GroupValue({
  name,
  path,
  value,
  onChange,
  fields,
  must,
  bare,
  editor: Editor,
}: Editing<object> & { fields: readonly Field[]; must: boolean; editor: FieldEditor }) {
  const hint = hintOf(name);
  const put = (field: string, next: unknown) => {
    const all = { ...value, [field]: next };
    const said = Object.entries(all).filter(([, one]) => one !== undefined);
    onChange(said.length === 0 && !must ? undefined : Object.fromEntries(said));
  };
  const body = fields.map((field) => (
    <Editor
      key={field.name}
      name={field.name}
      path={`${path}-${field.name}`}
      shape={field.shape}
      must={field.must}
      value={(value as Record<string, unknown> | undefined)?.[field.name]}
      onChange={(next) => put(field.name, next)}
    />
  ));
  if (bare) return <div className="grid gap-3 rounded-lg border border-rule p-3">{body}</div>;
  return (
    <details id={path} open={value !== undefined && Object.keys(value).length > 0} className="rounded-lg border border-rule px-3">
      <summary className="flex min-h-12 items-center font-semibold">{labelOf(name)}</summary>
      {hint && <p className="pb-2 text-sm text-ink-2">{hint}</p>}
      <div className="grid gap-3 pb-3">{body}</div>
    </details>
  );
}
