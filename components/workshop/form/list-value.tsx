import type { Editing, FieldEditor } from "./editing";
import { labelOf } from "./field-words";
import { AddRow, Rows } from "./rows";
import type { Shape } from "./shape";
import { emptyOf } from "./empty-value";

/** Things in an order: steps, phrases, findings, parts. */
export function ListValue({
  name,
  path,
  value = [],
  onChange,
  of,
  editor: Editor,
}: Editing<readonly unknown[]> & { of: Shape; editor: FieldEditor }) {
  const put = (items: readonly unknown[]) => onChange(items);
  const called = (index: number) => `${labelOf(name)} ${index + 1}`;
  return (
    <Rows
      name={name}
      path={path}
      onRemove={(index) => put(value.filter((_, other) => other !== index))}
      onMove={(index, by) => {
        const moved = [...value];
        moved.splice(index + by, 0, ...moved.splice(index, 1));
        put(moved);
      }}
      rows={value.map((item, index) => ({
        key: String(index),
        called: called(index),
        node: (
          <Editor
            bare
            must
            name={name}
            path={`${path}-${index}`}
            shape={of}
            value={item}
            onChange={(next) => put(value.map((old, other) => (other === index ? (next ?? emptyOf(of)) : old)))}
          />
        ),
      }))}
      add={<AddRow says="Add one" onClick={() => put([...value, emptyOf(of)])} />}
    />
  );
}
