import "server-only";

/** A form's fields by name; one that comes several times is a list. What Next adds for itself is left out. */
export function formValues(form: FormData): Record<string, FormDataEntryValue | FormDataEntryValue[]> {
  const values: Record<string, FormDataEntryValue | FormDataEntryValue[]> = {};
  for (const name of new Set(form.keys())) {
    if (name.startsWith("$")) continue;
    const all = form.getAll(name);
    const [first] = all;
    if (first !== undefined) values[name] = all.length === 1 ? first : all;
  }
  return values;
}
