import { CANNOT_TELL, otherEngineCheck, othersOf, profileAtStart } from "@/lib/client/other-engine";
import type { Engine } from "@/lib/core/contract/engine";
import type { FaultTree, Situation } from "@/lib/core/tree/schema";
import { RadioRows } from "./radio-rows";

type Props = {
  tree: FaultTree;
  engine: Engine;
  engines: readonly Engine[];
  situation: Situation | null;
  value: string | null;
  onChange: (value: string) => void;
};

/** Twins offer the cheapest check there is: does the other one do it too? Left alone, it may be asked later. */
export function OtherEngine({ tree, engine, engines, situation, value, onChange }: Props) {
  const check = otherEngineCheck(tree, profileAtStart(engine, engines, tree), situation ?? "alongside");
  if (!check) return null;
  const names = othersOf(engine, engines).map(({ name }) => name);
  return (
    <div className="mt-5">
      <RadioRows
        name="other-engine"
        legend={names.length > 0 ? `${check.ask} (${names.join(", ")})` : check.ask}
        showLegend
        options={[...check.findings.map(({ key, title }) => ({ value: key, title })), { value: CANNOT_TELL, title: "Can\u2019t tell" }]}
        value={value}
        onChange={onChange}
      />
    </div>
  );
}
