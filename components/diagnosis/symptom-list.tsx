import { useMemo } from "react";
import { symptomsBySystem } from "@/lib/client/symptoms-by-system";
import type { FaultTree } from "@/lib/core/tree/schema";
import { Fold } from "@/components/ui/fold";
import { SymptomRows, type Picking } from "./symptom-rows";

/** All symptoms of the tree, by system; one stands under each system that brings it on often. */
export function SymptomList({ tree, ...picking }: Picking & { tree: FaultTree }) {
  const systems = useMemo(() => symptomsBySystem(tree), [tree]);
  return (
    <div className="grid gap-2">
      {systems.map(({ key, title, symptoms }) => (
        <Fold key={key} title={`${title} (${symptoms.length})`}>
          <SymptomRows symptoms={symptoms} {...picking} />
        </Fold>
      ))}
    </div>
  );
}
