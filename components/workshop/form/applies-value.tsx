import { Choice } from "@/components/ui/choice";
import { Situation, type AppliesTo } from "@/lib/core/tree/schema";
import { useEditedTree, type Editing } from "./editing";
import { labelOf } from "./field-words";

/** Which engines, and where: all that is ticked of a feature will do; nothing ticked: any. */
export function AppliesValue({ name, path, value, onChange }: Editing<AppliesTo>) {
  const tree = useEditedTree();
  const put = (next: AppliesTo) => {
    const features = Object.fromEntries(Object.entries(next.features ?? {}).filter(([, options]) => options.length > 0));
    const situations = next.situations ?? [];
    const said = { ...(Object.keys(features).length > 0 ? { features } : {}), ...(situations.length > 0 ? { situations } : {}) };
    onChange(Object.keys(said).length === 0 ? undefined : said);
  };
  const toggled = <T,>(list: readonly T[], one: T): T[] => (list.includes(one) ? list.filter((other) => other !== one) : [...list, one]);
  return (
    <details id={path} open={value !== undefined} className="rounded-lg border border-rule px-3">
      <summary className="flex min-h-12 items-center font-semibold">
        {labelOf(name)}
        {value === undefined && <span className="pl-2 font-normal text-ink-2">any engine, anywhere</span>}
      </summary>
      <div className="grid gap-3 pb-3">
        <fieldset>
          <legend className="text-sm text-ink-2">Where</legend>
          <div className="flex flex-wrap gap-x-4">
            {Situation.options.map((one) => (
              <Choice
                key={one}
                checked={value?.situations?.includes(one) ?? false}
                onChange={() => put({ ...value, situations: toggled(value?.situations ?? [], one) })}
              >
                {one.replaceAll("-", " ")}
              </Choice>
            ))}
          </div>
        </fieldset>
        {tree.features.map((feature) => {
          const ticked = value?.features?.[feature.key] ?? [];
          return (
            <fieldset key={feature.key}>
              <legend className="text-sm text-ink-2">{feature.title}</legend>
              <div className="flex flex-wrap gap-x-4">
                {feature.options.map((option) => (
                  <Choice
                    key={option.key}
                    checked={ticked.includes(option.key)}
                    onChange={() => put({ ...value, features: { ...value?.features, [feature.key]: toggled(ticked, option.key) } })}
                  >
                    {option.title}
                  </Choice>
                ))}
              </div>
            </fieldset>
          );
        })}
      </div>
    </details>
  );
}
