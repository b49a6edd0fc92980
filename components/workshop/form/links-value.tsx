import type { FindingLink } from "@/lib/core/tree/finding-link";
import { useEditedTree, type Editing } from "./editing";
import { KeyValue } from "./key-value";
import { choicesFor } from "./references";
import { Rows } from "./rows";
import { StrengthValue } from "./strength-value";

/** Links from this cause to other nodes, each with how often: what it shows as, what cures it, what brings it on. */
export function LinksValue({ name, path, value = {}, onChange }: Editing<Readonly<Record<string, FindingLink>>>) {
  const choices = choicesFor(name, useEditedTree()) ?? [];
  const titleOf = (key: string) => choices.find((one) => one.key === key)?.title ?? key;
  const linked = Object.keys(value);
  return (
    <Rows
      name={name}
      path={path}
      empty="None yet."
      onRemove={(index) => onChange(Object.fromEntries(Object.entries(value).filter((_, other) => other !== index)))}
      rows={linked.map((key) => ({
        key,
        called: titleOf(key),
        node: (
          <div className="grid grid-cols-[minmax(0,1fr)_minmax(0,11rem)] items-center gap-2">
            <span>{titleOf(key)}</span>
            <StrengthValue
              id={`${path}-${key}`}
              label={titleOf(key)}
              value={value[key] ?? "often"}
              factors={false}
              onChange={(strength) => onChange({ ...value, [key]: strength })}
            />
          </div>
        ),
      }))}
      add={
        <KeyValue
          bare
          must
          name={name}
          path={`${path}-add`}
          value={undefined}
          choices={choices.filter(({ key }) => !linked.includes(key))}
          onChange={(key) => key !== undefined && onChange({ ...value, [key]: "often" })}
        />
      }
    />
  );
}
