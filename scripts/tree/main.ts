import { check } from "./check";

const usage = `npm run tree -- check DIR [--json] [--links]
  Is the tree sound? Ends with 1 on errors.`;

const commands: Record<string, (args: string[]) => Promise<number>> = { check };

const [name = "", ...args] = process.argv.slice(2);
const command = commands[name];
if (command === undefined) {
  console.error(usage);
  process.exitCode = name === "" || name === "help" || name === "--help" ? 0 : 2;
} else process.exitCode = await command(args);
