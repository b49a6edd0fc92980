import type { Cause } from "@/lib/core/tree/schema";
import { useEditedTree, type Editing } from "./editing";
import { KeyValue } from "./key-value";
import { choicesFor, findingsOf, type Choice } from "./references";
import { Rows } from "./rows";
import { StrengthValue } from "./strength-value";

type Gives = Cause["gives"];

/** What a cause gives at each check: a row a check, a line a finding or span of bands. */
export function GivesValue({ name, path, value = {}, onChange }: Editing<Gives>) {
  const tree = useEditedTree();
  const checks = choicesFor("gives", tree) ?? [];
  const titleOf = (key: string) => checks.find((one) => one.key === key)?.title ?? key;
  const put = (check: string, row: Gives[string]) => {
    const rest = Object.fromEntries(Object.entries(value).filter(([key]) => key !== check));
    onChange(Object.keys(row).length === 0 ? rest : { ...value, [check]: row });
  };
  return (
    <Rows
      name={name}
      path={path}
      empty="Nothing yet: it behaves as a sound engine at every check."
      onRemove={(index) => put(Object.keys(value)[index] ?? "", {})}
      rows={Object.entries(value).map(([check, row]) => ({
        key: check,
        called: titleOf(check),
        node: (
          <CheckRow
            path={`${path}-${check}`}
            title={titleOf(check)}
            findings={findingsOf(tree, check)}
            row={row}
            onChange={(next) => put(check, next)}
          />
        ),
      }))}
      add={
        <KeyValue
          bare
          must
          name={name}
          path={`${path}-add`}
          value={undefined}
          choices={checks.filter(({ key }) => value[key] === undefined)}
          onChange={(key) => {
            // What a sound engine shows tells nothing of a cause.
            const unusual = tree.checks.find((check) => check.key === key)?.findings.find(({ usual }) => usual !== true);
            if (key !== undefined && unusual) put(key, { [unusual.key]: "x20" });
          }}
        />
      }
    />
  );
}

type RowProps = { path: string; title: string; findings: readonly Choice[]; row: Gives[string]; onChange: (row: Gives[string]) => void };

function CheckRow({ path, title, findings, row, onChange }: RowProps) {
  const nameOf = (spec: string) =>
    spec
      .split("..")
      .map((key) => findings.find((one) => one.key === key)?.title ?? key)
      .join(" to ");
  const free = findings.filter(({ key }) => row[key] === undefined);
  return (
    <div className="grid gap-2 rounded-lg border border-rule p-3">
      <b className="font-semibold">{title}</b>
      {Object.entries(row).map(([spec, link]) => (
        <div key={spec} className="grid grid-cols-[minmax(0,1fr)_minmax(0,11rem)_auto] items-center gap-2">
          <span>{nameOf(spec)}</span>
          <StrengthValue
            id={`${path}-${spec}`}
            label={`${title}: ${nameOf(spec)}`}
            value={link}
            factors
            onChange={(next) => onChange({ ...row, [spec]: next })}
          />
          <button
            type="button"
            className="link min-h-12 px-1"
            aria-label={`Take out ${title}: ${nameOf(spec)}`}
            onClick={() => onChange(Object.fromEntries(Object.entries(row).filter(([other]) => other !== spec)))}
          >
            ×
          </button>
        </div>
      ))}
      {free.length > 0 && (
        <KeyValue
          bare
          must
          name="another finding"
          path={`${path}-add`}
          value={undefined}
          choices={free}
          onChange={(key) => key !== undefined && onChange({ ...row, [key]: "x20" })}
        />
      )}
    </div>
  );
}
