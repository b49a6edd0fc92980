import { useEditedTree, type Editing } from "./editing";
import { KeyValue } from "./key-value";
import { labelOf } from "./field-words";

/** What a known case's engine has: an option for each feature that is known. */
export function FeaturesValue({ name, path, value = {}, onChange }: Editing<Readonly<Record<string, string | number>>>) {
  const tree = useEditedTree();
  if (name !== "features") return null;
  return (
    <fieldset id={path} className="grid gap-2">
      <legend className="font-semibold">{labelOf(name)}</legend>
      {tree.features.map((feature) => (
        <div key={feature.key} className="grid grid-cols-2 items-center gap-2">
          <span>{feature.title}</span>
          <KeyValue
            bare
            must={false}
            name={feature.title}
            path={`${path}-${feature.key}`}
            value={typeof value[feature.key] === "string" ? String(value[feature.key]) : undefined}
            choices={feature.options}
            onChange={(option) => {
              const rest = Object.fromEntries(Object.entries(value).filter(([key]) => key !== feature.key));
              onChange(option === undefined ? rest : { ...rest, [feature.key]: option });
            }}
          />
        </div>
      ))}
    </fieldset>
  );
}
