import { check } from "./check";
import { prove } from "./prove";
import { Refusal } from "./read-tree";
import { schema } from "./schema";
import { show } from "./show";

const usage = `npm run tree -- check [DIR] [--json] [--links]
  Is the tree sound? Names every flaw with its file and line; ends with 1 on errors.
  --links: how far each linked finding speaks for its cause.
npm run tree -- show [DIR] --symptom KEY [--symptom KEY] [--feature KEY=OPTION]
    [--situation alongside|at-anchor|under-way] [--person WHO] [--depth 4] [--chance 0.15]
  The order of questions, with the answers that are likely enough to follow.
npm run tree -- prove [DIR] [--cases FILE.jsonl|FILE.yaml] [--person WHO] [--bar FIGURE=VALUE] [--json]
  Known cases replayed: is the right cause believed, and what does the way to it cost.
npm run tree -- schema
  Writes trees/fault-tree.schema.json anew.
DIR is trees/small-marine-diesel where none is named.`;

const commands: Record<string, (args: string[]) => Promise<number>> = { check, prove, schema, show };

// Whoever reads us may stop early (| head): that is no fault.
process.stdout.on("error", (error: NodeJS.ErrnoException) => process.exit(error.code === "EPIPE" ? 0 : 1));

const [name = "", ...args] = process.argv.slice(2);
const command = commands[name];
if (command === undefined) {
  console.error(usage);
  process.exitCode = name === "help" || name === "--help" ? 0 : 2;
} else {
  try {
    process.exitCode = await command(args);
  } catch (error) {
    // parseArgs' refusals are for the person who typed; anything else is a fault of ours and keeps its stack.
    const mistyped = error instanceof Error && "code" in error && String(error.code).startsWith("ERR_PARSE_ARGS");
    console.error(mistyped ? `${error.message}\n${usage}` : error instanceof Refusal ? error.message : error);
    process.exitCode = mistyped || error instanceof Refusal ? 2 : 1;
  }
}
