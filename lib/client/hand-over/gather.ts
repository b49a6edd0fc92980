import type { Engine } from "@/lib/core/contract/engine";
import type { DiagnosisView } from "@/lib/core/diagnosis/view";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { HandOverFacts, Position } from "./facts";

/** Puts the hand-over together from what is on the phone. */
export function gatherHandOver(input: {
  engine: Engine;
  tree: FaultTree;
  view: DiagnosisView;
  complaint: string | null;
  minutes: number;
  position: Position | null;
}): HandOverFacts {
  const { engine, tree, view } = input;
  const known = tree.features.flatMap((feature) => {
    const told = view.profile.features[feature.key];
    const option = feature.options.find(({ key }) => key === told);
    return option ? [`${feature.title}: ${option.title}`] : [];
  });
  const { maker, model, cylinders, ratedKw, figures } = view.profile;
  return {
    boat: engine.boatName,
    engine: engine.name,
    engineIs: [
      ...(maker || model ? [[maker, model].filter(Boolean).join(" ")] : []),
      ...(ratedKw ? [`${ratedKw} kW`] : []),
      ...(cylinders ? [`${cylinders} cylinders`] : []),
      ...(figures.ratedRpm ? [`${figures.ratedRpm} rpm rated`] : []),
      ...known,
    ],
    hours: engine.hours,
    situation: view.situation,
    complaint: input.complaint,
    symptoms: view.symptoms.filter(({ present }) => present).map(({ title }) => title),
    checked: view.said.filter(({ kind }) => kind === "answered").map(({ title, says }) => ({ title, says })),
    tried: view.said.filter(({ kind }) => kind === "remedy-tried").map(({ title, says }) => ({ title, says })),
    possible: view.possible.causes.map(({ title, of100 }) => ({ title, of100 })),
    rulesInForce: view.rulesInForce.map(({ title }) => title),
    crankSeconds: view.crankSeconds,
    minutes: input.minutes,
    position: input.position,
  };
}
