import type { Check, Remedy, Situation, Who } from "../tree/schema";

const RANK: Readonly<Record<Who, number>> = { "skipper-at-sea": 0, "skipper-in-port": 1, mechanic: 2, workshop: 3 };

/** A skipper is one person in two places: alongside he may do what a skipper may in port. Rule [W1]. */
export const personHere = (person: Who, situation: Situation): Who =>
  RANK[person] >= RANK.mechanic ? person : situation === "alongside" ? "skipper-in-port" : "skipper-at-sea";

/** May this person do the step? Unions of the high-pressure side are for mechanics whatever the tree says. Rules [W1], [W2]. */
export function whoMay(step: Pick<Check | Remedy, "who" | "flags">, person: Who, situation: Situation): boolean {
  const needed = step.flags.opensHighPressureFuel ? Math.max(RANK[step.who], RANK.mechanic) : RANK[step.who];
  return RANK[personHere(person, situation)] >= needed;
}
