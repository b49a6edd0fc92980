import type { DrawnCheck, DrawnPart } from "./drawn-part";

/** The four ruled lanes, left to right: where each begins and how wide its nodes are. */
export const LANES = {
  symptom: { x: 16, width: 160 },
  check: { x: 210, width: 240 },
  cause: { x: 540, width: 200 },
  remedy: { x: 800, width: 200 },
} as const;

const LINE = 22;
const CHARACTERS_A_LINE = { symptom: 15, check: 26, finding: 27, cause: 19, remedy: 18 } as const;
const TOP = 48;
const NODE_GAP = 14;
const BAND_GAP = 30;

const linesOf = (text: string, kind: keyof typeof CHARACTERS_A_LINE) => Math.max(1, Math.ceil(text.length / CHARACTERS_A_LINE[kind]));

/** Heights are reckoned from the text, so that nothing has to be measured before it is laid out. */
export const heightOf = {
  symptom: (title: string) => linesOf(title, "symptom") * LINE + 26,
  checkHead: (title: string) => linesOf(title, "check") * LINE + 16,
  findingRow: (title: string) => linesOf(title, "finding") * LINE + 8,
  check: ({ check, findings, folded }: DrawnCheck) =>
    heightOf.checkHead(check.title) +
    findings.reduce((sum, finding) => sum + heightOf.findingRow(finding.title), 0) +
    (folded > 0 ? heightOf.findingRow("") : 0),
  cause: (title: string) => linesOf(title, "cause") * LINE + LINE + 22,
  remedy: (title: string) => linesOf(title, "remedy") * LINE + 22,
};

export type Place = { x: number; y: number; height: number };
export type Places = ReadonlyMap<string, Place>;

/**
 * Where every node stands. Causes go down their lane, the likeliest first, each in a band of its own with the checks that
 * tell it best at its left and its remedies at its right; what belongs to several causes stands with one of them.
 */
export function placesOf(part: DrawnPart): Places {
  const places = new Map<string, Place>();
  const checksAt = homes(
    part.tells,
    (tell) => tell.check,
    (tell) => tell.ratio,
  );
  // A remedy stands with the likeliest cause it puts right: the first in the list.
  const remediesAt = homes(
    part.cures,
    (cure) => cure.remedy,
    () => 0,
  );
  let y = TOP;
  for (const cause of part.causes) {
    const checks = part.checks
      .filter(({ check }) => checksAt.get(check.key) === cause.key)
      .map((drawn) => ({ id: `check:${drawn.check.key}`, height: heightOf.check(drawn) }));
    const remedies = part.remedies
      .filter(({ key }) => remediesAt.get(key) === cause.key)
      .map(({ key, title }) => ({ id: `remedy:${key}`, height: heightOf.remedy(title) }));
    const self = [{ id: `cause:${cause.key}`, height: heightOf.cause(cause.title) }];
    const band = Math.max(stackHeight(checks), stackHeight(remedies), stackHeight(self));
    stack(places, checks, LANES.check.x, y, band);
    stack(places, self, LANES.cause.x, y, band);
    stack(places, remedies, LANES.remedy.x, y, band);
    y += band + BAND_GAP;
  }
  places.set("symptom", { x: LANES.symptom.x, y: TOP, height: heightOf.symptom(part.symptom.title) });
  return places;
}

type Tall = { id: string; height: number };

/** By node: the cause it stands with, the one it weighs most for; of equal ones the first. */
function homes<L extends { cause: string }>(links: readonly L[], nodeOf: (link: L) => string, weight: (link: L) => number) {
  const best = new Map<string, L>();
  for (const link of links) {
    const before = best.get(nodeOf(link));
    if (!before || weight(link) > weight(before)) best.set(nodeOf(link), link);
  }
  return new Map([...best].map(([node, link]) => [node, link.cause]));
}

const stackHeight = (nodes: readonly Tall[]) =>
  nodes.reduce((sum, node) => sum + node.height, 0) + Math.max(0, nodes.length - 1) * NODE_GAP;

function stack(places: Map<string, Place>, nodes: readonly Tall[], x: number, top: number, band: number): void {
  let y = top + (band - stackHeight(nodes)) / 2;
  for (const { id, height } of nodes) {
    places.set(id, { x, y, height });
    y += height + NODE_GAP;
  }
}
