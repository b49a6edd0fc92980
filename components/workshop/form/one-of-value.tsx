import { Segmented } from "@/components/ui/segmented";
import { Select } from "@/components/ui/select";
import type { Editing } from "./editing";
import { hintOf, labelOf } from "./field-words";

const FEW = 4;
const asWords = (value: string): string => value.replaceAll("-", " ");

/** One of a few side by side, one of many from a list. */
export function OneOfValue({ name, path, value, onChange, values, must }: Editing<string> & { values: readonly string[]; must: boolean }) {
  if (values.length <= FEW && must)
    return (
      <Segmented
        name={path}
        legend={labelOf(name)}
        value={value ?? null}
        options={values.map((one) => ({ value: one, title: asWords(one) }))}
        onChange={onChange}
      />
    );
  const none = must && value !== undefined ? [] : [{ value: "", title: "Not said" }];
  return (
    <Select
      id={path}
      label={labelOf(name)}
      hint={hintOf(name)}
      value={value ?? ""}
      options={[...none, ...values.map((one) => ({ value: one, title: asWords(one) }))]}
      onChange={(event) => onChange(event.target.value === "" ? undefined : event.target.value)}
    />
  );
}
