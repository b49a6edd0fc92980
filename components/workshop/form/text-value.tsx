import { TextArea } from "@/components/ui/text-area";
import { TextField } from "@/components/ui/text-field";
import type { Editing } from "./editing";
import { hintOf, labelOf } from "./field-words";

/** One line, or several where the field may be long. An emptied field is left out. */
export function TextValue({ name, path, value = "", onChange, long, bare }: Editing<string> & { long: boolean }) {
  const shared = {
    id: path,
    label: bare ? <span className="visually-hidden">{labelOf(name)}</span> : labelOf(name),
    hint: bare ? undefined : hintOf(name),
    value,
  };
  const put = (text: string) => onChange(text === "" ? undefined : text);
  if (!long) return <TextField {...shared} onChange={(event) => put(event.target.value)} />;
  return <TextArea {...shared} rows={Math.min(8, 2 + Math.floor(value.length / 45))} onChange={(event) => put(event.target.value)} />;
}
