import { parseArgs } from "node:util";
import path from "node:path";
import { linkRatios } from "@/lib/core/tree/link-ratios";
import type { FaultTree } from "@/lib/core/tree/schema";
import { barred, type Figure } from "./bars";
import { readTree, SHIPPED, type TreeRead } from "./read-tree";

/** Says whether a tree is sound: every flaw with its place, then the counts. */
export async function check(args: string[]): Promise<number> {
  const { values, positionals } = parseArgs({
    args,
    allowPositionals: true,
    options: { json: { type: "boolean" }, links: { type: "boolean" } },
  });
  const folder = positionals[0] ?? SHIPPED;
  const read = await readTree(folder);
  if (values.links && read.tree !== null) console.log(linkLines(read.tree).join("\n"));
  const errors = read.flaws.filter((flaw) => flaw.severity === "error").length;
  if (values.json) for (const line of figures(read, errors)) console.log(JSON.stringify(line));
  else {
    for (const flaw of read.flaws) console.log(flawLines(folder, flaw));
    if (read.tree !== null)
      console.log(
        counts(read)
          .map(([name, count]) => `${count} ${name}`)
          .join(", "),
      );
    console.log(
      errors === 0
        ? `The tree is sound${read.flaws.length > 0 ? `; ${read.flaws.length} to look at` : ""}.`
        : `${errors} ${errors === 1 ? "error" : "errors"}.`,
    );
  }
  return errors === 0 ? 0 : 1;
}

function flawLines(folder: string, { severity, rule, node, says, mend, place }: TreeRead["flaws"][number]): string {
  const where = place === null ? folder : `${path.join(folder, place.file)}:${place.line}`;
  return `${where}  ${severity} (${rule})\n  ${node === null ? "" : `${node.kind} ${node.key}: `}${says}${mend === undefined ? "" : `\n  ${mend}`}`;
}

function counts({ tree }: TreeRead): [string, number][] {
  if (tree === null) return [];
  return [
    ["symptoms", tree.symptoms.length],
    ["causes", tree.causes.length],
    ["checks", tree.checks.length],
    ["readings", tree.checks.filter((check) => check.reading !== undefined).length],
    ["remedies", tree.remedies.length],
    ["cautions", tree.cautions.length],
    ["stopRules", tree.stopRules.length],
    ["knownCases", tree.knownCases.length],
    ["drawings", new Set([...tree.checks, ...tree.remedies, ...tree.stopRules].flatMap(({ drawing }) => drawing ?? [])).size],
  ];
}

const figures = (read: TreeRead, errors: number): Figure[] =>
  [...counts(read), ["errors", errors] as const].map(([figure, value]) => barred(figure, value, read.tree));

/** A line a cause, and under it a line a linked check with what its findings say. */
function linkLines(tree: FaultTree): string[] {
  const ratios = linkRatios(tree);
  const digits = (value: number) => (value >= 10 ? value.toFixed(0) : value.toFixed(value >= 1 ? 1 : 2));
  return tree.causes.flatMap((cause) => [
    `${cause.title} (${cause.key})`,
    ...Object.keys(cause.gives).map((check) => {
      const row = ratios.filter((link) => link.cause === cause.key && link.check === check);
      return `    ${check}: ${row.map(({ finding, withCause, sound, ratio }) => `${finding} ${withCause.toFixed(2)} against ${sound.toFixed(2)}, x${digits(ratio)}`).join("; ")}`;
    }),
  ]);
}
