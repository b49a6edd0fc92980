import type { Cause, Check, Remedy, Symptom } from "@/lib/core/tree/schema";
import { findingInWords, linkInWords } from "./in-words";
import { Facts, Pair, Sources } from "./node-facts";
import { StepFacts } from "./step-facts";
import type { TreePart } from "./tree-part";

type Of<T> = { node: T; part: TreePart };

export function SymptomPanel({ node, part }: Of<Symptom>) {
  return (
    <>
      <p className="mt-1">{node.detail}</p>
      <Facts title="What people say" items={node.phrases.map((phrase) => `“${phrase}”`)} />
      <Sources citations={node.sources} part={part} />
    </>
  );
}

export function CheckPanel({ node, part }: Of<Check>) {
  const reading = node.reading;
  return (
    <>
      <p className="mt-1">{node.ask}</p>
      <StepFacts id={`check:${node.key}`} step={node} part={part} />
      <Facts
        title={reading ? `Findings of the reading, in ${reading.unit}` : "Findings"}
        items={node.findings.map((finding) => (
          <Pair key={finding.key} what={finding.title} how={finding.usual ? "usual in a sound engine" : ""} />
        ))}
      />
      {node.note && <p className="mt-4 text-sm">{node.note}</p>}
      <Sources citations={node.sources} part={part} />
    </>
  );
}

export function CausePanel({ node, part }: Of<Cause>) {
  const title = (kind: string, key: string) => part.titles[`${kind}:${key}`] ?? key;
  const found = (check: string, spec: string) =>
    spec
      .split("..")
      .map((finding) => title("finding", `${check}/${finding}`))
      .join(" to ");
  const links = (record: Readonly<Record<string, Parameters<typeof linkInWords>[0]>>, kind: string) =>
    Object.entries(record).map(([key, link]) => <Pair key={key} what={title(kind, key)} how={linkInWords(link)} />);
  return (
    <>
      <p className="mt-1">{node.is}</p>
      <Facts
        title="How common, among engines like these"
        items={[`${typeof node.base === "number" ? `weight ${node.base}` : node.base}, comes on ${ONSET[node.onset]}`]}
      />
      <Facts title="Shows itself as" items={links(node.shows, "symptom")} />
      <Facts
        title="What the checks then find (×6: 6 times as often as in a sound engine)"
        items={Object.entries(node.gives).flatMap(([check, findings]) =>
          Object.keys(findings).map((spec) => (
            <Pair
              key={check + spec}
              what={`${title("check", check)}: ${found(check, spec)}`}
              how={findingInWords(
                part.graph.checks.find(({ key }) => key === check),
                findings,
                spec,
              )}
            />
          )),
        )}
      />
      <Facts title="Put right by" items={links(node.curedBy, "remedy")} />
      <Facts title="Brought on by" items={[...links(node.broughtOnBy, "cause"), ...node.roots]} />
      {node.note && <p className="mt-4 text-sm">{node.note}</p>}
      <Sources citations={node.sources} part={part} />
    </>
  );
}

export function RemedyPanel({ node, part }: Of<Remedy>) {
  return (
    <>
      {node.temporary && <p className="mt-1">Gets one home; the cause stays open.</p>}
      <StepFacts id={`remedy:${node.key}`} step={node} part={part} />
      <Facts title="Parts" items={node.parts.map((p) => (p.quantity === 1 ? p.title : `${p.quantity} × ${p.title}`))} />
      <Facts title="Proved by" items={[node.proof]} />
      {node.note && <p className="mt-4 text-sm">{node.note}</p>}
      <Sources citations={node.sources} part={part} />
    </>
  );
}

const ONSET = { gradual: "slowly", sudden: "at once", either: "slowly or at once" } as const;
