// Lint rules made from the table of rings.
import { rings, rooms } from "./rings.mjs";

const escape = (text) => text.replace(/[.*+?^${}()|[\]\\]/g, "\\$&");

const BANS = {
  clock: [
    {
      selector: "MemberExpression[object.name='Date'][property.name='now']",
      message: "The core has no clock: take the moment as an argument.",
    },
    {
      selector: "NewExpression[callee.name='Date'][arguments.length=0]",
      message: "The core has no clock: take the moment as an argument.",
    },
    {
      selector: "MemberExpression[object.name='performance'][property.name='now']",
      message: "The core has no clock: take the moment as an argument.",
    },
  ],
  dice: [
    {
      selector: "MemberExpression[object.name='Math'][property.name='random']",
      message: "The core has no dice: take a generator as an argument.",
    },
    { selector: "MemberExpression[object.name='crypto']", message: "The core has no dice: take ids as arguments." },
  ],
  "server-import": [
    {
      selector: "ImportExpression[source.value=/lib\\/server|^db\\/|@\\/db/]",
      message: "This ring must not reach the server's side, by import() either.",
    },
  ],
};

const everywhere = [
  { selector: "ExportAllDeclaration", message: "No barrels: name what is exported." },
  { selector: "TSEnumDeclaration", message: "No enums: a const object or a union." },
];

/** What the ring must not import: foreign rooms by alias or by dots, and packages it has no leave for. */
function restrictedImports({ sees, packages }) {
  const foreign = rooms.filter((room) => !sees.includes(room) && !sees.some((s) => s.startsWith(`${room}/`)));
  const patterns = foreign.map((room) => ({
    regex: `^(@/|(\\.\\./)+)${escape(room)}(/|$)`,
    message: `This ring does not see ${room} (tests/architecture/rings.mjs).`,
  }));
  // "ui sees only ui": the parent of a seen folder is foreign, the folder itself is not.
  for (const seen of sees) {
    const parent = seen.split("/").slice(0, -1).join("/");
    if (parent && rooms.includes(parent)) {
      patterns.push({
        regex: `^@/${escape(parent)}/(?!${escape(seen.slice(parent.length + 1))}(/|$))`,
        message: `Of ${parent}, this ring sees only ${seen}.`,
      });
    }
  }
  if (packages !== "any") {
    const allowed = packages.map(escape).join("|");
    patterns.push({
      regex: `^(?!@/|\\.)(?!(${allowed})(/|$)).+`,
      message: "This ring has no leave for that package (tests/architecture/rings.mjs).",
    });
  }
  return patterns;
}

/** One flat-config block a ring. Two blocks that match one file replace each other's rule, so a file falls in one. */
export const ringBlocks = rings.map((ring) => ({
  name: `ring: ${ring.name}`,
  files: ring.files,
  ignores: ring.ignores ?? [],
  rules: {
    "no-restricted-imports": ["error", { patterns: restrictedImports(ring) }],
    "no-restricted-syntax": ["error", ...everywhere, ...ring.bans.flatMap((ban) => BANS[ban])],
  },
}));
