import type { Check } from "@/lib/core/tree/schema";
import { useEditedTree, type Editing } from "./editing";
import { KeyValue } from "./key-value";
import { NumberValue } from "./number-value";
import { choicesFor } from "./references";
import { Rows } from "./rows";

/** The mechanic's own order: for which symptoms this is asked early, and in which place. */
export function OrderValue({ name, path, value = {}, onChange }: Editing<Check["firstFor"]>) {
  const symptoms = choicesFor("firstFor", useEditedTree()) ?? [];
  const titleOf = (key: string) => symptoms.find((one) => one.key === key)?.title ?? key;
  return (
    <Rows
      name={name}
      path={path}
      empty="It is asked when it tells most."
      onRemove={(index) => onChange(Object.fromEntries(Object.entries(value).filter((_, other) => other !== index)))}
      rows={Object.entries(value).map(([key, place]) => ({
        key,
        called: titleOf(key),
        node: (
          <div className="grid grid-cols-[minmax(0,1fr)_5rem] items-center gap-2">
            <span>{titleOf(key)}</span>
            <NumberValue
              bare
              name="place"
              path={`${path}-${key}`}
              value={place}
              onChange={(next) => onChange({ ...value, [key]: next ?? place })}
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
          choices={symptoms.filter(({ key }) => value[key] === undefined)}
          onChange={(key) => key !== undefined && onChange({ ...value, [key]: 1 })}
        />
      }
    />
  );
}
