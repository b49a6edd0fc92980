"use client";

import { OWN_WORDS, partsOf, type OutcomeForm } from "@/lib/client/outcome-form";
import { Select } from "@/components/ui/select";
import { TextField } from "@/components/ui/text-field";
import { BeenHereBefore } from "./been-here-before";
import { useHere } from "./here";

type Props = { form: OutcomeForm; change: (part: Partial<OutcomeForm>) => void; error: string | undefined };

/** The cause and its remedy: the likeliest and the tried first, anything else in words. If it has been here before, that is said now. */
export function OutcomeCause({ form, change, error }: Props) {
  const { view, tree } = useHere();
  const likely = view.possible.causes.map(({ key }) => key);
  const causes = [...likely, ...tree.causes.map(({ key }) => key).filter((key) => !likely.includes(key))];
  const cause = tree.causes.find(({ key }) => key === form.cause);
  const tried = view.said.flatMap(({ kind, key }) => (kind === "remedy-tried" && key ? [key] : []));
  const remedies = [
    ...new Set([...tried, ...Object.keys(cause?.curedBy ?? {}), ...(form.remedy && form.remedy !== OWN_WORDS ? [form.remedy] : [])]),
  ];
  const causeTitle = (key: string) => tree.causes.find((one) => one.key === key)?.title ?? key;
  const remedyTitle = (key: string) => tree.remedies.find((one) => one.key === key)?.title ?? key;
  return (
    <>
      <Select
        id="cause"
        label="What was it?"
        error={error}
        value={form.cause}
        onChange={(event) => change({ cause: event.target.value })}
        options={[
          { value: "", title: "Not found" },
          ...causes.map((key) => ({ value: key, title: causeTitle(key) })),
          { value: OWN_WORDS, title: "Something else, in my words" },
        ]}
      />
      {form.cause === OWN_WORDS && (
        <TextField
          id="cause-words"
          label="What it was, in your words"
          maxLength={500}
          value={form.causeInWords}
          onChange={(event) => change({ causeInWords: event.target.value })}
        />
      )}
      {cause && <BeenHereBefore cause={cause.key} />}
      <Select
        id="remedy"
        label="What put it right?"
        value={form.remedy}
        onChange={(event) => change({ remedy: event.target.value, parts: partsOf(tree, event.target.value) })}
        options={[
          { value: "", title: "Nothing was done" },
          ...remedies.map((key) => ({ value: key, title: remedyTitle(key) })),
          { value: OWN_WORDS, title: "Something else, in my words" },
        ]}
      />
      {form.remedy === OWN_WORDS && (
        <TextField
          id="remedy-words"
          label="What was done, in your words"
          maxLength={500}
          value={form.remedyInWords}
          onChange={(event) => change({ remedyInWords: event.target.value })}
        />
      )}
    </>
  );
}
