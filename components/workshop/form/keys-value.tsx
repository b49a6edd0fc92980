import type { Editing } from "./editing";
import { KeyValue } from "./key-value";
import type { Choice } from "./references";
import { Rows } from "./rows";

/** Several nodes named: the cautions of a step, the symptoms of a case. */
export function KeysValue({ name, path, value = [], onChange, choices }: Editing<readonly string[]> & { choices: readonly Choice[] }) {
  const titleOf = (key: string) => choices.find((one) => one.key === key)?.title ?? key;
  return (
    <Rows
      name={name}
      path={path}
      empty="None."
      onRemove={(index) => onChange(value.filter((_, other) => other !== index))}
      rows={value.map((key) => ({ key, called: titleOf(key), node: <span className="block py-2.5">{titleOf(key)}</span> }))}
      add={
        <KeyValue
          bare
          must
          name={name}
          path={`${path}-add`}
          value={undefined}
          choices={choices.filter(({ key }) => !value.includes(key))}
          onChange={(key) => key !== undefined && onChange([...value, key])}
        />
      }
    />
  );
}
