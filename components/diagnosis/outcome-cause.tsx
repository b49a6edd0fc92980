"use client";

import { OWN_WORDS, partsOf, type OutcomeForm } from "@/lib/client/outcome-form";
import { PickOrSay, type Said } from "@/components/form/pick-or-say";
import { BeenHereBefore } from "./been-here-before";
import { useHere } from "./here";

type Props = { form: OutcomeForm; change: (part: Partial<OutcomeForm>) => void; error: string | undefined };

/** How many of the likeliest causes are offered before anything is typed. */
const OFFERED = 4;

const saidOf = (key: string, words: string): Said => (key === "" || key === OWN_WORDS ? { key: "", words } : { key, words: "" });
const keyOf = ({ key, words }: Said): string => key || (words.trim() ? OWN_WORDS : "");

/** The cause and its remedy: the likeliest and the tried are offered, anything else by a word of it or in one's own words. If it has been here before, that is said now. */
export function OutcomeCause({ form, change, error }: Props) {
  const { view, tree } = useHere();
  const system = new Map(tree.systems.map(({ key, title }) => [key, title]));
  const picks = (nodes: readonly { key: string; title: string; system: string }[]) =>
    nodes.map((node) => ({ key: node.key, title: node.title, under: system.get(node.system) ?? "" }));
  const cause = tree.causes.find(({ key }) => key === form.cause);
  const tried = view.said.flatMap(({ kind, key }) => (kind === "remedy-tried" && key ? [key] : []));
  return (
    <>
      <PickOrSay
        id="cause"
        label="What was it?"
        hint="A word of it finds it in the fault tree. Leave it empty if it was not found."
        options={picks(tree.causes)}
        suggested={view.possible.causes.slice(0, OFFERED).map(({ key }) => key)}
        value={saidOf(form.cause, form.causeInWords)}
        error={error}
        onChange={(said) => change({ cause: keyOf(said), causeInWords: said.words })}
      />
      {cause && <BeenHereBefore cause={cause.key} />}
      <PickOrSay
        id="remedy"
        label="What put it right?"
        hint="Found the same way. Leave it empty if nothing was done."
        options={picks(tree.remedies)}
        suggested={[...new Set([...tried, ...Object.keys(cause?.curedBy ?? {})])]}
        value={saidOf(form.remedy, form.remedyInWords)}
        onChange={(said) => change({ remedy: keyOf(said), remedyInWords: said.words, parts: partsOf(tree, said.key) })}
      />
    </>
  );
}
