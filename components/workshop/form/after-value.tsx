import type { Check, FindingRef } from "@/lib/core/tree/schema";
import type * as z from "zod";
import { useEditedTree, type Editing } from "./editing";
import { KeyValue } from "./key-value";
import { choicesFor, findingsOf } from "./references";
import { Rows } from "./rows";

type Before = Check["after"][number];

/** Steps that this one waits for; a check may have to have come out one way. */
export function AfterValue({ name, path, value = [], onChange }: Editing<readonly Before[]>) {
  const tree = useEditedTree();
  const checks = choicesFor("check", tree) ?? [];
  const remedies = choicesFor("remedy", tree) ?? [];
  const put = (index: number, next: Before) => onChange(value.map((old, other) => (other === index ? next : old)));
  const titleOf = (before: Before) =>
    "check" in before
      ? (checks.find(({ key }) => key === before.check)?.title ?? before.check)
      : (remedies.find(({ key }) => key === before.remedy)?.title ?? before.remedy);
  return (
    <Rows
      name={name}
      path={path}
      empty="It waits for nothing."
      onRemove={(index) => onChange(value.filter((_, other) => other !== index))}
      rows={value.map((before, index) => ({
        key: String(index),
        called: titleOf(before),
        node: (
          <div className="grid gap-1">
            <span>{titleOf(before)}</span>
            {"check" in before && (
              <KeyValue
                bare
                must={false}
                name="found"
                path={`${path}-${index}-finding`}
                value={before.finding}
                choices={findingsOf(tree, before.check)}
                onChange={(finding) => put(index, finding === undefined ? { check: before.check } : { check: before.check, finding })}
              />
            )}
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
          choices={[
            ...checks.map((one) => ({ ...one, key: `check ${one.key}` })),
            ...remedies.map((one) => ({ ...one, key: `remedy ${one.key}`, under: `Remedies: ${one.under ?? ""}` })),
          ]}
          onChange={(picked) => {
            const [kind, key] = (picked ?? "").split(" ");
            if (key !== undefined) onChange([...value, kind === "check" ? { check: key } : { remedy: key }]);
          }}
        />
      }
    />
  );
}

/** Findings by which a stop rule comes into force, or is lifted. */
export function FindingsValue({ name, path, value = [], onChange }: Editing<readonly z.infer<typeof FindingRef>[]>) {
  const tree = useEditedTree();
  const checks = choicesFor("check", tree) ?? [];
  const titleOf = (key: string) => checks.find((one) => one.key === key)?.title ?? key;
  return (
    <Rows
      name={name}
      path={path}
      empty="None."
      onRemove={(index) => onChange(value.filter((_, other) => other !== index))}
      rows={value.map(({ check, finding }, index) => ({
        key: String(index),
        called: titleOf(check),
        node: (
          <div className="grid gap-1">
            <span>{titleOf(check)}</span>
            <KeyValue
              bare
              must
              name="finding"
              path={`${path}-${index}-finding`}
              value={finding}
              choices={findingsOf(tree, check)}
              onChange={(next) => onChange(value.map((old, other) => (other === index ? { check, finding: next ?? finding } : old)))}
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
          choices={checks}
          onChange={(check) => {
            const first = check === undefined ? undefined : findingsOf(tree, check)[0];
            if (check !== undefined && first) onChange([...value, { check, finding: first.key }]);
          }}
        />
      }
    />
  );
}
