import type { Engine } from "@/lib/core/contract/engine";
import type { DiagnosisView, Said } from "@/lib/core/diagnosis/view";
import { CANNOT_TELL, NOT_FITTED } from "@/lib/core/diagnosis/words";
import type { FaultTree } from "@/lib/core/tree/schema";
import type { HandOverFacts, Position } from "./facts";

/** Puts the hand-over together from what is on the phone. */
export function gatherHandOver(input: {
  engine: Engine;
  tree: FaultTree;
  view: DiagnosisView;
  fleet: string;
  by: string;
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
  const answered = view.said.filter(({ kind }) => kind === "answered");
  return {
    boat: engine.boatName,
    engine: engine.name,
    fleet: input.fleet,
    by: input.by,
    engineIs: [
      ...(maker || model ? [[maker, model].filter(Boolean).join(" ")] : []),
      ...(ratedKw ? [`${ratedKw} kW`] : []),
      ...(cylinders ? [cylinders === 1 ? "1 cylinder" : `${cylinders} cylinders`] : []),
      ...(figures.ratedRpm ? [`${figures.ratedRpm} rpm rated`] : []),
      ...known,
    ],
    hours: hoursInWords(engine),
    situation: view.situation,
    complaint: input.complaint,
    symptoms: view.symptoms.filter(({ present }) => present).map(({ title }) => title),
    checked: whatMattersFirst(answered.filter(isFinding), view).map(({ title, says }) => ({ title, says })),
    notSeen: answered.filter(({ says }) => says === CANNOT_TELL).map(({ title }) => title),
    tried: view.said.filter(({ kind }) => kind === "remedy-tried").map(({ title, says }) => ({ title, says })),
    possible: view.possible.causes.map(({ title, of100 }) => ({ title, of100 })),
    rulesInForce: view.rulesInForce.map(({ title, says, because }) => ({ title, says: says[0] ?? because })),
    notes: view.said.flatMap(({ title, note, kind }) => (note && kind !== "begun" ? [{ title, says: note }] : [])),
    photos: view.said.flatMap(({ title, photos }) => photos.map((id) => ({ id, title }))),
    crankSeconds: view.crankSeconds,
    minutes: input.minutes,
    position: input.position,
  };
}

const isFinding = ({ says }: Said): boolean => says !== CANNOT_TELL && says !== NOT_FITTED;

function hoursInWords({ hours, hoursAreEstimated }: Engine): string | null {
  if (hours === null) return null;
  return hoursAreEstimated ? `about ${Math.round(hours)} h, estimated` : `${Math.round(hours)} h at the last reading`;
}

/** A finding counts by how far it moved the odds of a cause that is still possible; of two that moved nothing, the later one first. */
function whatMattersFirst(answered: readonly Said[], view: DiagnosisView): readonly Said[] {
  const moved = (title: string): number =>
    Math.max(
      0,
      ...view.possible.causes.flatMap((cause) =>
        [...cause.speaksFor, ...cause.speaksAgainst]
          .filter((one) => one.title === title)
          .map(({ factor }) => Math.abs(Math.log(factor)) * cause.share),
      ),
    );
  return answered
    .map((said, at) => ({ said, at, weight: moved(said.title) }))
    .sort((a, b) => b.weight - a.weight || b.at - a.at)
    .map(({ said }) => said);
}
