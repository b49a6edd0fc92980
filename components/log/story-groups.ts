import type { StoryStep } from "@/lib/core/contract/diagnosis";

/** A step by itself, or the run of danger questions that were all answered with no. */
export type StoryGroup = { kind: "step"; step: StoryStep } | { kind: "no-danger"; steps: readonly StoryStep[] };

/** Puts the questions about danger that found nothing into one line; one that found something, or was changed, stands by itself. */
export function storyGroups(steps: readonly StoryStep[]): StoryGroup[] {
  const groups: StoryGroup[] = [];
  const changed = new Set(steps.flatMap(({ changes }) => changes?.event ?? []));
  for (const step of steps) {
    const last = groups.at(-1);
    if (step.kind !== "rule-answered" || step.says !== "No" || step.note || step.changes || changed.has(step.event))
      groups.push({ kind: "step", step });
    else if (last?.kind === "no-danger") groups[groups.length - 1] = { kind: "no-danger", steps: [...last.steps, step] };
    else groups.push({ kind: "no-danger", steps: [step] });
  }
  return groups;
}
