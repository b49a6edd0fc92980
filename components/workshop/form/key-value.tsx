import { Field, inputLook } from "@/components/ui/field";
import type { Editing } from "./editing";
import { hintOf, labelOf } from "./field-words";
import type { Choice } from "./references";

type Props = Editing<string> & { choices: readonly Choice[]; must: boolean };

/** Names another node: the device's own list, by system, so that the first letters find it. A name that is not there is shown as it is. */
export function KeyValue({ name, path, value, onChange, choices, must, bare }: Props) {
  const known = value === undefined || choices.some(({ key }) => key === value);
  const groups = [...new Set(choices.map(({ under }) => under ?? ""))];
  const option = ({ key, title }: Choice) => (
    <option key={key} value={key}>
      {title}
    </option>
  );
  return (
    <Field
      id={path}
      label={bare ? <span className="visually-hidden">{labelOf(name)}</span> : labelOf(name)}
      hint={bare ? undefined : hintOf(name)}
      error={known ? undefined : `Nothing in this tree is called “${value}”.`}
    >
      {(control) => (
        <select
          className={inputLook}
          {...control}
          value={value ?? ""}
          onChange={(event) => onChange(event.target.value === "" ? undefined : event.target.value)}
        >
          {(!must || value === undefined) && <option value="">{must ? "Choose" : "None"}</option>}
          {!known && <option value={value}>{value}</option>}
          {groups.map((group) => {
            const inGroup = choices.filter(({ under = "" }) => under === group);
            return group === "" ? (
              inGroup.map(option)
            ) : (
              <optgroup key={group} label={group}>
                {inGroup.map(option)}
              </optgroup>
            );
          })}
        </select>
      )}
    </Field>
  );
}
