import { describe, expect, test } from "vitest";
import { storyGroups } from "@/components/log/story-groups";
import type { StoryStep } from "@/lib/core/contract/diagnosis";

const step = (event: string, kind: string, says: string, note: string | null = null): StoryStep => ({
  event,
  kind,
  key: null,
  title: event,
  says,
  at: "2026-06-01T10:00:00.000Z",
  by: "Wren",
  note,
  photos: [],
  askedWhy: null,
  changes: null,
  believed: [],
  others: 0,
  unknown: 0,
});

describe("the story of a diagnosis", () => {
  test("lets a danger stand by itself that was answered in two ways, before and after", () => {
    const steps = [
      step("a", "rule-answered", "No"),
      step("b", "rule-answered", "No"),
      { ...step("c", "rule-answered", "No"), changes: { event: "b", was: "Yes" } },
    ];
    expect(storyGroups(steps).map(({ kind }) => kind)).toEqual(["no-danger", "step", "step"]);
  });

  test("puts dangers that were ruled out into one line, and shows one that was there", () => {
    const steps = [
      step("a", "begun", ""),
      step("b", "rule-answered", "No"),
      step("c", "rule-answered", "No"),
      step("d", "rule-answered", "Yes"),
      step("e", "rule-answered", "No"),
      step("f", "answered", "No"),
    ];
    const shape = storyGroups(steps).map((g) => (g.kind === "step" ? g.step.event : g.steps.map((s) => s.event)));
    expect(shape).toEqual(["a", ["b", "c"], "d", ["e"], "f"]);
  });
  test("never hides a note in a line of its neighbours", () => {
    const steps = [step("a", "rule-answered", "No"), step("b", "rule-answered", "No", "smelt of diesel, though")];
    expect(storyGroups(steps).map((g) => g.kind)).toEqual(["no-danger", "step"]);
  });
});
